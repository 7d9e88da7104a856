package torqueloom.demo;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

class FourierTest {
  private static double[] noise(int length, long index) {
    final long key = Streams.key(1, Purpose.TASK_DATA, index);
    final double[] values = new double[length];
    for (int i = 0; i < length; i++) {
      values[i] = Streams.normal(key, i);
    }
    return values;
  }

  /** Against the defining sum; rounding of a sum of n terms stays well below 1e-12 n. */
  @ParameterizedTest
  @ValueSource(ints = {2, 4, 8, 64, 256})
  void matchesTheDefiningSum(int length) {
    final double[] x = noise(length, 1);
    final double[] y = noise(length, 2);
    final double[] real = x.clone();
    final double[] imaginary = y.clone();
    new Fourier(length).forward(real, imaginary);
    for (int k = 0; k < length; k++) {
      double re = 0;
      double im = 0;
      for (int j = 0; j < length; j++) {
        final double angle = 2 * Math.PI * ((long) j * k % length) / length;
        re += x[j] * Math.cos(angle) + y[j] * Math.sin(angle);
        im += y[j] * Math.cos(angle) - x[j] * Math.sin(angle);
      }
      assertEquals(re, real[k], 1e-12 * length);
      assertEquals(im, imaginary[k], 1e-12 * length);
    }
  }

  @Test
  void backwardUndoesForward() {
    final int length = 4096;
    final double[] x = noise(length, 3);
    final double[] real = x.clone();
    final double[] imaginary = new double[length];
    final Fourier fourier = new Fourier(length);
    fourier.forward(real, imaginary);
    fourier.backward(real, imaginary);
    for (int i = 0; i < length; i++) {
      real[i] /= length;
      imaginary[i] /= length;
    }
    assertArrayEquals(x, real, 1e-13);
    assertArrayEquals(new double[length], imaginary, 1e-13);
  }

  @ParameterizedTest
  @ValueSource(ints = {0, 1, 3, 12, -4})
  void refusesOtherLengths(int length) {
    assertThrows(IllegalArgumentException.class, () -> new Fourier(length));
  }
}
