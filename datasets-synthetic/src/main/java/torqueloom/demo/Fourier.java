package torqueloom.demo;

/**
 * Fast Fourier transform of a fixed power-of-two length, in place, radix 2 (J. W. Cooley and J. W.
 * Tukey, Math. Comput. 19, 297 (1965), from memory). Its bits are the same on every platform: only
 * the four operations and {@code StrictMath} enter. Immutable, so threads may share one.
 */
final class Fourier {
  private final int length;
  private final double[] cosine;
  private final double[] sine;

  Fourier(int length) {
    if (length < 2 || Integer.bitCount(length) != 1) {
      throw new IllegalArgumentException("length must be a power of two, got " + length);
    }
    this.length = length;
    cosine = new double[length / 2];
    sine = new double[length / 2];
    for (int i = 0; i < length / 2; i++) {
      cosine[i] = StrictMath.cos(2 * Math.PI * i / length);
      sine[i] = StrictMath.sin(2 * Math.PI * i / length);
    }
  }

  /** Replaces z by Z_k = sum_j z_j exp(-2 pi i j k / n). */
  void forward(double[] real, double[] imaginary) {
    reorder(real, imaginary);
    for (int half = 1; half < length; half *= 2) {
      final int stride = length / (2 * half);
      for (int start = 0; start < length; start += 2 * half) {
        for (int k = 0; k < half; k++) {
          butterfly(real, imaginary, start + k, start + k + half, k * stride);
        }
      }
    }
  }

  /** Replaces Z by z_j = sum_k Z_k exp(+2 pi i j k / n), without the factor 1/n. */
  void backward(double[] real, double[] imaginary) {
    forward(imaginary, real);
  }

  private void butterfly(double[] real, double[] imaginary, int a, int b, int turn) {
    final double re = real[b] * cosine[turn] + imaginary[b] * sine[turn];
    final double im = imaginary[b] * cosine[turn] - real[b] * sine[turn];
    real[b] = real[a] - re;
    imaginary[b] = imaginary[a] - im;
    real[a] += re;
    imaginary[a] += im;
  }

  private void reorder(double[] real, double[] imaginary) {
    final int shift = 32 - Integer.numberOfTrailingZeros(length);
    for (int i = 0; i < length; i++) {
      final int j = Integer.reverse(i) >>> shift;
      if (j > i) {
        swap(real, i, j);
        swap(imaginary, i, j);
      }
    }
  }

  private static void swap(double[] values, int i, int j) {
    final double value = values[i];
    values[i] = values[j];
    values[j] = value;
  }
}
