package torqueloom.model.dynamics;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import torqueloom.model.random.Streams;

/** The vector kernel against the scalar one, bit for bit, over awkward numbers of replicas. */
class KernelEqualityTest {
  private static EnsembleKernel vector;
  private final EnsembleKernel scalar = new ScalarKernel();

  @BeforeAll
  static void vectorKernel() {
    final KernelChoice choice = KernelChoice.choose("vector");
    Assumptions.assumeTrue(choice.name().equals("vector"), choice.reason());
    vector = choice.kernel();
  }

  /** A tile whose replicas all differ, some of them extreme. */
  private static Tile tile(int seed) {
    final Tile tile = new Tile();
    for (int i = 0; i < Tile.CAPACITY; i++) {
      final long key = Streams.subKey(seed, i);
      tile.key0[i] = (int) key;
      tile.key1[i] = (int) (key >>> 32);
      tile.spin[i] =
          new MacrospinParameters(
              .01 + .9 * Streams.uniform(key, 0),
              .2 * Streams.uniform(key, 1) - .02,
              .05 * (Streams.uniform(key, 2) - .5),
              .01 * (Streams.uniform(key, 3) - .5),
              .01 * (Streams.uniform(key, 4) - .5),
              .01 * (Streams.uniform(key, 5) - .5),
              i % 7 == 0 ? 0 : 2e-3 * Streams.uniform(key, 6));
      tile.direct(
          i,
          Streams.normal(key, 7),
          Streams.normal(key, 8),
          i % 5 == 0 ? 0 : Streams.normal(key, 9));
      tile.filtered[i] = i % 3 == 0 ? -.3f : (float) Streams.normal(key, 10);
      tile.high[i] = i % 2 == 0 ? -1 : 0;
      tile.firstCount[i] = -1f;
    }
    tile.enter(new Segment(new TorqueField(12e-3, -3e-3), 1, 2, 3e-12));
    return tile;
  }

  private static void advance(EnsembleKernel kernel, Tile tile, int active, int frames) {
    final ReadConstants read =
        ReadConstants.of(new SignalChain(-.1, .9, .2, 9e9, 4e-11, -.3, .3), 6e-12);
    int pair = 0;
    for (int frame = 0; frame < frames; frame++) {
      kernel.drawGaussians(tile, active, 4 * pair++);
      kernel.step(tile, active, 0);
      kernel.step(tile, active, 3);
      kernel.drawReadNoise(tile, active, 4 * pair - 1);
      kernel.read(tile, active, read, frame * 6e-12f);
    }
  }

  @ParameterizedTest(name = "{0} replicas")
  @ValueSource(ints = {1, 2, 3, 7, 8, 15, 16, 17, 31, 33, 64, 100, 127, 128})
  void sameBits(int active) {
    final Tile one = tile(active);
    final Tile two = tile(active);
    advance(scalar, one, active, 400);
    advance(vector, two, active, 400);
    assertSame(one.mx, two.mx, active);
    assertSame(one.my, two.my, active);
    assertSame(one.mz, two.mz, active);
    assertSame(one.filtered, two.filtered, active);
    assertSame(one.slope, two.slope, active);
    assertSame(one.firstCount, two.firstCount, active);
    assertSame(one.counts, two.counts, active);
    assertSame(one.armed, two.armed, active);
    assertSame(one.high, two.high, active);
    assertSame(one.turns, two.turns, active);
    for (int row = 0; row < Tile.GAUSSIANS; row++) {
      final int from = row * Tile.CAPACITY;
      assertSame(
          Arrays.copyOfRange(one.gaussian, from, from + active),
          Arrays.copyOfRange(two.gaussian, from, from + active),
          active);
    }
    if (active > 64) {
      assertTrue(IntStream.of(one.counts).sum() > 0, "something was counted");
      assertTrue(IntStream.of(one.turns).anyMatch(t -> t != 0), "something was wound");
    }
  }

  private static void assertSame(float[] one, float[] two, int active) {
    for (int i = 0; i < active; i++) {
      assertEquals(Float.floatToRawIntBits(one[i]), Float.floatToRawIntBits(two[i]), "at " + i);
    }
  }

  private static void assertSame(int[] one, int[] two, int active) {
    assertArrayEquals(Arrays.copyOf(one, active), Arrays.copyOf(two, active));
  }

  private static SlotEnsemble ensemble() {
    return SlotEnsemble.of(
        new MacrospinParameters(.1, .0741, -.2e-3, 4e-3, 0, 0, 1.294e-4),
        SignalChain.ofMoment(2e9, 5e-12, -.3, .3),
        List.of(new RestLevel(1, 0, 0, 8e-3)),
        1.4e-9);
  }

  private static SlotTrials slots(SlotEnsemble ensemble, int trials) {
    return ensemble.run(
        new SlotProgram(new TorqueField(6.7e-3, 0), null, TorqueField.NONE, .5e-9, 4.5e-9),
        0,
        0,
        trials,
        99);
  }

  @ParameterizedTest(name = "{0} trials")
  @ValueSource(ints = {1, 130, 300})
  void sameSlots(int trials) {
    final SlotTrials one = slots(ensemble().withKernel(scalar), trials);
    final SlotTrials two = slots(ensemble().withKernel(vector), trials);
    assertArrayEquals(one.counts(), two.counts());
    assertArrayEquals(one.halfTurns(), two.halfTurns());
    assertArrayEquals(one.latencySeconds(), two.latencySeconds());
    assertArrayEquals(one.endLevels(), two.endLevels());
    assertEquals(one.meanPoleProjection(), two.meanPoleProjection());
    assertEquals(one.replicaSteps(), two.replicaSteps());
  }

  @Test
  void threadsDoNotMatter() {
    final SlotEnsemble shared = ensemble();
    final int[] alone = slots(shared, 256).counts();
    IntStream.range(0, 4)
        .parallel()
        .forEach(i -> assertArrayEquals(alone, slots(shared, 256).counts()));
  }

  /** Once compiled, the loops allocate nothing; the compiler is given up to 200 rounds. */
  @Test
  void noAllocationInTheHotLoops() {
    final ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
    final long self = Thread.currentThread().getId();
    final Tile tile = tile(5);
    long least = Long.MAX_VALUE;
    for (int round = 0; round < 200 && least >= 256; round++) {
      final long before = threads.getThreadAllocatedBytes(self);
      for (int i = 0; i < 2000; i++) {
        vector.drawGaussians(tile, Tile.CAPACITY, 4 * i);
        vector.step(tile, Tile.CAPACITY, 0);
        vector.step(tile, Tile.CAPACITY, 3);
        vector.drawReadNoise(tile, Tile.CAPACITY, 4 * i + 3);
        vector.read(tile, Tile.CAPACITY, READ, 1f);
      }
      least = Math.min(least, threads.getThreadAllocatedBytes(self) - before);
    }
    assertTrue(least < 256, least + " bytes in a round of 2000 frames");
  }

  private static final ReadConstants READ =
      ReadConstants.of(SignalChain.ofMoment(2e9, 5e-12, -.3, .3), 6e-12);

  @Test
  void theChoiceSaysWhy() {
    final KernelChoice plain = KernelChoice.choose("scalar");
    assertEquals("scalar", plain.name());
    assertTrue(plain.reason().contains(KernelChoice.PROPERTY));
    assertEquals("vector", KernelChoice.current().name());
    assertFalse(KernelChoice.current().reason().isEmpty());
  }
}
