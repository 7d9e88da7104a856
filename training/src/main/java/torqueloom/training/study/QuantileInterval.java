package torqueloom.training.study;

import java.util.Arrays;
import java.util.function.IntPredicate;

/**
 * Quantiles of independent values with anytime-valid intervals: they hold their confidence at every
 * number of values at once, so values may be added until the interval decides.
 */
public final class QuantileInterval {
  private QuantileInterval() {}

  /**
   * Quantile q with its interval. A value v stays in the interval as long as the anytime-valid
   * interval of {@link ProportionInterval#anytime} for P(value &lt;= v) reaches up to q and that for
   * P(value &lt; v) down to q. Values may tie: with ties broken at random both counts bracket one
   * binomial count of success probability q, so one error probability serves both ends (derived
   * here).
   *
   * @param values independent draws of one distribution, in any order, at least one
   * @param q level of the quantile, in (0, 1)
   * @param confidence C, in (0, 1)
   * @param least the least value there can be; the lower end where too few values are known
   * @param greatest the greatest value there can be
   * @throws IllegalArgumentException if there is no value, one is NaN, or a share is out of range
   */
  public static Interval anytime(
      double[] values, double q, double confidence, double least, double greatest) {
    final double[] sorted = sorted(values, q);
    final int n = sorted.length;
    // The least count whose interval reaches up to q, and the greatest whose interval reaches down;
    // both ends of the interval grow with the count.
    final int low = least(n, count -> ProportionInterval.anytime(count, n, confidence).high() >= q);
    final int high =
        least(n, count -> ProportionInterval.anytime(count, n, confidence).low() > q) - 1;
    return new Interval(
        quantile(sorted, q),
        low == 0 ? least : sorted[low - 1],
        high == n ? greatest : sorted[high]);
  }

  /** The least count of 0..n for which a monotone condition holds; n + 1 if it holds for none. */
  private static int least(int n, IntPredicate condition) {
    int no = -1;
    int yes = n + 1;
    while (yes - no > 1) {
      final int middle = (no + yes) >>> 1;
      if (condition.test(middle)) {
        yes = middle;
      } else {
        no = middle;
      }
    }
    return yes;
  }

  /**
   * Sample quantile by linear interpolation between order statistics: position q(n-1) counted from
   * 0 (definition 7 of R. J. Hyndman and Y. Fan, Am. Stat. 50, 361 (1996), from memory).
   *
   * @throws IllegalArgumentException if there is no value, one is NaN, or q is out of range
   */
  public static double of(double[] values, double q) {
    return quantile(sorted(values, q), q);
  }

  private static double[] sorted(double[] values, double q) {
    if (values.length == 0 || !(q > 0 && q < 1)) {
      throw new IllegalArgumentException(
          "need at least one value and 0 < q < 1, got " + values.length + " and " + q);
    }
    final double[] sorted = values.clone();
    Arrays.sort(sorted);
    if (Double.isNaN(sorted[sorted.length - 1])) {
      throw new IllegalArgumentException("values must not be NaN");
    }
    return sorted;
  }

  private static double quantile(double[] sorted, double q) {
    final double position = q * (sorted.length - 1);
    final int below = (int) position;
    final int above = Math.min(below + 1, sorted.length - 1);
    return sorted[below] + (position - below) * (sorted[above] - sorted[below]);
  }
}
