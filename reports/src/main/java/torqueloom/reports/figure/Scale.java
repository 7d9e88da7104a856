package torqueloom.reports.figure;

/**
 * Map from an axis's values to places in the drawing.
 *
 * @param logarithmic whether equal factors have equal lengths
 * @param low value at {@code from}
 * @param high value at {@code to}, &gt; low
 * @param from place (pixel)
 * @param to place (pixel)
 */
record Scale(boolean logarithmic, double low, double high, double from, double to) {
  /** Share of the data's span left free at an end that follows the data. */
  private static final double PADDING = 0.04;

  /** A scale for an axis whose data span {@code extent}. */
  static Scale of(Axis axis, Extent extent, double from, double to) {
    final boolean log = axis.kind() == Axis.Kind.LOGARITHMIC;
    double low = Double.isNaN(axis.low()) ? padded(extent, log, -1) : axis.low();
    double high = Double.isNaN(axis.high()) ? padded(extent, log, 1) : axis.high();
    if (log && !(low > 0)) {
      low = high > 0 ? high / 1000 : 0.1;
    }
    if (!(high > low)) {
      high = log ? low * 10 : low + Math.max(1, Math.abs(low) * 0.1);
    }
    return new Scale(log, low, high, from, to);
  }

  private static double padded(Extent extent, boolean log, int side) {
    if (extent.isEmpty()) {
      return side < 0 ? (log ? 0.1 : 0) : (log ? 10 : 1);
    }
    final double edge = side < 0 ? extent.low() : extent.high();
    if (log) {
      final double low = extent.low() > 0 ? extent.low() : extent.high() / 1000;
      final double grown = StrictMath.pow(extent.high() / low, PADDING);
      return side < 0 ? low / Math.max(grown, 1.1) : extent.high() * Math.max(grown, 1.1);
    }
    final double span = extent.high() - extent.low();
    return edge + side * (span > 0 ? span * PADDING : Math.max(Math.abs(edge) * 0.05, 1e-9));
  }

  /** Place of a value (pixel); NaN where the scale has none. */
  double place(double value) {
    if (logarithmic) {
      return value > 0
          ? from + (to - from) * StrictMath.log(value / low) / StrictMath.log(high / low)
          : Double.NaN;
    }
    return from + (to - from) * (value - low) / (high - low);
  }

  /** Place of a value, moved to the nearer end where it lies outside; NaN stays NaN. */
  double clamped(double value) {
    if (logarithmic && value <= 0) {
      return from;
    }
    return Double.isNaN(value) ? Double.NaN : place(Math.max(low, Math.min(high, value)));
  }
}
