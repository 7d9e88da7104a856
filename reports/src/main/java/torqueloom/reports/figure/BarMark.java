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
      if (Double.isFinite(top + bottom)) {
        bar(canvas, i, Math.min(top, bottom), Math.abs(bottom - top));
      }
    }
  }

  private void bar(Canvas canvas, int i, double top, double height) {
    final double start = canvas.x().from();
    double end = canvas.x().clamped(values[i]);
    if (Double.isFinite(end)) {
      final String words = canvas.describe(label, values[i], rows[i]);
      canvas.svg().box(words, start, top, Math.max(0.8, end - start), height, style);
    } else {
      end = start;
    }
    canvas.svg().label(numbers[i], end + 6, top + height / 2 + 4, "start", Palette.INK);
  }

  @Override
  public void sample(SvgWriter svg, double x, double y) {
    Shapes.swatch(svg, x, y, style);
  }
}
