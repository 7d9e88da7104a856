package torqueloom.reports.figure;

import java.util.Arrays;

/**
 * A box from the lower to the upper quartile with the median across, and whiskers to given
 * quantiles.
 *
 * @param label name in the legend, may be empty
 * @param place horizontal place
 * @param width of the box, in the unit of the horizontal axis
 * @param quantiles whisker, quartile, median, quartile, whisker, ascending, [5]
 * @param style color
 */
public record BoxMark(String label, double place, double width, double[] quantiles, Style style)
    implements Mark {
  /** @throws IllegalArgumentException if there are not five quantiles */
  public BoxMark {
    if (quantiles.length != 5) {
      throw new IllegalArgumentException("a box needs five quantiles, got " + quantiles.length);
    }
  }

  /**
   * A box of a sample, whiskers at the 5 % and 95 % quantiles (linear between order statistics).
   *
   * @param values the sample; values that are not finite are left out
   */
  public static BoxMark of(String label, double place, double width, double[] values, Style style) {
    final double[] sorted = Arrays.stream(values).filter(Double::isFinite).sorted().toArray();
    final double[] shares = {0.05, 0.25, 0.5, 0.75, 0.95};
    final double[] quantiles = new double[5];
    for (int i = 0; i < 5; i++) {
      quantiles[i] = quantile(sorted, shares[i]);
    }
    return new BoxMark(label, place, width, quantiles, style);
  }

  private static double quantile(double[] sorted, double share) {
    if (sorted.length == 0) {
      return Double.NaN;
    }
    final double at = share * (sorted.length - 1);
    final int below = (int) at;
    final int above = Math.min(sorted.length - 1, below + 1);
    return sorted[below] + (sorted[above] - sorted[below]) * (at - below);
  }

  @Override
  public Extent horizontal() {
    return Extent.of(place - width / 2, place + width / 2);
  }

  @Override
  public Extent vertical() {
    return Extent.of(quantiles);
  }

  @Override
  public void draw(Canvas canvas) {
    final double[] y = Arrays.stream(quantiles).map(canvas.y()::clamped).toArray();
    final double left = canvas.x().place(place - width / 2);
    final double right = canvas.x().place(place + width / 2);
    if (!Double.isFinite(y[0] + y[1] + y[2] + y[3] + y[4] + left + right)) {
      return;
    }
    canvas.svg().open("g").element("title", words(canvas));
    final double middle = (left + right) / 2;
    canvas.svg().line("", middle, y[0], middle, y[4], Style.plain(style.color(), 1.4));
    frame(canvas.svg(), left, right, y[3], Math.max(0.5, y[1] - y[3]));
    canvas.svg().line("", left, y[2], right, y[2], Style.plain(style.color(), 3)).close();
  }

  private void frame(SvgWriter svg, double left, double right, double top, double height) {
    svg.box("", left, top, right - left, height, Style.plain("#ffffff", 0));
    final String path =
        "M"
            + Shapes.point(left, top)
            + "H"
            + Numbers.coordinate(right)
            + "V"
            + Numbers.coordinate(top + height)
            + "H"
            + Numbers.coordinate(left)
            + "Z";
    svg.stroke("", path, Style.plain(style.color(), 1.4));
  }

  private String words(Canvas canvas) {
    final Axis axis = canvas.yAxis();
    return (label.isEmpty() ? canvas.xAxis().describe(place) : label)
        + ": median "
        + axis.amount(quantiles[2])
        + ", quartiles "
        + axis.amount(quantiles[1])
        + " and "
        + axis.amount(quantiles[3])
        + ", whiskers "
        + axis.amount(quantiles[0])
        + " and "
        + axis.amount(quantiles[4]);
  }

  @Override
  public void sample(SvgWriter svg, double x, double y) {
    frame(svg, x + 4, x + 22, y - 5, 10);
    svg.line("", x + 4, y, x + 22, y, Style.plain(style.color(), 3));
  }
}
