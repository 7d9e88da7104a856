package torqueloom.reports.figure;

/**
 * Horizontal bars by name, on a chart whose vertical axis holds the names. Arrays are not copied; do
 * not change them.
 *
 * @param label name in the legend, may be empty
 * @param rows places on the vertical axis, [bars]
 * @param values lengths in the unit of the horizontal axis, [bars]
 * @param numbers written at the ends of the bars, [bars], may be empty texts
 * @param style color
 */
public record BarMark(String label, double[] rows, double[] values, String[] numbers, Style style)
    implements Mark {
  private static final double THICKNESS = 0.62;

  /** @throws IllegalArgumentException if lengths differ */
  public BarMark {
    if (rows.length != values.length || numbers.length != values.length) {
      throw new IllegalArgumentException("rows, values and numbers must have one length");
    }
  }

  @Override
  public Extent horizontal() {
    return Extent.of(values);
  }

  @Override
  public Extent vertical() {
    return Extent.of(rows);
  }

  @Override
  public void draw(Canvas canvas) {
    for (int i = 0; i < values.length; i++) {
      final double top = canvas.y().place(rows[i] - THICKNESS / 2);
      final double bottom = canvas.y().place(rows[i] + THICKNESS / 2);
      final double start = canvas.x().from();
      final double end = canvas.x().clamped(values[i]);
      if (!Double.isFinite(top + bottom)) {
        continue;
      }
      if (Double.isFinite(end)) {
        canvas
            .svg()
            .shape(
                canvas.describe(label, values[i], rows[i]),
                "rect",
                "x",
                start,
                "y",
                Math.min(top, bottom),
                "width",
                Math.max(0.8, end - start),
                "height",
                Math.abs(bottom - top),
                "fill",
                style.color(),
                "opacity",
                style.opacity());
      }
      canvas
          .svg()
          .element(
              "text",
              numbers[i],
              "x",
              (Double.isFinite(end) ? end : start) + 6,
              "y",
              (top + bottom) / 2 + 4,
              "font-size",
              "12",
              "fill",
              Palette.INK);
    }
  }

  @Override
  public void sample(SvgWriter svg, double x, double y) {
    svg.empty(
        "rect",
        "x",
        x + 2,
        "y",
        y - 5,
        "width",
        22,
        "height",
        10,
        "fill",
        style.color(),
        "opacity",
        style.opacity());
  }
}
