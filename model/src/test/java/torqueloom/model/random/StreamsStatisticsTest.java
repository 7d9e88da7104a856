package torqueloom.model.random;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import org.apache.commons.math3.distribution.ChiSquaredDistribution;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Statistics of the streams. Keys are fixed, so the tests never fail by chance in the build; with
 * fresh keys each single check would fail once in {@value #ONE_IN} runs of a perfect generator (chi
 * square two-sided, so that too even is as wrong as too uneven).
 */
class StreamsStatisticsTest {
  private static final int ONE_IN = 10_000;

  /** A standard normal lies outside plus and minus this once in 10,000 times. */
  private static final double NORMAL_LIMIT = 3.8906;

  private static final int CELLS = 256;
  private static final int DRAWS = 200_000;

  @ParameterizedTest
  @EnumSource(Purpose.class)
  void uniformFillsItsCellsEvenlyAlongTheCounter(Purpose purpose) {
    final long key = Streams.key(20261, purpose, 3);
    assertEven(i -> Streams.uniform(key, i), CELLS);
  }

  /** Neighboring indices are what chips, devices and samples use. */
  @Test
  void uniformFillsItsCellsEvenlyAlongAnIndexAndTheSeed() {
    assertEven(i -> Streams.uniform(Streams.key(1, Purpose.CHIP_NEURON, i, 0, 0), 0), CELLS);
    assertEven(i -> Streams.uniform(Streams.key(1, Purpose.CHIP_NEURON, 0, 0, i), 0), CELLS);
    assertEven(i -> Streams.uniform(Streams.key(i, Purpose.CHIP_NEURON, 0, 0, 0), 0), CELLS);
    final long parent = Streams.key(1, Purpose.CHIP_COUNTS);
    assertEven(i -> Streams.uniform(Streams.subKey(parent, i), 0), CELLS);
  }

  /** The low bits of the 64 are used by integer draws of other kinds, so they count too. */
  @Test
  void lowBitsAreEven() {
    final long key = Streams.key(2, Purpose.TASK_DATA);
    assertEven(i -> (Streams.bits(key, i) & 0xFF) / 256.0, CELLS);
  }

  /** Pairs fill a 16 x 16 grid: next counter, next index, next purpose. */
  @Test
  void neighborsAreIndependent() {
    final long key = Streams.key(3, Purpose.CHIP_NEURON, 1);
    final long parent = Streams.key(3, Purpose.CHIP_NEURON);
    assertEven(i -> pair(Streams.uniform(key, 2L * i), Streams.uniform(key, 2L * i + 1)), CELLS);
    assertEven(
        i ->
            pair(
                Streams.uniform(Streams.subKey(parent, i), 0),
                Streams.uniform(Streams.subKey(parent, i + 1L), 0)),
        CELLS);
    assertEven(
        i ->
            pair(
                Streams.uniform(Streams.key(i, Purpose.CHIP_NEURON, 5), 0),
                Streams.uniform(Streams.key(i, Purpose.CHIP_SYNAPSE, 5), 0)),
        CELLS);
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 10, 97})
  void belowGivesEachNumberAlike(int bound) {
    final long key = Streams.key(4, Purpose.BOOTSTRAP, bound);
    assertEven(i -> (Streams.below(key, i, bound) + 0.5) / bound, bound);
  }

  /** Standard errors of the moments of n normals: sqrt(1/n), sqrt(2/n), sqrt(6/n), sqrt(24/n). */
  @Test
  void normalHasTheMomentsOfTheNormalDistribution() {
    final long key = Streams.key(5, Purpose.CALIBRATION_NOISE);
    final double[] moments = new double[5];
    for (int i = 0; i < DRAWS; i++) {
      final double z = Streams.normal(key, i);
      for (int power = 1; power <= 4; power++) {
        moments[power] += Math.pow(z, power) / DRAWS;
      }
    }
    final double n = DRAWS;
    assertEquals(0, moments[1], NORMAL_LIMIT * Math.sqrt(1 / n));
    assertEquals(1, moments[2], NORMAL_LIMIT * Math.sqrt(2 / n));
    // Third and fourth Hermite polynomials, whose estimates are uncorrelated with the lower ones.
    assertEquals(0, moments[3] - 3 * moments[1], NORMAL_LIMIT * Math.sqrt(6 / n));
    assertEquals(0, moments[4] - 6 * moments[2] + 3, NORMAL_LIMIT * Math.sqrt(24 / n));
  }

  @Test
  void normalHasTheNormalDistribution() {
    final long key = Streams.key(6, Purpose.CALIBRATION_NOISE);
    assertEven(i -> 0.5 * Erf.erfc(-Streams.normal(key, i) / Math.sqrt(2)), 64);
  }

  @ParameterizedTest
  @ValueSource(doubles = {1, 2, 4})
  void truncatedNormalHasTheTruncatedDistribution(double limit) {
    final long key = Streams.key(7, Purpose.CHIP_SYNAPSE, (long) limit);
    final double tail = 0.5 * Erf.erfc(limit / Math.sqrt(2));
    assertEven(
        i -> {
          final double z = Streams.truncatedNormal(key, i, limit);
          return (0.5 * Erf.erfc(-z / Math.sqrt(2)) - tail) / (1 - 2 * tail);
        },
        64);
  }

  /** All 24 orders of four things, each from its own stream. */
  @Test
  void permutationsComeAlike() {
    assertEven(
        i -> {
          final int[] order = Streams.permutation(Streams.key(8, Purpose.EPOCH_ORDER, i), 4);
          final int rest = (order[1] > order[0] ? order[1] - 1 : order[1]) * 2;
          return (order[0] * 6 + rest + (order[2] > order[3] ? 1 : 0) + 0.5) / 24;
        },
        24);
  }

  /** A change of one input bit changes half of the output bits. */
  @Test
  void oneBitOfTheCounterOrIndexTurnsHalfOfTheBits() {
    final int trials = 2000;
    for (int bit = 0; bit < 64; bit++) {
      long changed = 0;
      long changedKeys = 0;
      for (int i = 0; i < trials; i++) {
        final long key = Streams.key(9, Purpose.REPLAY, i);
        changed += Long.bitCount(Streams.bits(key, i) ^ Streams.bits(key, i ^ (1L << bit)));
        changedKeys += Long.bitCount(Streams.subKey(key, i) ^ Streams.subKey(key, i ^ (1L << bit)));
      }
      // Each trial gives a binomial count of mean 32 and variance 16; 5 sigma over 128 checks: 1 in
      // 14,000.
      final double limit = 5 * Math.sqrt(16.0 / trials);
      assertEquals(32, (double) changed / trials, limit, "counter bit " + bit);
      assertEquals(32, (double) changedKeys / trials, limit, "index bit " + bit);
    }
  }

  private static double pair(double first, double second) {
    return ((int) (first * 16) * 16 + (int) (second * 16) + 0.5) / 256;
  }

  /** Pearson's chi square over equal cells of (0, 1). */
  private static void assertEven(IntToDoubleFunction draw, int cells) {
    final long[] counts = new long[cells];
    IntStream.range(0, DRAWS)
        .mapToDouble(draw)
        .forEach(u -> counts[Math.min(cells - 1, (int) (u * cells))]++);
    final double mean = (double) DRAWS / cells;
    double chiSquare = 0;
    for (final long count : counts) {
      chiSquare += (count - mean) * (count - mean) / mean;
    }
    final double below =
        new ChiSquaredDistribution(null, cells - 1.0).cumulativeProbability(chiSquare);
    assertTrue(
        below > 0.5 / ONE_IN && below < 1 - 0.5 / ONE_IN,
        "chi square " + chiSquare + " of " + cells + " cells lies at quantile " + below);
  }
}
