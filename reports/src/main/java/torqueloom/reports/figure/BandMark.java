package torqueloom.reports.figure;

/**
 * The area between two curves. Arrays are not copied; do not change them.
 *
 * @param label name in the legend, may be empty
 * @param x horizontal values, [points]
 * @param low lower curve, [points]
 * @param high upper curve, [points]
 * @param style color and opacity of the area
 */
public record BandMark(String label, double[] x, double[] low, double[] high, Style style)
    implements Mark {
  /** @throws IllegalArgumentException if lengths differ */
  public BandMark {
    if (low.length != x.length || high.length != x.length) {
      throw new IllegalArgumentException("x, low and high must have one length");
    }
  }

  @Override
  public Extent horizontal() {
    return Extent.of(x);
  }

  @Override
  public Extent vertical() {
    return Extent.of(low).and(Extent.of(high));
  }

  @Override
  public void draw(Canvas canvas) {
    int start = 0;
    while (start < x.length) {
      int end = start;
      while (end < x.length && whole(end)) {
        end++;
      }
      if (end - start > 1) {
        area(canvas, start, end);
      }
      start = Math.max(end, start) + 1;
    }
  }

  private boolean whole(int i) {
    return Double.isFinite(x[i]) && Double.isFinite(low[i]) && Double.isFinite(high[i]);
  }

  private void area(Canvas canvas, int start, int end) {
    final StringBuilder d = new StringBuilder("M");
    for (int i = start; i < end; i++) {
      d.append(i == start ? "" : "L")
          .append(Shapes.point(canvas.x().place(x[i]), canvas.y().clamped(high[i])));
    }
    for (int i = end - 1; i >= start; i--) {
      d.append("L").append(Shapes.point(canvas.x().place(x[i]), canvas.y().clamped(low[i])));
    }
    canvas.svg().fill(label, d.append('Z').toString(), style);
  }

  @Override
  public void sample(SvgWriter svg, double x0, double y0) {
    Shapes.swatch(svg, x0, y0, style);
  }
}
