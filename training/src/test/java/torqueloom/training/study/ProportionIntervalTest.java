package torqueloom.training.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

class ProportionIntervalTest {
  /**
   * The first four are worked cases of R. G. Newcombe, Stat. Med. 17, 857 (1998) (from memory; he
   * prints four digits), all eight digits computed independently with scipy.
   */
  @ParameterizedTest
  @CsvSource({
    "81, 263, .25528852, .36620958, .25273675, .36762192",
    "15, 148, .06238640, .16048724, .05784401, .16165049",
    "0, 20, 0, .16112516, 0, .16843347",
    "1, 29, .00611321, .17175522, .00087265, .17764430",
    "950, 1000, .93468618, .96186974, .93460951, .96266460",
  })
  void wilsonAndClopperPearsonMatchPublishedCases(
      long x, long n, double low, double high, double exactLow, double exactHigh) {
    final Interval wilson = ProportionInterval.wilson(x, n, 0.95);
    assertEquals(low, wilson.low(), 6e-9);
    assertEquals(high, wilson.high(), 6e-9);
    final Interval exact = ProportionInterval.clopperPearson(x, n, 0.95);
    assertEquals(exactLow, exact.low(), 6e-9);
    assertEquals(exactHigh, exact.high(), 6e-9);
    assertEquals((double) x / n, exact.estimate());
  }

  /** Computed independently with scipy from the formula of Robbins (1970). */
  @ParameterizedTest
  @CsvSource({
    "190, 200, .87934112, .98639990",
    "18, 20, .59127024, .99626637",
    "950, 1000, .92076042, .97128008",
    "0, 20, 0, .22400611",
    "53, 53, .90048419, 1",
    "52, 52, .89883463, 1",
  })
  void anytimeIntervalMatchesIndependentNumbers(long x, long n, double low, double high) {
    final Interval interval = ProportionInterval.anytime(x, n, 0.95);
    assertEquals(low, interval.low(), 6e-9);
    assertEquals(high, interval.high(), 6e-9);
  }

  @Test
  void nothingIsKnownBeforeTheFirstTrial() {
    assertEquals(new Interval(0.5, 0, 1), ProportionInterval.anytime(0, 0, 0.95));
  }

  /** Handbook values of the success run, n = ln(1-C)/ln R rounded up; with failures binomial. */
  @ParameterizedTest
  @CsvSource({
    ".95, .95, 0, 59",
    ".9, .9, 0, 22",
    ".95, .99, 0, 299",
    ".99, .999, 0, 4603",
    ".95, .95, 1, 93",
    ".95, .95, 2, 124",
  })
  void successRunMatchesHandbooks(double confidence, double proportion, int failures, int n) {
    assertEquals(n, ProportionInterval.successRun(confidence, proportion, failures));
  }

  /** 98 of 100: lower end .9383808, computed independently with scipy. */
  @Test
  void oneSidedLowerEnd() {
    assertEquals(.9383808, ProportionInterval.clopperPearsonLower(98, 100, 0.95), 6e-8);
  }

  /** A success run with k failures is just where the one-sided lower end passes the proportion. */
  @ParameterizedTest
  @CsvSource({"0", "1", "2", "7"})
  void successRunAgreesWithTheOneSidedLowerEnd(int failures) {
    final int n = ProportionInterval.successRun(0.95, 0.9, failures);
    assertTrue(ProportionInterval.clopperPearsonLower(n - failures, n, 0.95) >= 0.9);
    assertTrue(ProportionInterval.clopperPearsonLower(n - 1 - failures, n - 1, 0.95) < 0.9);
  }

  @ParameterizedTest
  @CsvSource({"-1, 5, .9", "6, 5, .9", "0, 0, .9", "1, 5, 0", "1, 5, 1", "1, 5, NaN"})
  void refusesImpossibleCounts(long x, long n, double confidence) {
    assertThrows(IllegalArgumentException.class, () -> ProportionInterval.wilson(x, n, confidence));
    assertThrows(
        IllegalArgumentException.class, () -> ProportionInterval.clopperPearson(x, n, confidence));
  }

  /**
   * Trials are added until the interval excludes the true p, or 1000 of them. At most 5 % of such
   * runs may ever exclude it; over 1000 runs more than 90 exclusions would then have a probability
   * below 1e-7. Clopper-Pearson, made for a fixed n, must be caught: its long-run share here is
   * about 0.3, and fewer than 150 exclusions would have a probability below 1e-20.
   */
  @ParameterizedTest
  @CsvSource({"0.9", "0.98"})
  void anytimeIntervalSurvivesOptionalStopping(double p) {
    int anytime = 0;
    int fixed = 0;
    for (int run = 0; run < 1000; run++) {
      anytime += everExcludes(p, run, 1000, true) ? 1 : 0;
      fixed += everExcludes(p, run, 1000, false) ? 1 : 0;
    }
    assertTrue(anytime <= 90, anytime + " of 1000 runs excluded the true p = " + p);
    assertTrue(fixed >= 150, fixed + " of 1000 runs: the test would not see optional stopping");
  }

  /** The same with ten times the runs and trials; false-alarm rate below 1e-7 (limit 0.05 + 5.2 SD). */
  @Test
  @Tag("slow")
  void anytimeIntervalSurvivesLongOptionalStopping() {
    int excluded = 0;
    for (int run = 0; run < 10_000; run++) {
      excluded += everExcludes(0.9, 5000 + run, 10_000, true) ? 1 : 0;
    }
    assertTrue(excluded <= 614, excluded + " of 10000 runs excluded the true p");
  }

  /** Looks at every tenth trial; the interval is left out where its estimate is near p anyway. */
  private static boolean everExcludes(double p, long run, int trials, boolean anytime) {
    final long key = Streams.key(1927, Purpose.BOOTSTRAP, run, Double.doubleToLongBits(p));
    long x = 0;
    for (int n = 1; n <= trials; n++) {
      x += Streams.uniform(key, n) < p ? 1 : 0;
      final boolean near = Math.abs((double) x / n - p) < Math.sqrt(p * (1 - p) / n);
      if (n % 10 == 0 && !near) {
        final Interval interval =
            anytime
                ? ProportionInterval.anytime(x, n, 0.95)
                : ProportionInterval.clopperPearson(x, n, 0.95);
        if (p < interval.low() || p > interval.high()) {
          return true;
        }
      }
    }
    return false;
  }
}
