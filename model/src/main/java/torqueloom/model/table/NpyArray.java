package torqueloom.model.table;

import java.util.Arrays;

/**
 * Numbers of an NPY file in C order, all as doubles.
 *
 * @param shape length of each axis, slowest first; empty for a single number
 * @param values the elements, as many as the product of the shape
 */
public record NpyArray(int[] shape, double[] values) {

  /**
   * @throws IllegalArgumentException if shape and number of values do not fit
   */
  public NpyArray {
    shape = shape.clone();
    long size = 1;
    for (final int length : shape) {
      size = Math.multiplyExact(size, (long) length);
    }
    if (size != values.length) {
      throw new IllegalArgumentException(
          "shape " + Arrays.toString(shape) + " does not hold " + values.length + " values");
    }
  }

  /** A copy of the shape. */
  @Override
  public int[] shape() {
    return shape.clone();
  }
}
