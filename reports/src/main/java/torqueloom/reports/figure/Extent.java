package torqueloom.reports.figure;

/**
 * Smallest and largest finite value of some data.
 *
 * @param low smallest, positive infinity when there is none
 * @param high largest, negative infinity when there is none
 */
record Extent(double low, double high) {
  /** No value. */
  static final Extent NONE = new Extent(Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY);

  static Extent of(double... values) {
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    for (final double value : values) {
      if (Double.isFinite(value)) {
        low = Math.min(low, value);
        high = Math.max(high, value);
      }
    }
    return new Extent(low, high);
  }

  Extent and(Extent other) {
    return new Extent(Math.min(low, other.low), Math.max(high, other.high));
  }

  boolean isEmpty() {
    return low > high;
  }
}
