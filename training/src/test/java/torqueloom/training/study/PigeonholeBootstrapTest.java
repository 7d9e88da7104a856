package torqueloom.training.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

class PigeonholeBootstrapTest {
  /** Chips of one quality; cases of very different difficulty, the same for all chips. */
  private static byte[][] sharedCases(int chips, int cases) {
    final byte[][] table = new byte[chips][cases];
    for (int j = 0; j < cases; j++) {
      final boolean hard = Streams.uniform(Streams.key(1, Purpose.BOOTSTRAP, -1), j) < 0.1;
      for (int i = 0; i < chips; i++) {
        final double u = Streams.uniform(Streams.key(2, Purpose.BOOTSTRAP, -i - 1), j);
        table[i][j] = (byte) (u < (hard ? 0.05 : 0.995) ? 1 : 0);
      }
    }
    return table;
  }

  @Test
  void estimatesAreThoseOfTheTableAndTheTargetItselfPasses() {
    final byte[][] table = {{4, 4, 4, 4, 4}, {4, 4, 4, 2, 4}, {0, 4, 4, 4, 4}, {0, 4, 4, 3, 1}};
    final PigeonholeBootstrap.Result result =
        PigeonholeBootstrap.run(table, 4, 0.8, 0.9, 200, 1, 1);
    assertEquals(0.75, result.yield().estimate());
    assertEquals(0.5 * (0.8 + 0.9), result.median().estimate(), 1e-15);
  }

  @Test
  void threadsChangeNothing() {
    final byte[][] table = sharedCases(60, 150);
    assertEquals(
        PigeonholeBootstrap.run(table, 1, 0.9, 0.95, 300, 3, 1),
        PigeonholeBootstrap.run(table, 1, 0.9, 0.95, 300, 3, 3));
  }

  /**
   * With cases shared by all chips the median accuracy moves with the cases drawn: its standard
   * error is nearly that of a proportion over the cases, sqrt(p(1-p)/500) = 0.0134 at p = 0.9, so the
   * interval's half-width is near 1.96 times as much, 0.026; within a third for 1000 replicates, a
   * drawn share of hard cases and the median's own noise. Resampling chips alone gives a tenth.
   */
  @Test
  void newCasesWidenTheInterval() {
    final PigeonholeBootstrap.Result result =
        PigeonholeBootstrap.run(sharedCases(100, 500), 1, 0.9, 0.95, 1000, 5, 2);
    final double half = 0.5 * (result.median().high() - result.median().low());
    assertEquals(0.026, half, 0.009);
    assertTrue(result.yield().high() - result.yield().low() > 0.8, result.toString());
  }

  /** Noise of single cells only: added again by resampling, it pulls every yield below the estimate. */
  @Test
  void theIntervalHoldsItsEstimate() {
    final byte[][] table = new byte[200][400];
    for (int i = 0; i < table.length; i++) {
      for (int j = 0; j < table[i].length; j++) {
        table[i][j] =
            (byte) (Streams.uniform(Streams.key(3, Purpose.BOOTSTRAP, i), j) < 0.955 ? 1 : 0);
      }
    }
    final Interval yield = PigeonholeBootstrap.run(table, 1, 0.93, 0.95, 400, 1, 1).yield();
    assertTrue(yield.low() < 0.97 * yield.estimate(), yield.toString());
    assertEquals(yield.estimate(), yield.high());
  }

  /** Every chip right in every case: no resampling can change that. */
  @Test
  void perfectChipsStayPerfect() {
    final byte[][] table = {{2, 2, 2}, {2, 2, 2}};
    final Interval one = new Interval(1, 1, 1);
    assertEquals(
        new PigeonholeBootstrap.Result(one, one),
        PigeonholeBootstrap.run(table, 2, 1.0, 0.95, 100, 1, 1));
  }

  /**
   * One case only, so resampling cases changes nothing: yields are those of resampled chips. The
   * 2.5 and 97.5 percentiles of Binomial(50, 0.8)/50 are 0.68 and 0.9 (scipy); with 4000 replicates
   * the sample percentile stays within one chip of them (false alarms below 1e-6).
   */
  @Test
  void withOneCaseItIsTheOrdinaryBootstrapOverChips() {
    final byte[][] table = new byte[50][1];
    for (int i = 0; i < 40; i++) {
      table[i][0] = 1;
    }
    final Interval yield = PigeonholeBootstrap.run(table, 1, 1, 0.95, 4000, 9, 2).yield();
    assertEquals(0.68, yield.low(), 0.021);
    assertEquals(0.90, yield.high(), 0.021);
  }

  @Test
  void refusesWhatIsNoTable() {
    final byte[][] ragged = {{1, 0}, {1}};
    final byte[][] tooMany = {{2}};
    assertRefused(new byte[0][0], 1);
    assertRefused(ragged, 1);
    assertRefused(tooMany, 1);
    assertRefused(new byte[2][2], 0);
  }

  private static void assertRefused(byte[][] table, int passes) {
    assertThrows(
        IllegalArgumentException.class,
        () -> PigeonholeBootstrap.run(table, passes, 0.9, 0.95, 100, 1, 1));
  }
}
