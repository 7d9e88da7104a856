package torqueloom.model.synapse;

import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import torqueloom.model.tolerance.Spread;

/**
 * A tunnel junction used as one element of a synapse. All values are SI.
 *
 * @param anisotropyField net perpendicular anisotropy field B_k, demagnetization subtracted (T)
 * @param biasField bias field B_f in the plane along the reference layer (T)
 * @param diameter (m)
 * @param thickness free-layer thickness (m)
 * @param saturationMagnetization Ms of the free layer (A/m)
 * @param damping Gilbert damping (1)
 * @param resistanceArea resistance-area product in the parallel state (ohm m²)
 * @param magnetoresistance (R_AP - R_P)/R_P (1)
 * @param polarization spin polarization (1)
 * @param readVoltage (V)
 * @param barrier barrier thickness (m)
 * @param tolerances by parameter name, each relative to the nominal value
 */
public record JunctionParameters(
    double anisotropyField,
    double biasField,
    double diameter,
    double thickness,
    double saturationMagnetization,
    double damping,
    double resistanceArea,
    double magnetoresistance,
    double polarization,
    double readVoltage,
    double barrier,
    Map<String, Spread> tolerances) {

  /** Parameters that may carry a tolerance, as in a study file. */
  public static final List<String> TOLERANCE_PARAMETERS =
      List.of("anisotropy-field", "diameter", "magnetoresistance", "resistance-area");

  /**
   * Sorts and copies the tolerances.
   *
   * @throws IllegalArgumentException naming the first value out of range
   */
  public JunctionParameters {
    positive("anisotropy-field", anisotropyField);
    positive("bias-field", biasField);
    positive("diameter", diameter);
    positive("thickness", thickness);
    positive("saturation-magnetization", saturationMagnetization);
    positive("damping", damping);
    positive("resistance-area", resistanceArea);
    positive("magnetoresistance", magnetoresistance);
    positive("polarization", polarization);
    positive("read-voltage", readVoltage);
    positive("barrier", barrier);
    tolerances = Collections.unmodifiableMap(new TreeMap<>(tolerances));
    for (final String name : tolerances.keySet()) {
      if (!TOLERANCE_PARAMETERS.contains(name)) {
        throw new IllegalArgumentException(
            "a junction's tolerance is one of " + TOLERANCE_PARAMETERS + ", got " + name);
      }
    }
  }

  /** Area of the round junction (m²). */
  public double area() {
    return Math.PI / 4 * diameter * diameter;
  }

  /** Moment of the free layer Ms V (A m²). */
  public double moment() {
    return saturationMagnetization * area() * thickness;
  }

  /**
   * The same junction with one parameter multiplied.
   *
   * @throws IllegalArgumentException for a name not in {@link #TOLERANCE_PARAMETERS}
   */
  public JunctionParameters scaled(String parameter, double factor) {
    if (!TOLERANCE_PARAMETERS.contains(parameter)) {
      throw new IllegalArgumentException("unknown junction parameter " + parameter);
    }
    return new JunctionParameters(
        anisotropyField * (parameter.equals("anisotropy-field") ? factor : 1),
        biasField,
        diameter * (parameter.equals("diameter") ? factor : 1),
        thickness,
        saturationMagnetization,
        damping,
        resistanceArea * (parameter.equals("resistance-area") ? factor : 1),
        magnetoresistance * (parameter.equals("magnetoresistance") ? factor : 1),
        polarization,
        readVoltage,
        barrier,
        tolerances);
  }

  private static void positive(String name, double value) {
    if (!(value > 0 && Double.isFinite(value))) {
      throw new IllegalArgumentException(name + " must be positive, got " + value);
    }
  }
}
