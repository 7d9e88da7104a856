package torqueloom.model.device;

import torqueloom.model.magnet.AxisFields;
import torqueloom.model.magnet.EquilibriumPlane;
import torqueloom.model.magnet.Resonance;
import torqueloom.model.magnet.SpinTorque;

/**
 * An easy-plane ferromagnet at one temperature: everything that follows from its parameters.
 *
 * @param temperature (K)
 * @param magnetization M_s(T) (A/m)
 * @param anisotropy K_i(T), trim included (J/m²)
 * @param factors demagnetizing factors (1)
 * @param fields axis fields (T)
 * @param plane equilibria in the x-z plane
 * @param thermalField k_B T/(M_s V) (T)
 * @param torquePerDrive B_DL per current density (T per A/m²)
 */
record FerromagnetState(
    double temperature,
    double magnetization,
    double anisotropy,
    double[] factors,
    AxisFields fields,
    EquilibriumPlane plane,
    double thermalField,
    double torquePerDrive) {

  static FerromagnetState of(EasyPlaneFerromagnet device, double temperature) {
    final Film film = device.film();
    final Outline outline = device.outline();
    final double reference = device.referenceTemperature();
    final double ms =
        film.saturationMagnetization()
            * film.temperatureLaw().magnetizationRatio(temperature, reference);
    final double ki =
        film.interfaceAnisotropy() * film.temperatureLaw().anisotropyRatio(temperature, reference)
            + device.trimShift();
    final double t = film.thickness();
    final double[] factors =
        outline.shape().demagnetizingFactors(outline.length(), outline.width(), t);
    final AxisFields fields = AxisFields.ofFilm(factors, ms, t, ki);
    return new FerromagnetState(
        temperature,
        ms,
        ki,
        factors,
        fields,
        new EquilibriumPlane(fields.imbalance(), device.biasField()),
        SpinTorque.thermalField(temperature, ms, outline.volume(t)),
        SpinTorque.fieldPerCurrentDensity(device.drive().spinHallAngle(), ms, t));
  }

  /** B_y - B_x (T). */
  double excessY() {
    return fields.y() - fields.x();
  }

  /** Equilibria in the x-y plane, which matter when y is not the hard axis. */
  EquilibriumPlane filmPlane() {
    return new EquilibriumPlane(excessY(), plane.biasField());
  }

  /** Whether the lowest energy lies outside the x-z plane. */
  boolean restsOffPlane() {
    final EquilibriumPlane film = filmPlane();
    return film.energy(film.restAngle()) < plane.energy(plane.restAngle()) - 1e-15;
  }

  private EquilibriumPlane restPlane() {
    return restsOffPlane() ? filmPlane() : plane;
  }

  /** Unit vectors of the rests, lowest energy first, [rests][3]. */
  double[][] restDirections() {
    final boolean off = restsOffPlane();
    final double[] angles = restPlane().restAngles();
    final double[][] directions = new double[angles.length][];
    for (int i = 0; i < angles.length; i++) {
      final double c = StrictMath.cos(angles[i]);
      final double s = angles[i] == Math.PI ? 0 : StrictMath.sin(angles[i]);
      directions[i] = off ? new double[] {c, s, 0} : new double[] {c, 0, s};
    }
    return directions;
  }

  /** Stiffness fields at a rest: in its plane, then out of it (T). */
  double[] stiffness(int rest) {
    final EquilibriumPlane own = restPlane();
    final double angle = own.restAngles()[rest];
    final double other = restsOffPlane() ? fields.imbalance() : excessY();
    return new double[] {own.planeStiffness(angle), own.poleStiffness(angle, other)};
  }

  /**
   * Barrier per moment of the first rest (T): the lower of the way through the normal and, where y
   * is not the hard axis, the way through y.
   */
  double barrier() {
    if (restsOffPlane() || excessY() < fields.imbalance()) {
      return filmPlane().barrier();
    }
    return plane.barrier();
  }

  /** Thermal stability factor Delta (1). */
  double thermalStability() {
    return barrier() / thermalField;
  }

  /** Ring-down time of the slowest mode at the first rest (s), infinite without stiffness. */
  double ringDown(double damping) {
    final double[] stiff = stiffness(0);
    return 1 / Resonance.slowestDecayRate(damping, stiff[0], stiff[1]);
  }
}
