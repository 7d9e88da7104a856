package torqueloom.training.layer;

import java.util.List;

/**
 * Compares a matrix library's products with plain loops over matrices of awkward shapes.
 *
 * <p>A matrix library may choose its kernels by processor or by an environment variable, and a
 * wrong choice can give wrong numbers without any error. Every result of this program rests on
 * these products, so they are checked before the first one is used.
 *
 * <p>A product of inner length k carries a rounding error of at most about k·u·Σ|a||b| with the
 * unit roundoff u, whatever the order of the sum (N. J. Higham, Accuracy and Stability of Numerical
 * Algorithms, 2nd ed. 2002, section 3.5; from memory). The reference is summed in double, in its
 * own order, so twice that bound is allowed. A wrong kernel misses it by many orders of magnitude.
 */
final class MatrixProductCheck {
  /** Unit roundoff (1) of float and of double. */
  private static final double FLOAT_ROUNDOFF = 0x1p-24;

  private static final double DOUBLE_ROUNDOFF = 0x1p-53;

  /**
   * Rows, inner length and columns: vectors, primes, one to each side of the sizes that kernels are
   * unrolled by, and the last five beyond the blocks that a product is cut into. One kernel family
   * of OpenBLAS 0.3.19 (Cooperlake, on an AMD processor) gives wrong double products from 193 rows
   * on, and right ones below.
   */
  private static final int[][] SHAPES = {
    {1, 1, 1},
    {2, 3, 5},
    {7, 5, 3},
    {1, 64, 9},
    {9, 64, 1},
    {4, 4, 4},
    {8, 17, 8},
    {13, 1, 11},
    {15, 16, 17},
    {17, 15, 16},
    {31, 33, 32},
    {33, 31, 5},
    {5, 129, 6},
    {64, 25, 10},
    {65, 63, 64},
    {97, 7, 101},
    {3, 257, 67},
    {127, 65, 2},
    {48, 48, 96},
    {129, 131, 37},
    {193, 64, 193},
    {200, 385, 97},
    {257, 129, 130},
    {385, 33, 65},
    {400, 5, 64},
  };

  /** A product of two row-major matrices, computed in the library's float arithmetic. */
  @FunctionalInterface
  interface FloatProduct {
    /**
     * Multiplies a (rows × inner) by b (inner × columns).
     *
     * @return the product, row-major, rows × columns
     */
    float[] multiply(float[] a, float[] b, int rows, int inner, int columns);
  }

  /** A product of two row-major matrices, computed in the library's double arithmetic. */
  @FunctionalInterface
  interface DoubleProduct {
    /**
     * Multiplies a (rows × inner) by b (inner × columns).
     *
     * @return the product, row-major, rows × columns
     */
    double[] multiply(double[] a, double[] b, int rows, int inner, int columns);
  }

  /** The product by plain loops, and Σ|a||b| of each entry, both in double. */
  private record Reference(int[] shape, double[] a, double[] b, double[] sum, double[] magnitude) {
    static Reference of(int[] shape) {
      final int inner = shape[1];
      final int columns = shape[2];
      final double[] a = matrix(shape[0], inner, 1);
      final double[] b = matrix(inner, columns, 2);
      final double[] sum = new double[shape[0] * columns];
      final double[] magnitude = new double[sum.length];
      for (int i = 0; i < shape[0]; i++) {
        for (int k = 0; k < inner; k++) {
          for (int j = 0; j < columns; j++) {
            final double term = a[i * inner + k] * b[k * columns + j];
            sum[i * columns + j] += term;
            magnitude[i * columns + j] += Math.abs(term);
          }
        }
      }
      return new Reference(shape, a, b, sum, magnitude);
    }
  }

  private MatrixProductCheck() {}

  /**
   * Checks products over all shapes.
   *
   * @param floats ways to multiply in float
   * @param doubles ways to multiply in double
   * @throws UnfitNativesException if one entry of one product is wrong; the message names {@code
   *     OPENBLAS_CORETYPE}, the variable that chooses the kernels
   */
  static void check(List<FloatProduct> floats, List<DoubleProduct> doubles) {
    for (int[] shape : SHAPES) {
      final Reference reference = Reference.of(shape);
      final float[] a = narrow(reference.a());
      final float[] b = narrow(reference.b());
      for (FloatProduct product : floats) {
        final float[] got = product.multiply(a, b, shape[0], shape[1], shape[2]);
        compare("float", reference, widen(got), FLOAT_ROUNDOFF);
      }
      for (DoubleProduct product : doubles) {
        final double[] got =
            product.multiply(reference.a(), reference.b(), shape[0], shape[1], shape[2]);
        compare("double", reference, got, DOUBLE_ROUNDOFF);
      }
    }
  }

  private static void compare(String type, Reference reference, double[] got, double roundoff) {
    final int[] shape = reference.shape();
    if (got.length != reference.sum().length) {
      throw wrong(type, shape, "has " + got.length + " entries");
    }
    for (int i = 0; i < got.length; i++) {
      final double allowed = 2 * (shape[1] + 1) * roundoff * reference.magnitude()[i];
      // Written so that a NaN fails too.
      if (!(Math.abs(got[i] - reference.sum()[i]) <= allowed)) {
        throw wrong(type, shape, "gives " + got[i] + " for " + reference.sum()[i]);
      }
    }
  }

  private static UnfitNativesException wrong(String type, int[] shape, String what) {
    final String set = System.getenv("OPENBLAS_CORETYPE");
    return new UnfitNativesException(
        String.format(
            "the matrix library computes wrong %s products on this processor (%dx%d times %dx%d"
                + " %s); OPENBLAS_CORETYPE, which chooses its kernels, is %s: set it to Haswell or"
                + " SkylakeX, as the processor allows, or unset it",
            type,
            shape[0],
            shape[1],
            shape[1],
            shape[2],
            what,
            set == null ? "not set" : "\"" + set + "\""));
  }

  /** Numbers in (−1, 1) that are exact in float and follow no pattern that a kernel could keep. */
  private static double[] matrix(int rows, int columns, int salt) {
    final double[] values = new double[rows * columns];
    int state = 0x9E3779B9 * (31 * rows + 17 * columns + salt);
    for (int i = 0; i < values.length; i++) {
      state = 1664525 * state + 1013904223;
      values[i] = (state >> 8) * 0x1p-23;
    }
    return values;
  }

  private static double[] widen(float[] values) {
    final double[] wide = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      wide[i] = values[i];
    }
    return wide;
  }

  private static float[] narrow(double[] values) {
    final float[] narrow = new float[values.length];
    for (int i = 0; i < values.length; i++) {
      narrow[i] = (float) values[i];
    }
    return narrow;
  }
}
