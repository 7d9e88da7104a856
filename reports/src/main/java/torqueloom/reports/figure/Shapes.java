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
      case DISK -> svg.shape(tooltip, "circle", "cx", x, "cy", y, "r", R, "fill", style.color());
      case RING ->
          svg.shape(
              tooltip,
              "circle",
              "cx",
              x,
              "cy",
              y,
              "r",
              R,
              "fill",
              "#ffffff",
              "stroke",
              style.color(),
              "stroke-width",
              1.5);
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
    svg.shape(tooltip, "path", "d", d.append('Z'), "fill", style.color());
  }

  /** Two coordinates as they stand in a path. */
  static String point(double x, double y) {
    return Numbers.coordinate(x) + " " + Numbers.coordinate(y);
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
