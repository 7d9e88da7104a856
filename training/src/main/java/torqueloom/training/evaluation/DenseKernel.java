package torqueloom.training.evaluation;

/**
 * Matrix product of the chips on plain arrays. The inner loop runs over the outputs, so the just-in-
 * time compiler may vectorize it without changing any sum: bits are the same on every processor.
 */
final class DenseKernel {
  private DenseKernel() {}

  /**
   * out = bias + x w.
   *
   * @param x [rows][inputs] flattened, from {@code offset} on
   * @param offset first element of x that is read
   * @param rows number of rows
   * @param inputs number of columns of x
   * @param w [inputs][outputs] flattened
   * @param bias [outputs]
   * @param out out: [rows][outputs] flattened
   */
  static void multiply(
      float[] x, int offset, int rows, int inputs, float[] w, float[] bias, float[] out) {
    final int outputs = bias.length;
    for (int r = 0; r < rows; r++) {
      final int to = r * outputs;
      System.arraycopy(bias, 0, out, to, outputs);
      for (int i = 0; i < inputs; i++) {
        final float value = x[offset + r * inputs + i];
        if (value != 0f) {
          add(value, w, i * outputs, out, to, outputs);
        }
      }
    }
  }

  private static void add(float value, float[] w, int from, float[] out, int to, int outputs) {
    for (int j = 0; j < outputs; j++) {
      out[to + j] += value * w[from + j];
    }
  }
}
