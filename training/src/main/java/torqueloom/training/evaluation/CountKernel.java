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
  private static final float CELLS = 0x1.0p23f;

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
   * @param offset first element of drive that is read
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
      int offset,
      float clip,
      int[] rows,
      int slots,
      long key,
      float[] counts,
      Tally tally) {
    final int n = neurons.instance().length;
    final int batch = rows.length;
    final int[] threshold = new int[bank.maximumCount()];
    for (int b = 0; b < batch; b++) {
      final long rowKey = Streams.subKey(key, rows[b]);
      for (int j = 0; j < n; j++) {
        final float a = clipped(drive[offset + b * n + j], clip, slots, tally);
        final long span = thresholds(bank, neurons, j, a, threshold);
        final long neuronKey = rowKey + (long) j * slots * GOLDEN;
        for (int s = 0; s < slots; s += 2) {
          final long bits = mix(neuronKey + s * GOLDEN);
          final int first = count(threshold, span, (int) (bits >>> 41));
          counts[(s * batch + b) * n + j] = first;
          tally.counts += first;
          if (s + 1 < slots) {
            final int second = count(threshold, span, (int) bits >>> 9);
            counts[((s + 1) * batch + b) * n + j] = second;
            tally.counts += second;
          }
        }
      }
    }
  }

  /**
   * Sums over the slots of the counts that {@link #constantDrive} gives, where nothing else is
   * wanted of them: the same numbers at a fraction of the work.
   *
   * @param summed out: counts summed over the slots, [batch][neurons] flattened; the other
   *     parameters are those of {@link #constantDrive}
   */
  public static void constantDriveSum(
      NeuronBank bank,
      NeuronLayer neurons,
      float[] drive,
      int offset,
      float clip,
      int[] rows,
      int slots,
      long key,
      float[] summed,
      Tally tally) {
    final int n = neurons.instance().length;
    final int[] threshold = new int[bank.maximumCount()];
    long all = 0;
    for (int b = 0; b < rows.length; b++) {
      final long rowKey = Streams.subKey(key, rows[b]);
      for (int j = 0; j < n; j++) {
        final float a = clipped(drive[offset + b * n + j], clip, slots, tally);
        final long span = thresholds(bank, neurons, j, a, threshold);
        final int sum = sum(threshold, span, rowKey + (long) j * slots * GOLDEN, slots);
        summed[b * n + j] = sum;
        all += sum;
      }
    }
    tally.counts += all;
  }

  private static int sum(int[] threshold, long span, long neuronKey, int slots) {
    final int sure = (int) (span >>> 32);
    final int end = (int) span;
    if (sure == end) {
      return sure * slots;
    }
    int sum = 0;
    for (int s = 0; s < slots; s += 2) {
      final long bits = mix(neuronKey + s * GOLDEN);
      sum += count(threshold, span, (int) (bits >>> 41));
      if (s + 1 < slots) {
        sum += count(threshold, span, (int) bits >>> 9);
      }
    }
    return sum;
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
    final int[] threshold = new int[bank.maximumCount()];
    for (int b = 0; b < batch; b++) {
      final long rowKey = Streams.subKey(key, rows[b]);
      for (int s = 0; s < slots; s++) {
        for (int j = 0; j < n; j++) {
          final int at = (s * batch + b) * n + j;
          final float a = clipped(drive[at], clip, 1, tally);
          final long span = thresholds(bank, neurons, j, a, threshold);
          // The same number as in the constant case: slots share hashes in pairs.
          final long bits = mix(rowKey + ((long) j * slots + (s & ~1)) * GOLDEN);
          final int uniform = (s & 1) == 0 ? (int) (bits >>> 41) : (int) bits >>> 9;
          final int drawn = count(threshold, span, uniform);
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

  /**
   * Fills, for each k, the least 23-bit number x whose cell center (x + 1/2)/2^23 lies above
   * P(count &lt;= k): the drawn number then exceeds k.
   *
   * @return in the upper half the number of counts that are sure, in the lower the number of
   *     thresholds in use; between them the counts are drawn
   */
  private static long thresholds(
      NeuronBank bank, NeuronLayer neurons, int neuron, float drive, int[] threshold) {
    final int points = bank.points();
    final int most = bank.maximumCount();
    final float own = drive * neurons.driveFactor()[neuron] / bank.maximumDrive();
    final float place = Math.min(own, 1f) * (points - 1);
    final int low = Math.min((int) place, points - 2);
    final float part = place - low;
    final float[] cumulative = bank.cumulative();
    final int base = (neurons.instance()[neuron] * points + low) * most;
    int sure = 0;
    int end = 0;
    for (int k = 0; k < most; k++) {
      final float left = cumulative[base + k];
      final float p = left + part * (cumulative[base + most + k] - left);
      final int cell = (int) (p * CELLS + 0.5f);
      threshold[k] = cell;
      if (cell <= 0) {
        sure = k + 1;
      }
      if (cell < (1 << 23)) {
        end = k + 1;
      }
    }
    return (long) sure << 32 | end;
  }

  /** Number of thresholds that a drawn 23-bit number reaches; they ascend. */
  private static int count(int[] threshold, long span, int uniform) {
    int n = (int) (span >>> 32);
    for (int k = n; k < (int) span; k++) {
      // One if uniform >= threshold, without a branch.
      n += (threshold[k] - 1 - uniform) >>> 31;
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
