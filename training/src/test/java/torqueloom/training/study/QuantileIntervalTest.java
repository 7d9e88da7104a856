package torqueloom.training.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

class QuantileIntervalTest {
  private static double[] oneTo(int n) {
    return IntStream.rangeClosed(1, n).asDoubleStream().toArray();
  }

  /**
   * Values 1..n: the lower end must be the least k whose anytime interval reaches up to q, the upper
   * one the k+1 after the greatest that reaches down; searched here over all k by brute force.
   */
  @ParameterizedTest
  @CsvSource({"200, 0.5", "37, 0.5", "1000, 0.05", "1000, 0.95", "60, 0.9"})
  void endsAreTheOrderStatisticsThatTheProportionAllows(int n, double q) {
    int low = 0;
    while (ProportionInterval.anytime(low, n, 0.95).high() < q) {
      low++;
    }
    int high = n;
    while (ProportionInterval.anytime(high, n, 0.95).low() > q) {
      high--;
    }
    final Interval interval = QuantileInterval.anytime(oneTo(n), q, 0.95, -5, 9999);
    assertEquals(low == 0 ? -5 : low, interval.low());
    assertEquals(high == n ? 9999 : high + 1, interval.high());
    assertEquals(1 + q * (n - 1), interval.estimate(), 1e-9);
  }

  @Test
  void fewValuesLeaveTheWholeRange() {
    assertEquals(
        new Interval(0.7, 0, 1),
        QuantileInterval.anytime(new double[] {0.8, 0.6, 0.7}, 0.5, 0.95, 0, 1));
  }

  @Test
  void tiesStayInside() {
    final double[] same = new double[100];
    java.util.Arrays.fill(same, 0.9);
    assertEquals(new Interval(0.9, 0.9, 0.9), QuantileInterval.anytime(same, 0.5, 0.95, 0, 1));
  }

  /**
   * Values with many ties (tenths), growing in steps of 20 up to 400; at most 5 % of runs may ever
   * exclude the true median 0.5. More than 45 of 400 would have a probability below 1e-6.
   */
  @Test
  void coversUnderOptionalStoppingWithTies() {
    int excluded = 0;
    for (int run = 0; run < 400; run++) {
      excluded += everExcludes(run) ? 1 : 0;
    }
    assertTrue(excluded <= 45, excluded + " of 400");
  }

  private static boolean everExcludes(int run) {
    final long key = Streams.key(7, Purpose.BOOTSTRAP, run);
    for (int n = 20; n <= 400; n += 20) {
      final double[] values = new double[n];
      for (int i = 0; i < n; i++) {
        values[i] = Math.rint(10 * Streams.uniform(key, i)) / 10;
      }
      final Interval interval = QuantileInterval.anytime(values, 0.5, 0.95, 0, 1);
      if (interval.low() > 0.5 || interval.high() < 0.5) {
        return true;
      }
    }
    return false;
  }

  @Test
  void refusesNothingAndNaN() {
    assertThrows(IllegalArgumentException.class, () -> QuantileInterval.of(new double[0], 0.5));
    assertThrows(
        IllegalArgumentException.class,
        () -> QuantileInterval.of(new double[] {1, Double.NaN}, 0.5));
    assertThrows(IllegalArgumentException.class, () -> QuantileInterval.of(new double[] {1}, 1));
  }
}
