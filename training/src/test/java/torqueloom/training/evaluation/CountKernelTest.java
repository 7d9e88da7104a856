package torqueloom.training.evaluation;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

/** Counts against the table they are drawn from, and the forms of the kernel against each other. */
class CountKernelTest {
  /** Two instances on three grid points; instance 1 never counts at the first. */
  private static final NeuronBank BANK =
      new NeuronBank(
          2,
          3,
          3,
          20f,
          new float[] {
            .9f, .95f, 1f, .3f, .6f, .9f, 0f, .2f, .7f, 1f, 1f, 1f, .5f, .5f, 1f, 0f, 0f, 1f
          },
          new float[] {.15f, 1.2f, 2.1f, 0f, 1f, 2f});

  private static final long KEY = Streams.key(3, Purpose.CHIP_COUNTS, 1);

  private static int[] rows(int from, int batch) {
    final int[] rows = new int[batch];
    Arrays.setAll(rows, i -> from + i);
    return rows;
  }

  private static NeuronLayer neurons() {
    return new NeuronLayer(new int[] {0, 1, 0}, new float[] {1f, 1.1f, 0.9f});
  }

  private static float[] drives(int batch) {
    final float[] drive = new float[3 * batch];
    for (int i = 0; i < drive.length; i++) {
      drive[i] = (float) (25 * Streams.uniform(5, i) - 2);
    }
    return drive;
  }

  /**
   * Frequencies at the middle of the grid, where P = .3 .3 .3 .1: chi-square with 3 degrees of
   * freedom stays below 21.1 but for 1 in 10,000 keys; the key is fixed.
   */
  @Test
  void drawsTheCountsOfTheTable() {
    final int batch = 20_000;
    final float[] drive = new float[batch];
    Arrays.fill(drive, 10f);
    final float[] counts = new float[batch];
    CountKernel.constantDrive(
        BANK,
        NeuronLayer.nominal(1),
        drive,
        0,
        20f,
        rows(0, batch),
        1,
        KEY,
        counts,
        new CountKernel.Tally());
    final int[] seen = new int[4];
    for (final float count : counts) {
      seen[(int) count]++;
    }
    final double[] expected = {.3 * batch, .3 * batch, .3 * batch, .1 * batch};
    double square = 0;
    for (int n = 0; n < 4; n++) {
      square += (seen[n] - expected[n]) * (seen[n] - expected[n]) / expected[n];
    }
    assertTrue(square < 21.1, "chi-square " + square);
  }

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 5, 8})
  void allFormsDrawTheSameCounts(int slots) {
    final int batch = 37;
    final float[] drive = drives(batch);
    final float[] counts = new float[slots * drive.length];
    final CountKernel.Tally first = new CountKernel.Tally();
    CountKernel.constantDrive(
        BANK, neurons(), drive, 0, 18f, rows(0, batch), slots, KEY, counts, first);
    final float[] repeated = new float[slots * drive.length];
    for (int s = 0; s < slots; s++) {
      System.arraycopy(drive, 0, repeated, s * drive.length, drive.length);
    }
    final float[] again = new float[counts.length];
    final CountKernel.Tally second = new CountKernel.Tally();
    CountKernel.slotDrive(
        BANK, neurons(), repeated, 18f, rows(0, batch), slots, KEY, again, second);
    assertArrayEquals(counts, again);
    final float[] summed = new float[drive.length];
    final CountKernel.Tally third = new CountKernel.Tally();
    CountKernel.constantDriveSum(
        BANK, neurons(), drive, 0, 18f, rows(0, batch), slots, KEY, summed, third);
    assertArrayEquals(ReadoutKernel.summedCounts(counts, slots, drive.length), summed);
    assertEquals(first.counts, second.counts);
    assertEquals(first.counts, third.counts);
    assertEquals(first.pulses, third.pulses);
    assertEquals(first.clipped, second.clipped);
    assertTrue(first.clipped > 0 && first.counts > 0);
  }

  @Test
  void aRowsCountsDoNotDependOnItsBatch() {
    final int batch = 10;
    final float[] drive = drives(batch);
    final float[] whole = new float[4 * drive.length];
    CountKernel.constantDrive(
        BANK, neurons(), drive, 0, 20f, rows(0, batch), 4, KEY, whole, new CountKernel.Tally());
    final float[] part = new float[4 * 3];
    CountKernel.constantDrive(
        BANK, neurons(), drive, 21, 20f, rows(7, 1), 4, KEY, part, new CountKernel.Tally());
    for (int s = 0; s < 4; s++) {
      for (int j = 0; j < 3; j++) {
        assertEquals(whole[(s * batch + 7) * 3 + j], part[s * 3 + j]);
      }
    }
  }

  @Test
  void clipsBelowAtZeroAndAboveAtTheLargestDrive() {
    final CountKernel.Tally tally = new CountKernel.Tally();
    CountKernel.constantDrive(
        BANK,
        NeuronLayer.nominal(3),
        new float[] {-5f, 3f, 30f},
        0,
        12f,
        rows(0, 1),
        2,
        KEY,
        new float[6],
        tally);
    assertEquals(2 * (0 + 3 + 12), tally.drive);
    assertEquals(2, tally.clipped);
    assertEquals(6, tally.pulses);
  }
}
