package torqueloom.training.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PairedDifferenceTest {
  /** Student's interval of these ten values, computed independently with scipy. */
  @Test
  void meanMatchesStudentsInterval() {
    final double[] values = {.912, .905, .921, .897, .915, .909, .918, .902, .911, .907};
    final Interval interval = PairedDifference.mean(values, 0.95);
    assertEquals(.9097, interval.estimate(), 1e-15);
    assertEquals(.904464356, interval.low(), 5e-10);
    assertEquals(.914935644, interval.high(), 5e-10);
  }

  /**
   * Ranks of the sign-test interval for the median at 95 %, as tabled in textbooks of nonparametric
   * statistics (from memory; recomputed from the binomial distribution with scipy).
   */
  @ParameterizedTest
  @CsvSource({"6, 1, 6", "10, 2, 9", "20, 6, 15", "25, 8, 18", "50, 18, 33", "100, 40, 61"})
  void medianMatchesTabledRanks(int n, double low, double high) {
    final double[] values = IntStream.rangeClosed(1, n).asDoubleStream().toArray();
    assertEquals(new Interval(0.5 * (n + 1), low, high), PairedDifference.median(values, 0.95));
  }

  @Test
  void fiveValuesCannotGive95PerCent() {
    final Interval interval = PairedDifference.median(new double[] {1, 2, 3, 4, 5}, 0.95);
    assertEquals(Double.NEGATIVE_INFINITY, interval.low());
    assertEquals(Double.POSITIVE_INFINITY, interval.high());
  }

  @Test
  void refusesTooFewOrInfinite() {
    assertThrows(
        IllegalArgumentException.class, () -> PairedDifference.mean(new double[] {1}, 0.95));
    assertThrows(
        IllegalArgumentException.class,
        () -> PairedDifference.median(new double[] {1, Double.NaN}, 0.95));
  }
}
