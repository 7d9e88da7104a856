package torqueloom.model.response;

/**
 * Response of one instance in the form the network kernels read: cumulative count probabilities on
 * a uniform grid of drives, linear in between. Drives beyond the grid read its last point; callers
 * clip, the table never extrapolates. Immutable by convention: the arrays are shared, do not change
 * them.
 *
 * @param maximumDrive drive of the last grid point (drive unit), &gt; 0; the first is at 0
 * @param points number of grid points, &gt;= 2
 * @param maximumCount largest count N, &gt;= 1
 * @param cumulative P(count &lt;= k), k = 0..N-1, [points][N] flattened, each row ascending in [0, 1]
 * @param mean mean count, [points]
 * @param latencySeconds mean latency (s), NaN where nothing counts, [points]
 */
public record CountTable(
    double maximumDrive,
    int points,
    int maximumCount,
    float[] cumulative,
    float[] mean,
    float[] latencySeconds) {

  /** @throws IllegalArgumentException if a shape does not fit */
  public CountTable {
    if (!(maximumDrive > 0) || points < 2 || maximumCount < 1) {
      throw new IllegalArgumentException(
          "maximumDrive must be positive, points at least 2, maximumCount at least 1");
    }
    if (cumulative.length != points * maximumCount
        || mean.length != points
        || latencySeconds.length != points) {
      throw new IllegalArgumentException("array lengths do not fit points and maximumCount");
    }
  }
}
