package torqueloom.training.evaluation;

import torqueloom.model.random.Streams;

/**
 * Forward kernel of a device layer on plain arrays: pulse amplitudes in, counts out, one uniform
 * number a neuron, sample and slot.
 *
 * <p>Layout is slot-major: index (slot * batch + sample) * neurons + neuron. The uniform number of
 * a neuron depends on (layer key, row, neuron, slot) only, so the counts do not depend on how rows
 * are cut into batches. Two slots share one 64-bit hash, 32 bits each; a probability is therefore
 * resolved to 2^-23, about the precision of the table.
 */
public final class CountKernel {
  private static final long GOLDEN = 0x9E3779B97F4A7C15L;

  private CountKernel() {}

  /** Pulses clipped at the largest drive, and the sum of pulse amplitudes. */
  public static final class Tally {
    /** Pulses clipped at the largest drive. */
    public long clipped;

    /** Pulses in all. */
    public long pulses;

    /** Sum of pulse amplitudes after the clip (unit drives). */
    public double drive;

    /** Sum of counts. */
    public long counts;

    /** Share of pulses clipped over some tallies (1), 0 without pulses. */
    public static double clippedShare(Tally... tallies) {
      long clipped = 0;
      long pulses = 0;
      for (final Tally tally : tallies) {
        clipped += tally.clipped;
        pulses += tally.pulses;
      }
      return (double) clipped / Math.max(1, pulses);
    }
  }

  /**
   * Counts of a layer whose drive is the same in every slot.
   *
   * @param bank responses
   * @param neurons the layer's neurons
   * @param drive drive before the clip (unit drives), [batch][neurons] flattened
   * @param clip largest drive (unit drives)
   * @param rows row number of each sample, [batch]; names its random stream
   * @param slots number of slots
   * @param key key of the layer's stream
   * @param counts out: counts, [slots][batch][neurons] flattened
   * @param tally added to
   */
  public static void constantDrive(
      NeuronBank bank,
      NeuronLayer neurons,
      float[] drive,
      float clip,
      int[] rows,
      int slots,
      long key,
      float[] counts,
      Tally tally) {
    final int n = neurons.instance().length;
    final int batch = rows.length;
    final float[] threshold = new float[bank.maximumCount()];
    for (int b = 0; b < batch; b++) {
      final long rowKey = Streams.subKey(key, rows[b]);
      for (int j = 0; j < n; j++) {
        final float a = clipped(drive[b * n + j], clip, slots, tally);
        final int used = thresholds(bank, neurons, j, a, threshold);
        final long neuronKey = rowKey + (long) j * slots * GOLDEN;
        for (int s = 0; s < slots; s += 2) {
          final long bits = used == 0 ? 0 : mix(neuronKey + s * GOLDEN);
          final int first = count(threshold, used, bits >>> 32);
          counts[(s * batch + b) * n + j] = first;
          tally.counts += first;
          if (s + 1 < slots) {
            final int second = count(threshold, used, bits & 0xFFFFFFFFL);
            counts[((s + 1) * batch + b) * n + j] = second;
            tally.counts += second;
          }
        }
      }
    }
  }

  /**
   * Counts of a layer whose drive differs from slot to slot.
   *
   * @param bank responses
   * @param neurons the layer's neurons
   * @param drive drive before the clip (unit drives), [slots][batch][neurons] flattened
   * @param clip largest drive (unit drives)
   * @param rows row number of each sample, [batch]
   * @param slots number of slots
   * @param key key of the layer's stream
   * @param counts out: counts, [slots][batch][neurons] flattened
   * @param tally added to
   */
  public static void slotDrive(
      NeuronBank bank,
      NeuronLayer neurons,
      float[] drive,
      float clip,
      int[] rows,
      int slots,
      long key,
      float[] counts,
      Tally tally) {
    final int n = neurons.instance().length;
    final int batch = rows.length;
    final float[] threshold = new float[bank.maximumCount()];
    for (int b = 0; b < batch; b++) {
      final long rowKey = Streams.subKey(key, rows[b]);
      for (int s = 0; s < slots; s++) {
        for (int j = 0; j < n; j++) {
          final int at = (s * batch + b) * n + j;
          final float a = clipped(drive[at], clip, 1, tally);
          final int used = thresholds(bank, neurons, j, a, threshold);
          // The same number as in the constant case: slots share hashes in pairs.
          final long bits = mix(rowKey + ((long) j * slots + (s & ~1)) * GOLDEN);
          final int drawn = count(threshold, used, (s & 1) == 0 ? bits >>> 32 : bits & 0xFFFFFFFFL);
          counts[at] = drawn;
          tally.counts += drawn;
        }
      }
    }
  }

  private static float clipped(float drive, float clip, int slots, Tally tally) {
    final float a = Math.max(0f, Math.min(drive, clip));
    tally.pulses += slots;
    tally.drive += (double) a * slots;
    if (drive > clip) {
      tally.clipped += slots;
    }
    return a;
  }

  /** Fills P(count &lt;= k) at a drive and returns how many of them are below one. */
  private static int thresholds(
      NeuronBank bank, NeuronLayer neurons, int neuron, float drive, float[] threshold) {
    final int points = bank.points();
    final int most = bank.maximumCount();
    final float own = drive * neurons.driveFactor()[neuron] / bank.maximumDrive();
    final float place = Math.min(own, 1f) * (points - 1);
    final int low = Math.min((int) place, points - 2);
    final float part = place - low;
    final float[] cumulative = bank.cumulative();
    final int base = (neurons.instance()[neuron] * points + low) * most;
    int used = 0;
    for (int k = 0; k < most; k++) {
      final float left = cumulative[base + k];
      final float p = left + part * (cumulative[base + most + k] - left);
      threshold[k] = p;
      if (p < 1f) {
        used = k + 1;
      }
    }
    return used;
  }

  private static int count(float[] threshold, int used, long bits32) {
    // The center of one of 2^23 cells, exact in single precision.
    final float u = ((bits32 >>> 9) + 0.5f) * 0x1.0p-23f;
    int n = 0;
    for (int k = 0; k < used; k++) {
      if (u > threshold[k]) {
        n = k + 1;
      }
    }
    return n;
  }

  private static long mix(long value) {
    long z = value;
    z = (z ^ (z >>> 30)) * 0xBF58476D1CE4E5B9L;
    z = (z ^ (z >>> 27)) * 0x94D049BB133111EBL;
    return z ^ (z >>> 31);
  }
}
