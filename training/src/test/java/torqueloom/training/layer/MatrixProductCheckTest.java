package torqueloom.training.layer;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import torqueloom.training.layer.MatrixProductCheck.DoubleProduct;
import torqueloom.training.layer.MatrixProductCheck.FloatProduct;

class MatrixProductCheckTest {

  @Test
  void acceptsPlainLoopsInEitherPrecision() {
    assertDoesNotThrow(
        () ->
            MatrixProductCheck.check(
                List.of(MatrixProductCheckTest::floatLoops),
                List.of(MatrixProductCheckTest::doubleLoops)));
  }

  @Test
  void findsADroppedTailOfTheInnerSum() {
    final UnfitNativesException fault =
        assertThrows(
            UnfitNativesException.class,
            () ->
                checkDouble(
                    (a, b, m, k, n) -> {
                      final double[] c = doubleLoops(a, b, m, k, n);
                      if (k % 16 == 1 && k > 16) {
                        for (int i = 0; i < m; i++) {
                          for (int j = 0; j < n; j++) {
                            c[i * n + j] -= a[i * k + k - 1] * b[(k - 1) * n + j];
                          }
                        }
                      }
                      return c;
                    }));
    assertTrue(fault.getMessage().contains("OPENBLAS_CORETYPE"), fault.getMessage());
    assertTrue(fault.getMessage().contains("double"), fault.getMessage());
  }

  /** One wrong entry in one shape, by a part in 10⁴ of a float and 10⁸ of a double. */
  @ParameterizedTest
  @ValueSource(ints = {0, 1, 100})
  void findsOneWrongEntry(int at) {
    assertThrows(
        UnfitNativesException.class,
        () ->
            checkFloat(
                (a, b, m, k, n) -> {
                  final float[] c = floatLoops(a, b, m, k, n);
                  if (c.length > at) {
                    c[at] += 1e-4f * k;
                  }
                  return c;
                }));
    assertThrows(
        UnfitNativesException.class,
        () ->
            checkDouble(
                (a, b, m, k, n) -> {
                  final double[] c = doubleLoops(a, b, m, k, n);
                  if (c.length > at) {
                    c[at] += 1e-8 * k;
                  }
                  return c;
                }));
  }

  @Test
  void findsNotANumber() {
    assertThrows(
        UnfitNativesException.class,
        () ->
            checkDouble(
                (a, b, m, k, n) -> {
                  final double[] c = doubleLoops(a, b, m, k, n);
                  c[c.length - 1] = Double.NaN;
                  return c;
                }));
  }

  private static void checkFloat(FloatProduct product) {
    MatrixProductCheck.check(List.of(product), List.of());
  }

  private static void checkDouble(DoubleProduct product) {
    MatrixProductCheck.check(List.of(), List.of(product));
  }

  private static double[] doubleLoops(double[] a, double[] b, int m, int k, int n) {
    final double[] c = new double[m * n];
    for (int i = 0; i < m; i++) {
      for (int l = k - 1; l >= 0; l--) {
        for (int j = 0; j < n; j++) {
          c[i * n + j] += a[i * k + l] * b[l * n + j];
        }
      }
    }
    return c;
  }

  private static float[] floatLoops(float[] a, float[] b, int m, int k, int n) {
    final float[] c = new float[m * n];
    for (int i = 0; i < m; i++) {
      for (int l = 0; l < k; l++) {
        for (int j = 0; j < n; j++) {
          c[i * n + j] += a[i * k + l] * b[l * n + j];
        }
      }
    }
    return c;
  }
}
