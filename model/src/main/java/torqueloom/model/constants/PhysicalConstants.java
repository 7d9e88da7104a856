package torqueloom.model.constants;

/**
 * Physical constants, SI, CODATA 2022 (P. J. Mohr, D. B. Newell, B. N. Taylor, E. Tiesinga,
 * arXiv:2409.03787; digits from memory). Exact where the SI of 2019 fixes them.
 */
public final class PhysicalConstants {
  /** Elementary charge e (C), exact. */
  public static final double ELEMENTARY_CHARGE = 1.602176634e-19;

  /** Planck constant h (J s), exact. */
  public static final double PLANCK = 6.62607015e-34;

  /** Reduced Planck constant h/(2 pi) (J s). */
  public static final double REDUCED_PLANCK = PLANCK / (2 * Math.PI);

  /** Boltzmann constant k_B (J/K), exact. */
  public static final double BOLTZMANN = 1.380649e-23;

  /** Vacuum permeability mu_0 (T m/A). */
  public static final double VACUUM_PERMEABILITY = 1.25663706127e-6;

  /** Bohr magneton (J/T). */
  public static final double BOHR_MAGNETON = 9.2740100657e-24;

  /** Magnitude of the electron's g factor (1). */
  public static final double ELECTRON_G_FACTOR = 2.00231930436092;

  /** Gyromagnetic ratio gamma = |g| mu_B/hbar &gt; 0 (rad/(s T)). */
  public static final double GYROMAGNETIC_RATIO =
      ELECTRON_G_FACTOR * BOHR_MAGNETON / REDUCED_PLANCK;

  /** Magnetic flux quantum h/(2e) (Wb). */
  public static final double FLUX_QUANTUM = PLANCK / (2 * ELEMENTARY_CHARGE);

  /** Josephson constant 2e/h (Hz/V). */
  public static final double JOSEPHSON = 2 * ELEMENTARY_CHARGE / PLANCK;

  private PhysicalConstants() {}
}
