package torqueloom.model.response;

/**
 * Interval of a binomial share by E. B. Wilson, J. Am. Stat. Assoc. 22, 209 (1927), 95 %, for a
 * number of trials fixed beforehand:
 *
 * <pre>  (p + z²/2n ± z sqrt(p(1-p)/n + z²/4n²))/(1 + z²/n)</pre>
 *
 * @param low lower end (1)
 * @param high upper end (1)
 */
public record WilsonInterval(double low, double high) {
  /** 97.5 % point of the normal distribution, to double precision (from memory). */
  private static final double Z = 1.959963984540054;

  /**
   * @param successes 0 to trials
   * @param trials &gt; 0
   */
  public static WilsonInterval of(int successes, int trials) {
    final double n = trials;
    final double p = successes / n;
    final double center = (p + Z * Z / (2 * n)) / (1 + Z * Z / n);
    final double half = Z * Math.sqrt(p * (1 - p) / n + Z * Z / (4 * n * n)) / (1 + Z * Z / n);
    return new WilsonInterval(
        successes == 0 ? 0 : center - half, successes == trials ? 1 : center + half);
  }

  /** Half of the width (1). */
  public double halfWidth() {
    return (high - low) / 2;
  }
}
