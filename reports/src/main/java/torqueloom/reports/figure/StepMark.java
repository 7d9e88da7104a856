package torqueloom.reports.figure;

/**
 * A staircase: one level between each two edges, as in a histogram. Arrays are not copied; do not
 * change them.
 *
 * @param label name in the legend, may be empty
 * @param edges ascending, [levels + 1]
 * @param levels height of each step, [levels]
 * @param filled whether the area down to zero is filled
 * @param style how it looks
 */
public record StepMark(String label, double[] edges, double[] levels, boolean filled, Style style)
    implements Mark {
  /** @throws IllegalArgumentException if there is not one edge more than levels */
  public StepMark {
    if (edges.length != levels.length + 1) {
      throw new IllegalArgumentException("a staircase needs one edge more than levels");
    }
  }

  @Override
  public Extent horizontal() {
    return Extent.of(edges);
  }

  @Override
  public Extent vertical() {
    return Extent.of(levels).and(filled ? Extent.of(0) : Extent.NONE);
  }

  @Override
  public void draw(Canvas canvas) {
    for (int i = 0; i < levels.length; i++) {
      final double left = canvas.x().place(edges[i]);
      final double right = canvas.x().place(edges[i + 1]);
      final double top = canvas.y().clamped(levels[i]);
      if (Double.isFinite(left) && Double.isFinite(right) && Double.isFinite(top)) {
        step(canvas, i, left, right, top);
      }
    }
  }

  private void step(Canvas canvas, int i, double left, double right, double top) {
    final String words =
        (label.isEmpty() ? "" : label + ": ")
            + canvas.xAxis().describe(edges[i])
            + " to "
            + canvas.xAxis().amount(edges[i + 1])
            + ", "
            + canvas.yAxis().describe(levels[i]);
    if (filled) {
      final double base = canvas.y().clamped(0);
      final double width = Math.max(0.3, right - left - 0.6);
      canvas.svg().box(words, left, Math.min(top, base), width, Math.abs(base - top), style);
    } else {
      canvas.svg().line(words, left, top, right, top, style);
    }
  }
}
