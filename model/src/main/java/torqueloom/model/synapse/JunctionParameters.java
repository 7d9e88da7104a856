package torqueloom.model.synapse;

import java.util.Collections;
import java.util.Map;
import java.util.TreeMap;
import torqueloom.model.tolerance.Spread;

/**
 * A tunnel junction used as a tunable weight. All values are SI.
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

  /** Sorts and copies the tolerances. */
  public JunctionParameters {
    tolerances = Collections.unmodifiableMap(new TreeMap<>(tolerances));
  }
}
