package torqueloom.model.response;

import java.util.List;
import java.util.SortedMap;

/**
 * Calibrated response of one device instance at one temperature in one state: how many trials gave
 * n counts at each drive. Arrays are not copied; do not change them.
 *
 * @param instance 0 for the nominal device
 * @param temperatureKelvin (K)
 * @param pulseSeconds pulse length (s)
 * @param restLevel rest level at the start, 0 for the first
 * @param previousDrive drive of the slot before (drive unit), NaN after a quiet slot
 * @param drive drives (drive unit), ascending, [drives]
 * @param trials trials at each drive, [drives]
 * @param countsFrom n of the first column of {@code counts}
 * @param counts trials that gave n counts, [drives][n - countsFrom]
 * @param halfTurns trials by signed half turns, one map a drive
 * @param latencySeconds mean time to the first count (s), NaN where nothing counted, [drives]
 * @param jitterSeconds standard deviation of that time (s), NaN with fewer than two, [drives]
 */
public record ResponseCurve(
    int instance,
    double temperatureKelvin,
    double pulseSeconds,
    int restLevel,
    double previousDrive,
    double[] drive,
    int[] trials,
    int countsFrom,
    int[][] counts,
    List<SortedMap<Integer, Integer>> halfTurns,
    double[] latencySeconds,
    double[] jitterSeconds) {

  /** Number of trials that gave n counts at a drive. */
  public int trialsWith(int driveIndex, int n) {
    final int column = n - countsFrom;
    final int[] row = counts[driveIndex];
    return column < 0 || column >= row.length ? 0 : row[column];
  }

  /** Share of trials that gave n counts at a drive (1). */
  public double probability(int driveIndex, int n) {
    return (double) trialsWith(driveIndex, n) / trials[driveIndex];
  }

  /** Mean count at a drive (1). */
  public double meanCount(int driveIndex) {
    double sum = 0;
    for (int i = 0; i < counts[driveIndex].length; i++) {
      sum += (double) (countsFrom + i) * counts[driveIndex][i];
    }
    return sum / trials[driveIndex];
  }

  /** Largest count seen at any drive. */
  public int maximumCount() {
    int most = 0;
    for (final int[] row : counts) {
      for (int i = 0; i < row.length; i++) {
        if (row[i] > 0) {
          most = Math.max(most, countsFrom + i);
        }
      }
    }
    return most;
  }
}
