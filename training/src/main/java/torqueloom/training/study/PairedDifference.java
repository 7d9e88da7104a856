package torqueloom.training.study;

import java.util.Arrays;
import org.apache.commons.math3.distribution.BinomialDistribution;
import org.apache.commons.math3.distribution.TDistribution;
import org.apache.commons.math3.stat.StatUtils;

/**
 * Intervals of a typical difference between two treatments of the same chips, from the differences
 * chip by chip. The number of chips must have been fixed beforehand.
 */
public final class PairedDifference {
  private PairedDifference() {}

  /**
   * Mean difference with Student's t interval: exact for normal differences, good for many.
   *
   * @param differences at least two, finite
   * @param confidence C, in (0, 1)
   * @throws IllegalArgumentException if there are fewer than two differences or one is not finite
   */
  public static Interval mean(double[] differences, double confidence) {
    check(differences, 2, confidence);
    final int n = differences.length;
    final double mean = StatUtils.mean(differences);
    final double t =
        new TDistribution(null, n - 1, 1e-14).inverseCumulativeProbability(0.5 + 0.5 * confidence);
    final double half = t * Math.sqrt(StatUtils.variance(differences, mean) / n);
    return new Interval(mean, mean - half, mean + half);
  }

  /**
   * Median difference with the interval that inverts the sign test: from the k-th smallest to the
   * k-th greatest difference, k the greatest number with P(Binomial(n, 1/2) &lt; k) &lt;= (1-C)/2.
   * Free of assumptions on the distribution; ties only make it wider than needed. With too few
   * differences for the confidence the ends are infinite.
   *
   * @param differences at least one, finite
   * @param confidence C, in (0, 1)
   * @throws IllegalArgumentException if there is no difference or one is not finite
   */
  public static Interval median(double[] differences, double confidence) {
    check(differences, 1, confidence);
    final int n = differences.length;
    final double[] sorted = differences.clone();
    Arrays.sort(sorted);
    final BinomialDistribution signs = new BinomialDistribution(null, n, 0.5);
    int k = 0;
    while (signs.cumulativeProbability(k) <= 0.5 * (1 - confidence)) {
      k++;
    }
    return new Interval(
        QuantileInterval.of(sorted, 0.5),
        k == 0 ? Double.NEGATIVE_INFINITY : sorted[k - 1],
        k == 0 ? Double.POSITIVE_INFINITY : sorted[n - k]);
  }

  private static void check(double[] differences, int least, double confidence) {
    if (differences.length < least || !(confidence > 0 && confidence < 1)) {
      throw new IllegalArgumentException(
          "need at least "
              + least
              + " differences and 0 < confidence < 1, got "
              + differences.length
              + " and "
              + confidence);
    }
    for (final double difference : differences) {
      if (!Double.isFinite(difference)) {
        throw new IllegalArgumentException("differences must be finite, got " + difference);
      }
    }
  }
}
