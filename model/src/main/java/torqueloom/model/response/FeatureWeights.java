package torqueloom.model.response;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.CholeskyDecomposition;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;

/**
 * How strongly each feature of a device acts on its counts. At each temperature and drive index the
 * mean count is regressed over the instances on the features, standardized to z_k with mean 0 and
 * standard deviation 1 within the temperature, and where the instances suffice on their squares too:
 *
 * <pre>  n = b_0 + sum_k (b_k z_k + c_k (z_k^2 - 1))</pre>
 *
 * The effect of feature k is the root mean square slope for normal z_k, sqrt(b_k^2 + 4 c_k^2), taken
 * over drives and temperatures in the root mean square; the weight is effect over standard deviation
 * (counts per unit of the feature). A drive index
 * means the same torque field for every instance.
 *
 * <p>Ordinary least squares by the normal equations; where their condition number exceeds
 * {@value #CONDITION} a ridge is added that brings it down to that. With fewer instances than
 * features + 2 no regression is possible and the weight is 1/standard deviation. A feature without
 * spread has weight 0.
 */
final class FeatureWeights {
  /** Largest condition number of the correlation matrix that is inverted without a ridge (1). */
  private static final double CONDITION = 1e4;

  /** Instances per coefficient from which on squares enter the regression (1). */
  private static final int INSTANCES_PER_COEFFICIENT = 3;

  /** A spread below this share of the feature's size is rounding (1). */
  private static final double ROUNDING = 1e-9;

  private FeatureWeights() {}

  /**
   * @param features [temperature][instance][feature]
   * @param meanCounts [temperature][instance][drive]
   * @return weight of each feature (counts per unit of the feature), [feature]
   */
  static double[] of(double[][][] features, double[][][] meanCounts) {
    final int count = features[0][0].length;
    final double[] squares = new double[count];
    final double[] deviation = pooledDeviation(features);
    final int[] active = active(features, deviation);
    final int instances = features[0].length;
    if (active.length == 0) {
      return squares;
    }
    int responses = 0;
    if (instances >= active.length + 2) {
      for (int t = 0; t < features.length; t++) {
        responses += add(squares, active, features[t], meanCounts[t]);
      }
    }
    final double[] weights = new double[count];
    for (final int k : active) {
      weights[k] = (responses == 0 ? 1 : Math.sqrt(squares[k] / responses)) / deviation[k];
    }
    return weights;
  }

  /** Adds the squared effects at one temperature; returns the number of drives. */
  private static int add(
      double[] squares, int[] active, double[][] features, double[][] meanCounts) {
    final int p = active.length;
    final boolean curved = features.length >= INSTANCES_PER_COEFFICIENT * (2 * p + 1);
    final RealMatrix design = design(active, features, curved);
    final CholeskyDecomposition normal = normalEquations(design);
    final int drives = meanCounts[0].length;
    for (int d = 0; d < drives; d++) {
      final double[] counts = new double[features.length];
      for (int i = 0; i < counts.length; i++) {
        counts[i] = meanCounts[i][d];
      }
      final double average = Arrays.stream(counts).sum() / counts.length;
      final RealVector response = new ArrayRealVector(counts).mapSubtract(average);
      final RealVector b = normal.getSolver().solve(design.preMultiply(response));
      for (int j = 0; j < p; j++) {
        final double slope = b.getEntry(j);
        final double bend = curved ? b.getEntry(p + j) : 0;
        squares[active[j]] += slope * slope + 4 * bend * bend;
      }
    }
    return drives;
  }

  private static RealMatrix design(int[] active, double[][] features, boolean curved) {
    final int n = features.length;
    final int p = active.length;
    final RealMatrix design = new Array2DRowRealMatrix(n, curved ? 2 * p : p);
    for (int j = 0; j < p; j++) {
      final double[] z = standardized(features, active[j]);
      for (int i = 0; i < n; i++) {
        design.setEntry(i, j, z[i]);
        if (curved) {
          design.setEntry(i, p + j, z[i] * z[i] - 1);
        }
      }
    }
    return design;
  }

  private static CholeskyDecomposition normalEquations(RealMatrix design) {
    final RealMatrix normal = design.transpose().multiply(design);
    final double[] eigen = new EigenDecomposition(normal).getRealEigenvalues();
    final double largest = Arrays.stream(eigen).max().orElseThrow();
    final double smallest = Arrays.stream(eigen).min().orElseThrow();
    final double ridge = Math.max(0, (largest - CONDITION * smallest) / (CONDITION - 1));
    for (int j = 0; j < eigen.length; j++) {
      normal.addToEntry(j, j, ridge);
    }
    return new CholeskyDecomposition(normal, 1e-9, 1e-12 * largest);
  }

  /** Features with a spread at every temperature. */
  private static int[] active(double[][][] features, double[] deviation) {
    return IntStream.range(0, deviation.length)
        .filter(k -> deviation[k] > ROUNDING * largest(features, k))
        .filter(k -> Arrays.stream(features).allMatch(rows -> deviation(rows, k) > 0))
        .toArray();
  }

  private static double largest(double[][][] features, int k) {
    double largest = 0;
    for (final double[][] rows : features) {
      for (final double[] row : rows) {
        largest = Math.max(largest, Math.abs(row[k]));
      }
    }
    return largest;
  }

  private static double[] pooledDeviation(double[][][] features) {
    final double[] result = new double[features[0][0].length];
    for (int k = 0; k < result.length; k++) {
      double sum = 0;
      for (final double[][] rows : features) {
        final double own = deviation(rows, k);
        sum += own * own;
      }
      result[k] = Math.sqrt(sum / features.length);
    }
    return result;
  }

  private static double[] standardized(double[][] rows, int k) {
    final double mean = mean(rows, k);
    final double deviation = deviation(rows, k);
    return Arrays.stream(rows).mapToDouble(row -> (row[k] - mean) / deviation).toArray();
  }

  private static double mean(double[][] rows, int k) {
    double sum = 0;
    for (final double[] row : rows) {
      sum += row[k];
    }
    return sum / rows.length;
  }

  private static double deviation(double[][] rows, int k) {
    final double mean = mean(rows, k);
    double sum = 0;
    for (final double[] row : rows) {
      sum += (row[k] - mean) * (row[k] - mean);
    }
    return Math.sqrt(sum / rows.length);
  }
}
