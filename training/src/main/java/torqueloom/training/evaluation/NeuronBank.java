package torqueloom.training.evaluation;

import java.util.List;
import torqueloom.model.response.CountTable;

/**
 * Responses of all library instances at one temperature in the form the kernels read. Drives are
 * counted in unit drives (one full-scale weight for one count), so that they stay of order one to
 * some tens in single precision. The grid is uniform from 0 to {@link #maximumDrive()}; in between
 * the cumulative probabilities are linear; beyond, the last point holds. Immutable by convention:
 * arrays are shared with the kernels of this package and must not be changed.
 */
public final class NeuronBank {
  private final int instances;
  private final int points;
  private final int maximumCount;
  private final float maximumDrive;
  private final float[] cumulative;
  private final float[] mean;

  /**
   * @param instances number of device instances, &gt;= 1
   * @param points grid points, &gt;= 2
   * @param maximumCount largest count N, &gt;= 1
   * @param maximumDrive drive of the last grid point (unit drives), &gt; 0
   * @param cumulative P(count &lt;= k), [instances][points][N] flattened
   * @param mean mean count, [instances][points] flattened
   * @throws IllegalArgumentException if a length does not fit or a probability is not in [0, 1]
   */
  public NeuronBank(
      int instances,
      int points,
      int maximumCount,
      float maximumDrive,
      float[] cumulative,
      float[] mean) {
    if (instances < 1 || points < 2 || maximumCount < 1 || !(maximumDrive > 0)) {
      throw new IllegalArgumentException(
          "a neuron bank needs instances, points, counts and drives");
    }
    if ((long) cumulative.length != (long) instances * points * maximumCount
        || (long) mean.length != (long) instances * points) {
      throw new IllegalArgumentException("array lengths do not fit the neuron bank's shape");
    }
    for (final float p : cumulative) {
      if (!(p >= 0 && p <= 1)) {
        throw new IllegalArgumentException("a cumulative probability must lie in [0, 1], got " + p);
      }
    }
    this.instances = instances;
    this.points = points;
    this.maximumCount = maximumCount;
    this.maximumDrive = maximumDrive;
    this.cumulative = cumulative;
    this.mean = mean;
  }

  /**
   * A bank from tables on equal grids.
   *
   * @param tables one an instance, equal maximum drive and points
   * @param unitDrive drive of one full-scale weight for one count (drive unit)
   */
  public static NeuronBank of(List<CountTable> tables, double unitDrive) {
    final CountTable first = tables.get(0);
    final int most = tables.stream().mapToInt(CountTable::maximumCount).max().orElseThrow();
    final int points = first.points();
    final float[] cumulative = new float[tables.size() * points * most];
    final float[] mean = new float[tables.size() * points];
    for (int i = 0; i < tables.size(); i++) {
      final CountTable table = tables.get(i);
      if (table.points() != points || table.maximumDrive() != first.maximumDrive()) {
        throw new IllegalArgumentException("all instances must share one grid of drives");
      }
      for (int p = 0; p < points; p++) {
        mean[i * points + p] = table.mean()[p];
        for (int k = 0; k < most; k++) {
          cumulative[(i * points + p) * most + k] =
              k < table.maximumCount() ? table.cumulative()[p * table.maximumCount() + k] : 1f;
        }
      }
    }
    return new NeuronBank(
        tables.size(), points, most, (float) (first.maximumDrive() / unitDrive), cumulative, mean);
  }

  /** Number of device instances. */
  public int instances() {
    return instances;
  }

  /** Number of grid points. */
  public int points() {
    return points;
  }

  /** Largest count. */
  public int maximumCount() {
    return maximumCount;
  }

  /** Drive of the last grid point (unit drives). */
  public float maximumDrive() {
    return maximumDrive;
  }

  /** P(count &lt;= k), [instances][points][maximumCount] flattened; do not change. */
  public float[] cumulative() {
    return cumulative;
  }

  /** Mean counts, [instances][points] flattened; do not change. */
  public float[] mean() {
    return mean;
  }

  /** Mean count of an instance at a drive (unit drives), linear between grid points. */
  public float meanAt(int instance, float drive) {
    final float place = Math.max(0, Math.min(drive / maximumDrive, 1f)) * (points - 1);
    final int low = Math.min((int) place, points - 2);
    final float part = place - low;
    final int base = instance * points + low;
    return mean[base] + part * (mean[base + 1] - mean[base]);
  }

  /** Lowest drive (unit drives) at which the mean count of an instance reaches a level. */
  public float driveAtMean(int instance, float level) {
    for (int p = 1; p < points; p++) {
      final float before = mean[instance * points + p - 1];
      final float here = mean[instance * points + p];
      if (here >= level) {
        final float part = here > before ? (level - before) / (here - before) : 1f;
        return (p - 1 + Math.max(0, part)) * maximumDrive / (points - 1);
      }
    }
    return maximumDrive;
  }
}
