package torqueloom.model.constants;

/**
 * Physical constants in SI units, as recommended by CODATA in 2022: P. J. Mohr, D. B. Newell, B. N.
 * Taylor, E. Tiesinga, arXiv:2409.03787. Those the SI of 2019 fixes are exact; the others carry the
 * standard uncertainty of the adjustment. The digits are those of the table in scipy 1.17.1.
 */
public final class PhysicalConstants {
  /** Elementary charge e (C): SI 2019, exact. */
  public static final double ELEMENTARY_CHARGE = 1.602176634e-19;

  /** Planck constant h (J s): SI 2019, exact. */
  public static final double PLANCK = 6.62607015e-34;

  /** Reduced Planck constant ħ = h/(2π) (J s): SI 2019, exact up to rounding. */
  public static final double REDUCED_PLANCK = PLANCK / (2 * Math.PI);

  /** Boltzmann constant k_B (J/K): SI 2019, exact. */
  public static final double BOLTZMANN = 1.380649e-23;

  /** Vacuum permeability µ0 (N/A² = T m/A): CODATA 2022, 1.25663706127(20)e-6. */
  public static final double VACUUM_PERMEABILITY = 1.25663706127e-6;

  /** Bohr magneton µ_B (J/T): CODATA 2022, 9.2740100657(29)e-24. */
  public static final double BOHR_MAGNETON = 9.2740100657e-24;

  /** Magnitude of the electron's g factor |g_e| (1): CODATA 2022, 2.00231930436092(36). */
  public static final double ELECTRON_G_FACTOR = 2.00231930436092;

  /**
   * Gyromagnetic ratio of the electron γ = |g_e| µ_B/ħ &gt; 0 (rad/(s T)), from the three values
   * above; CODATA 2022 lists 1.76085962784(55)e11.
   */
  public static final double GYROMAGNETIC_RATIO =
      ELECTRON_G_FACTOR * BOHR_MAGNETON / REDUCED_PLANCK;

  /** Magnetic flux quantum Φ0 = h/(2e) (Wb): SI 2019, exact up to rounding. */
  public static final double FLUX_QUANTUM = PLANCK / (2 * ELEMENTARY_CHARGE);

  /** Josephson constant K_J = 2e/h (Hz/V): SI 2019, exact up to rounding. */
  public static final double JOSEPHSON = 2 * ELEMENTARY_CHARGE / PLANCK;

  private PhysicalConstants() {}
}
