package torqueloom.training.data;

/**
 * Numbers of an array file, flat with the last axis fastest.
 *
 * @param shape length of each axis; the first counts the cases
 * @param values the numbers, as many as the product of the shape
 */
record NumberArray(int[] shape, double[] values) {
  /** Cases: length of the first axis. */
  int cases() {
    return shape[0];
  }

  /** Numbers of one case. */
  int width() {
    int width = 1;
    for (int i = 1; i < shape.length; i++) {
      width *= shape[i];
    }
    return width;
  }

  /**
   * Number of elements of a shape.
   *
   * @throws TaskDataException if an axis is empty or the array would not fit into memory
   */
  static int elements(String file, int[] shape) {
    long elements = 1;
    for (final int length : shape) {
      if (length <= 0) {
        throw new TaskDataException(file + ": an axis has length " + length + "; 1 is the least");
      }
      elements *= length;
      if (elements > 1 << 29) {
        throw new TaskDataException(file + ": holds more than 2^29 numbers, which is too many");
      }
    }
    return (int) elements;
  }
}
