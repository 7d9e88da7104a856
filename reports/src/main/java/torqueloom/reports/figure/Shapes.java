package torqueloom.reports.figure;

/** Small shapes shared by marks. */
final class Shapes {
  /** Half the size of a point (pixel). */
  private static final double R = 3.4;

  private Shapes() {}

  /** A point with a tooltip. */
  static void marker(SvgWriter svg, String tooltip, Style style, double x, double y) {
    if (!Double.isFinite(x) || !Double.isFinite(y)) {
      return;
    }
    switch (style.marker()) {
      case NONE -> {}
      case DISK -> svg.disk(tooltip, x, y, R, Style.plain(style.color(), 0));
      case RING -> {
        svg.disk(tooltip, x, y, R, Style.plain(style.color(), 0));
        svg.disk(tooltip, x, y, R - 1.5, Style.plain("#ffffff", 0));
      }
      case SQUARE ->
          path(svg, tooltip, style, x - R, y - R, x + R, y - R, x + R, y + R, x - R, y + R);
      case TRIANGLE ->
          path(svg, tooltip, style, x, y - 1.3 * R, x + 1.2 * R, y + R, x - 1.2 * R, y + R);
      case DIAMOND ->
          path(svg, tooltip, style, x, y - 1.4 * R, x + 1.4 * R, y, x, y + 1.4 * R, x - 1.4 * R, y);
      default -> throw new IllegalStateException("unknown marker " + style.marker());
    }
  }

  private static void path(SvgWriter svg, String tooltip, Style style, double... corners) {
    final StringBuilder d = new StringBuilder();
    for (int i = 0; i < corners.length; i += 2) {
      d.append(i == 0 ? "M" : "L").append(point(corners[i], corners[i + 1]));
    }
    svg.fill(tooltip, d.append('Z').toString(), Style.plain(style.color(), 0));
  }

  /** Two coordinates as they stand in a path. */
  static String point(double x, double y) {
    return Numbers.coordinate(x) + " " + Numbers.coordinate(y);
  }

  /** A vertical bar with short caps. */
  static String errorBar(double x, double y1, double y2) {
    return "M" + point(x, y1) + "L" + point(x, y2) + cap(x, y1) + cap(x, y2);
  }

  private static String cap(double x, double y) {
    return "M" + point(x - 3, y) + "h6";
  }

  /** The sample of an area in a legend. */
  static void swatch(SvgWriter svg, double x, double y, Style style) {
    svg.box("", x + 2, y - 5, 22, 10, style);
  }

  /** A path through the finite points; a gap wherever a point is not finite. */
  static String polyline(double[] x, double[] y) {
    final StringBuilder d = new StringBuilder();
    boolean pen = false;
    for (int i = 0; i < Math.min(x.length, y.length); i++) {
      if (Double.isFinite(x[i]) && Double.isFinite(y[i])) {
        d.append(pen ? "L" : "M").append(point(x[i], y[i]));
        pen = true;
      } else {
        pen = false;
      }
    }
    return d.toString();
  }
}
