package torqueloom.model.synapse;

/** Constants of the SI as revised in 2019 (BIPM, 9th SI brochure; exact, from memory). */
final class PhysicalConstants {
  /** Boltzmann constant k (J/K). */
  static final double BOLTZMANN = 1.380649e-23;

  /** Elementary charge e (C). */
  static final double ELEMENTARY_CHARGE = 1.602176634e-19;

  /** Reduced Planck constant (J s), h = 6.62607015e-34 J s over 2 pi. */
  static final double REDUCED_PLANCK = 6.62607015e-34 / (2 * Math.PI);

  private PhysicalConstants() {}
}
