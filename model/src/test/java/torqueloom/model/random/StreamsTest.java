package torqueloom.model.random;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.HashSet;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** What holds for every draw, and values frozen so that a change makes a person look again. */
class StreamsTest {
  private static final long FROZEN_KEY = 6003903987698996603L;
  private static final long FROZEN_BITS = 862063419699025385L;
  private static final double FROZEN_UNIFORM = 0.046732551622898355;
  private static final double FROZEN_NORMAL = -1.677395834018131;
  private static final int[] FROZEN_ORDER = {1, 2, 5, 3, 6, 7, 4, 0};

  /**
   * The finalizer with its golden-ratio counter is the generator SplitMix64; its first outputs for
   * seed 0, from memory as published with the reference code of S. Vigna, follow from {@code mix(n
   * * golden)}; {@code key} starts with the first of them.
   */
  @Test
  void finalizerGivesTheKnownSplitMixOutput() {
    assertEquals(0xE220A8397B1DCDAFL, Streams.mix(0x9E3779B97F4A7C15L));
    assertEquals(0x6E789E6AA1B965F4L, Streams.mix(2 * 0x9E3779B97F4A7C15L));
    assertEquals(0x06C45D188009454FL, Streams.mix(3 * 0x9E3779B97F4A7C15L));
  }

  /** Non-regression: these values enter every stored result. */
  @Test
  void valuesAreFrozen() {
    final long key = Streams.key(20261, Purpose.CHIP_NEURON, 3, 1, 4);
    assertEquals(FROZEN_KEY, key);
    assertEquals(FROZEN_BITS, Streams.bits(key, 7));
    assertEquals(FROZEN_UNIFORM, Streams.uniform(key, 7));
    assertEquals(FROZEN_NORMAL, Streams.normal(key, 7));
    assertArrayEquals(FROZEN_ORDER, Streams.permutation(key, 8));
  }

  @Test
  void uniformNeverReachesItsEnds() {
    assertEquals(0x1.0p-53, Streams.cellMiddle(0));
    assertEquals(1 - 0x1.0p-53, Streams.cellMiddle(-1));
    assertTrue(Double.isFinite(NormalQuantile.of(Streams.cellMiddle(0))));
    assertTrue(Double.isFinite(NormalQuantile.of(Streams.cellMiddle(-1))));
  }

  @Test
  void keysOfDifferentPlacesDiffer() {
    final Set<Long> keys = new HashSet<>();
    int made = 0;
    for (final Purpose purpose : Purpose.values()) {
      for (long seed = 0; seed < 4; seed++) {
        keys.add(Streams.key(seed, purpose));
        keys.add(Streams.key(seed, purpose, 0));
        keys.add(Streams.key(seed, purpose, 0, 0));
        keys.add(Streams.key(seed, purpose, 0, 1));
        keys.add(Streams.key(seed, purpose, 1, 0));
        made += 5;
      }
    }
    assertEquals(made, keys.size());
  }

  @Test
  void siblingStreamsDiffer() {
    final long parent = Streams.key(5, Purpose.CHIP_COUNTS, 2, 9);
    assertNotEquals(Streams.subKey(parent, 1), Streams.subKey(parent, 2));
    assertNotEquals(parent, Streams.subKey(parent, 0));
  }

  @Test
  void purposeCodesAreDistinctAndPositive() {
    final long[] codes =
        Arrays.stream(Purpose.values()).mapToLong(Purpose::code).distinct().toArray();
    assertEquals(Purpose.values().length, codes.length);
    assertTrue(Arrays.stream(codes).allMatch(code -> code > 0));
  }

  @Test
  void belowStaysInRangeAndRefusesNothingToChooseFrom() {
    final long key = Streams.key(1, Purpose.TASK_DATA);
    for (int bound : new int[] {1, 2, 3, 1000, Integer.MAX_VALUE}) {
      for (int i = 0; i < 1000; i++) {
        final int value = Streams.below(key, i, bound);
        assertTrue(value >= 0 && value < bound, "bound " + bound + " gave " + value);
      }
    }
    assertThrows(IllegalArgumentException.class, () -> Streams.below(key, 0, 0));
  }

  @Test
  void permutationHoldsEveryIndexOnce() {
    final int[] order = Streams.permutation(Streams.key(1, Purpose.DATA_SPLIT, 0), 500);
    assertArrayEquals(IntStream.range(0, 500).toArray(), Arrays.stream(order).sorted().toArray());
  }

  @Test
  void truncatedNormalStaysInside() {
    final long key = Streams.key(1, Purpose.CHIP_SYNAPSE);
    for (double limit : new double[] {0.5, 2, 4}) {
      for (int i = 0; i < 20_000; i++) {
        final double z = Streams.truncatedNormal(key, i, limit);
        assertTrue(Math.abs(z) <= limit * (1 + 1e-8), "limit " + limit + " gave " + z);
      }
    }
  }
}
