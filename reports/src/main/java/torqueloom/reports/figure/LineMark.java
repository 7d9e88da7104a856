package torqueloom.reports.figure;

/**
 * A curve through points, with error bars where they are given. Arrays are not copied; do not change
 * them.
 *
 * @param label name in the legend, may be empty
 * @param x horizontal values, [points]
 * @param y vertical values, [points]
 * @param low lower ends of the error bars, [points], or empty
 * @param high upper ends of the error bars, [points], or empty
 * @param joined whether the points are joined by a line
 * @param style how it looks
 */
public record LineMark(
    String label, double[] x, double[] y, double[] low, double[] high, boolean joined, Style style)
    implements Mark {
  private static final double[] NO_BARS = {};

  /** @throws IllegalArgumentException if lengths differ */
  public LineMark {
    if (y.length != x.length
        || low.length != high.length
        || low.length != 0 && low.length != x.length) {
      throw new IllegalArgumentException("x, y, low and high must have one length");
    }
  }

  /** A curve without error bars. */
  public static LineMark curve(String label, double[] x, double[] y, Style style) {
    return new LineMark(label, x, y, NO_BARS, NO_BARS, true, style);
  }

  @Override
  public Extent horizontal() {
    return Extent.of(x);
  }

  @Override
  public Extent vertical() {
    return Extent.of(y).and(Extent.of(low)).and(Extent.of(high));
  }

  @Override
  public void draw(Canvas canvas) {
    final double[] px = new double[x.length];
    final double[] py = new double[x.length];
    for (int i = 0; i < x.length; i++) {
      px[i] = canvas.x().place(x[i]);
      py[i] = canvas.y().place(y[i]);
    }
    final String path = joined ? Shapes.polyline(px, py) : "";
    if (!path.isEmpty()) {
      canvas.svg().stroke(style.marker() == Marker.NONE ? label : "", path, style);
    }
    for (int i = 0; i < x.length; i++) {
      if (low.length > 0) {
        bar(canvas, px[i], low[i], high[i]);
      }
      Shapes.marker(canvas.svg(), words(canvas, i), style, px[i], py[i]);
    }
  }

  private String words(Canvas canvas, int i) {
    final String point = canvas.describe(label, x[i], y[i]);
    if (low.length == 0 || !Double.isFinite(low[i]) || !Double.isFinite(high[i])) {
      return point;
    }
    return point
        + " ("
        + canvas.yAxis().amount(low[i])
        + " to "
        + canvas.yAxis().amount(high[i])
        + ")";
  }

  private void bar(Canvas canvas, double px, double from, double to) {
    final double y1 = canvas.y().clamped(from);
    final double y2 = canvas.y().clamped(to);
    if (Double.isFinite(px) && Double.isFinite(y1) && Double.isFinite(y2)) {
      canvas.svg().stroke("", Shapes.errorBar(px, y1, y2), Style.plain(style.color(), 1.1));
    }
  }
}
