package torqueloom.reports.figure;

/**
 * A straight line across the whole chart: a target or a reference.
 *
 * @param label name in the legend
 * @param value where it stands, in the unit of the axis it crosses
 * @param upright whether it stands on the horizontal axis instead of the vertical one
 * @param style how it looks
 */
public record RuleMark(String label, double value, boolean upright, Style style) implements Mark {
  @Override
  public Extent horizontal() {
    return upright ? Extent.of(value) : Extent.NONE;
  }

  @Override
  public Extent vertical() {
    return upright ? Extent.NONE : Extent.of(value);
  }

  @Override
  public void draw(Canvas canvas) {
    final double place = upright ? canvas.x().place(value) : canvas.y().place(value);
    if (!Double.isFinite(place)) {
      return;
    }
    final double x1 = upright ? place : canvas.x().from();
    final double x2 = upright ? place : canvas.x().to();
    final double y1 = upright ? canvas.y().from() : place;
    final double y2 = upright ? canvas.y().to() : place;
    final Axis axis = upright ? canvas.xAxis() : canvas.yAxis();
    canvas.svg().line(label + ": " + axis.amount(value), x1, y1, x2, y2, style);
  }
}
