package torqueloom.model.magnet;

/**
 * Magnetization against temperature by Bloch's three-halves law, continued up to the Curie
 * temperature: M_s(T)/M_s(0) = 1 - (T/T_C)^(3/2).
 *
 * <p>Source: F. Bloch, Z. Phys. 61, 206 (1930), from memory. Domain: the law is exact only far below
 * T_C; near T_C it is an interpolation.
 */
public final class TemperatureScaling {
  private TemperatureScaling() {}

  /**
   * M_s(T)/M_s(T_0) (1).
   *
   * @param temperature T (K), &gt; 0
   * @param reference T_0 (K), &gt; 0
   * @param curie T_C (K), above both
   * @throws IllegalArgumentException if a temperature is not positive or not below T_C
   */
  public static double bloch(double temperature, double reference, double curie) {
    return share(temperature, curie) / share(reference, curie);
  }

  private static double share(double temperature, double curie) {
    if (!(temperature > 0 && temperature < curie)) {
      throw new IllegalArgumentException(
          "temperature must be above 0 K and below the Curie temperature of "
              + curie
              + " K, got "
              + temperature
              + " K");
    }
    final double ratio = temperature / curie;
    return 1 - ratio * Math.sqrt(ratio);
  }
}
