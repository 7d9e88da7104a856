package torqueloom.model.device;

import torqueloom.model.magnet.TemperatureScaling;

/**
 * How magnetization and interfacial anisotropy follow the temperature.
 *
 * <p>With {@link Magnetization#BLOCH}, M_s(T) = M_s(T_0) (1 - (T/T_C)^1.5)/(1 - (T_0/T_C)^1.5) and
 * K_i(T) = K_i(T_0) (M_s(T)/M_s(T_0))^n, T_0 being the temperature at which the film is stated.
 * With {@link Magnetization#NONE} both stay as stated.
 *
 * @param magnetization law of the magnetization
 * @param curieTemperature T_C (K), &gt; 0; unused without a law
 * @param anisotropyExponent n (1), finite and &gt;= 0; unused without a law
 */
public record TemperatureLaw(
    Magnetization magnetization, double curieTemperature, double anisotropyExponent) {

  /** Laws of the magnetization. */
  public enum Magnetization {
    /** Temperature changes the thermal noise only. */
    NONE,
    /** Bloch's three-halves law, continued up to the Curie temperature. */
    BLOCH
  }

  /** Parameters that do not depend on the temperature. */
  public static final TemperatureLaw NONE = new TemperatureLaw(Magnetization.NONE, 1, 0);

  /** @throws IllegalArgumentException naming the first value that is NaN or out of range */
  public TemperatureLaw {
    Require.present("magnetization", magnetization);
    Require.positive("curie-temperature", curieTemperature, "K");
    Require.notNegative("anisotropy-exponent", anisotropyExponent, "1");
  }

  /**
   * M_s(T)/M_s(T_0) (1).
   *
   * @param temperature T (K)
   * @param reference T_0 (K)
   * @throws IllegalArgumentException if a temperature is not positive, or not below the Curie
   *     temperature of the law
   */
  public double magnetizationRatio(double temperature, double reference) {
    Require.positive("temperature", temperature, "K");
    if (magnetization == Magnetization.NONE) {
      return 1;
    }
    return TemperatureScaling.bloch(temperature, reference, curieTemperature);
  }

  /** K_i(T)/K_i(T_0) (1); arguments and errors as for {@link #magnetizationRatio}. */
  public double anisotropyRatio(double temperature, double reference) {
    final double ratio = magnetizationRatio(temperature, reference);
    return magnetization == Magnetization.NONE ? 1 : StrictMath.pow(ratio, anisotropyExponent);
  }
}
