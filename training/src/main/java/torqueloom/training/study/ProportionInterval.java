package torqueloom.training.study;

import org.apache.commons.math3.distribution.BetaDistribution;
import org.apache.commons.math3.distribution.BinomialDistribution;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.special.Beta;

/**
 * Intervals of an unknown proportion p after x successes in n independent trials, two-sided unless
 * said otherwise. All take the confidence C in (0, 1) and give the estimate x/n with both ends.
 *
 * <p>{@link #wilson} and {@link #clopperPearson} hold their confidence only where n was fixed before
 * the first trial. Where trials are added until a decision falls, they do not (coverage drops to
 * 0.6-0.8 for 0.95), and {@link #anytime} is the one to use: it covers p at all n at once.
 */
public final class ProportionInterval {
  private static final double LOG_BETA_HALF = StrictMath.log(Math.PI);

  private ProportionInterval() {}

  /**
   * Score interval of E. B. Wilson, J. Am. Stat. Assoc. 22, 209 (1927),
   * doi:10.1080/01621459.1927.10502953 (from memory), without continuity correction.
   *
   * @throws IllegalArgumentException if not 0 &lt;= x &lt;= n, n &gt;= 1, 0 &lt; C &lt; 1
   */
  public static Interval wilson(long x, long n, double confidence) {
    check(x, n, confidence);
    final double z =
        new NormalDistribution(null, 0, 1).inverseCumulativeProbability(0.5 + 0.5 * confidence);
    final double p = (double) x / n;
    final double share = z * z / n;
    final double middle = (p + 0.5 * share) / (1 + share);
    final double half = z / (1 + share) * Math.sqrt((p * (1 - p) + 0.25 * share) / n);
    return new Interval(p, x == 0 ? 0 : middle - half, x == n ? 1 : middle + half);
  }

  /**
   * Exact interval of C. J. Clopper and E. S. Pearson, Biometrika 26, 404 (1934),
   * doi:10.1093/biomet/26.4.404 (from memory).
   *
   * @throws IllegalArgumentException if not 0 &lt;= x &lt;= n, n &gt;= 1, 0 &lt; C &lt; 1
   */
  public static Interval clopperPearson(long x, long n, double confidence) {
    check(x, n, confidence);
    final double tail = 0.5 * (1 - confidence);
    return new Interval((double) x / n, exactLower(x, n, tail), 1 - exactLower(n - x, n, tail));
  }

  /**
   * One-sided lower end of Clopper and Pearson: p is at least this with the given confidence.
   *
   * @throws IllegalArgumentException if not 0 &lt;= x &lt;= n, n &gt;= 1, 0 &lt; C &lt; 1
   */
  public static double clopperPearsonLower(long x, long n, double confidence) {
    check(x, n, confidence);
    return exactLower(x, n, 1 - confidence);
  }

  private static double exactLower(long x, long n, double tail) {
    return x == 0
        ? 0
        : new BetaDistribution(null, x, n - x + 1.0, 1e-14).inverseCumulativeProbability(tail);
  }

  /**
   * Anytime-valid interval: with probability at least C it covers p at every n at once, so trials
   * may be added until the interval decides. All p with
   *
   * <pre>  ln B(x+1/2, n-x+1/2) - ln B(1/2, 1/2) - x ln p - (n-x) ln(1-p) &lt; ln(1/(1-C)),</pre>
   *
   * the likelihood ratio of a Beta(1/2, 1/2) mixture against p, which is a martingale under p (H.
   * Robbins, Ann. Math. Stat. 41, 1397 (1970), doi:10.1214/aoms/1177696786, from memory).
   *
   * @param n may be 0, which gives the interval from 0 to 1 around an estimate of 1/2
   * @throws IllegalArgumentException if not 0 &lt;= x &lt;= n, 0 &lt; C &lt; 1
   */
  public static Interval anytime(long x, long n, double confidence) {
    if (n == 0 && x == 0) {
      return new Interval(0.5, 0, 1);
    }
    check(x, n, confidence);
    return new Interval(
        (double) x / n, anytimeLower(x, n, confidence), 1 - anytimeLower(n - x, n, confidence));
  }

  /** Root of the convex function of {@link #anytime} below its minimum x/n, by bisection. */
  private static double anytimeLower(long x, long n, double confidence) {
    if (x == 0) {
      return 0;
    }
    final double limit =
        Beta.logBeta(x + 0.5, n - x + 0.5) - LOG_BETA_HALF + StrictMath.log(1 - confidence);
    double outside = 0;
    double inside = (double) x / n;
    while (true) {
      final double middle = 0.5 * (outside + inside);
      if (middle <= outside || middle >= inside) {
        return inside;
      }
      final double failures = n == x ? 0 : (n - x) * StrictMath.log1p(-middle);
      if (limit < x * StrictMath.log(middle) + failures) {
        inside = middle;
      } else {
        outside = middle;
      }
    }
  }

  /**
   * Success run: the fewest trials which, with no more than the given number of failures, show that
   * p is at least {@code proportion} with the given confidence: the least n whose binomial
   * probability of at most that many failures at p = proportion is at most 1 - C. Without failures
   * this is ln(1-C)/ln(proportion), rounded up.
   *
   * @param failures allowed failures, &gt;= 0
   * @throws IllegalArgumentException if failures is negative or a share is not in (0, 1)
   */
  public static int successRun(double confidence, double proportion, int failures) {
    check(0, 1, confidence);
    if (!(proportion > 0 && proportion < 1) || failures < 0) {
      throw new IllegalArgumentException(
          "need 0 < proportion < 1 and failures >= 0, got " + proportion + ", " + failures);
    }
    int tooFew = failures;
    int enough = 2 * failures + 1;
    while (!shows(enough, confidence, proportion, failures)) {
      tooFew = enough;
      enough = Math.multiplyExact(enough, 2);
    }
    while (enough - tooFew > 1) {
      final int middle = (tooFew + enough) >>> 1;
      if (shows(middle, confidence, proportion, failures)) {
        enough = middle;
      } else {
        tooFew = middle;
      }
    }
    return enough;
  }

  private static boolean shows(int n, double confidence, double proportion, int failures) {
    return new BinomialDistribution(null, n, 1 - proportion).cumulativeProbability(failures)
        <= 1 - confidence;
  }

  private static void check(long x, long n, double confidence) {
    if (n < 1 || x < 0 || x > n || !(confidence > 0 && confidence < 1)) {
      throw new IllegalArgumentException(
          "need 0 <= x <= n, n >= 1 and 0 < confidence < 1, got x = "
              + x
              + ", n = "
              + n
              + ", confidence = "
              + confidence);
    }
  }
}
