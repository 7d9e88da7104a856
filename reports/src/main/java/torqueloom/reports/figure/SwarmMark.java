package torqueloom.reports.figure;

import java.util.Arrays;

/**
 * Every value of a sample, side by side where they crowd: dots for a small sample, the same shape as
 * bars for a large one. The array is not copied; do not change it.
 *
 * @param label name in the legend, may be empty
 * @param place left edge on the horizontal axis; the sample spreads to the right
 * @param width room on the horizontal axis, in its unit
 * @param values the sample; values that are not finite are left out
 * @param style how it looks
 */
public record SwarmMark(String label, double place, double width, double[] values, Style style)
    implements Mark {
  /** Largest sample that is drawn as single dots. */
  private static final int MOST_DOTS = 150;

  /** Length of a bar that must still be seen (pixel). */
  private static final double THINNEST = 1.5;

  /** Height of one row of values (pixel). */
  private static final double ROW = 5;

  @Override
  public Extent horizontal() {
    return Extent.of(place, place + width);
  }

  @Override
  public Extent vertical() {
    return Extent.of(values);
  }

  @Override
  public void draw(Canvas canvas) {
    if (!Double.isFinite(pixels(canvas))) {
      return;
    }
    final double[] sorted = Arrays.stream(values).filter(Double::isFinite).sorted().toArray();
    final int rows = (int) Math.ceil(Math.abs(canvas.y().to() - canvas.y().from()) / ROW) + 1;
    final int[] rowOf = new int[sorted.length];
    final int[] filled = new int[rows];
    for (int i = 0; i < sorted.length; i++) {
      final double up = canvas.y().from() - canvas.y().clamped(sorted[i]);
      rowOf[i] = Math.max(0, Math.min(rows - 1, (int) Math.floor(up / ROW)));
      filled[rowOf[i]]++;
    }
    final int fullest = Math.max(1, Arrays.stream(filled).max().orElse(1));
    if (sorted.length <= MOST_DOTS) {
      dots(canvas, sorted, rowOf, rows, fullest);
    } else {
      bars(canvas, sorted, rowOf, filled, fullest);
    }
  }

  private double pixels(Canvas canvas) {
    return canvas.x().place(place + width) - canvas.x().place(place);
  }

  private void dots(Canvas canvas, double[] sorted, int[] rowOf, int rows, int fullest) {
    final double step = Math.min(ROW, pixels(canvas) / fullest);
    final double left = canvas.x().place(place);
    final int[] used = new int[rows];
    for (int i = 0; i < sorted.length; i++) {
      final int row = rowOf[i];
      final double px = left + step * (used[row]++ + 0.5);
      final double py = canvas.y().from() - ROW * (row + 0.5);
      canvas.svg().disk(canvas.describe(label, place, sorted[i]), px, py, 2.1, style);
    }
  }

  private void bars(Canvas canvas, double[] sorted, int[] rowOf, int[] filled, int fullest) {
    final double step = Math.min(ROW, pixels(canvas) / fullest);
    final double left = canvas.x().place(place);
    for (int first = 0; first < sorted.length; first += filled[rowOf[first]]) {
      final int row = rowOf[first];
      final String words =
          canvas.describe(label, place, sorted[first])
              + " to "
              + canvas.yAxis().amount(sorted[first + filled[row] - 1])
              + ": "
              + filled[row]
              + " of "
              + sorted.length;
      final double top = canvas.y().from() - ROW * (row + 1) + 0.4;
      canvas.svg().box(words, left, top, Math.max(THINNEST, step * filled[row]), ROW - 0.8, style);
    }
  }

  @Override
  public void sample(SvgWriter svg, double x, double y) {
    for (int i = 0; i < 3; i++) {
      svg.disk("", x + 5 + 7 * i, y, 2.1, style);
    }
  }
}
