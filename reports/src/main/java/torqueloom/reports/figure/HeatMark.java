package torqueloom.reports.figure;

/**
 * A table of numbers as colored cells with the numbers written in, on two axes of names. Arrays are
 * not copied; do not change them.
 *
 * @param label what the numbers are, for tooltips
 * @param unit unit of the numbers, may be empty
 * @param values [rows][columns]; cells that are not finite stay empty
 * @param low value of the darkest color
 * @param high value of the lightest color, &gt; low
 */
public record HeatMark(String label, String unit, double[][] values, double low, double high)
    implements Mark {
  /** Place on the ramp above which dark letters are easier to read. */
  private static final double LIGHT = 0.62;

  /** @throws IllegalArgumentException if high does not exceed low */
  public HeatMark {
    if (!(high > low)) {
      throw new IllegalArgumentException("high must exceed low, got " + low + " and " + high);
    }
  }

  @Override
  public Style style() {
    return new Style(Palette.ramp(0.5), "", Marker.SQUARE, 0, 1);
  }

  @Override
  public Extent horizontal() {
    return values.length == 0 ? Extent.NONE : Extent.of(-0.5, values[0].length - 0.5);
  }

  @Override
  public Extent vertical() {
    return values.length == 0 ? Extent.NONE : Extent.of(-0.5, values.length - 0.5);
  }

  @Override
  public void draw(Canvas canvas) {
    for (int row = 0; row < values.length; row++) {
      for (int column = 0; column < values[row].length; column++) {
        if (Double.isFinite(values[row][column])) {
          cell(canvas, row, column);
        }
      }
    }
  }

  private void cell(Canvas canvas, int row, int column) {
    final double value = values[row][column];
    final double place = (value - low) / (high - low);
    final double left = canvas.x().place(column - 0.5);
    final double right = canvas.x().place(column + 0.5);
    final double top = Math.min(canvas.y().place(row - 0.5), canvas.y().place(row + 0.5));
    final double bottom = Math.max(canvas.y().place(row - 0.5), canvas.y().place(row + 0.5));
    if (!Double.isFinite(left + right + top + bottom)) {
      return;
    }
    final String number = Numbers.significant(value, 3);
    final String words =
        label
            + ": "
            + (unit.isEmpty() ? number : number + " " + unit)
            + " at "
            + canvas.describe("", column, row);
    final Style color = Style.plain(Palette.ramp(place), 0);
    canvas.svg().box(words, left + 1, top + 1, right - left - 2, bottom - top - 2, color);
    final String ink = place > LIGHT ? Palette.INK : "#ffffff";
    canvas.svg().label(number, (left + right) / 2, (top + bottom) / 2 + 4, "middle", ink);
  }
}
