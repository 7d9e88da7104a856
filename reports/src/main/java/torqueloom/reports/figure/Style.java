package torqueloom.reports.figure;

/**
 * How a mark looks.
 *
 * @param color as #rrggbb
 * @param dash lengths of dashes and gaps (pixel), empty for a full line
 * @param marker shape of its points
 * @param width of its lines (pixel)
 * @param opacity from 0 to 1
 */
public record Style(String color, String dash, Marker marker, double width, double opacity) {
  /** A full line or area in a color, without points. */
  public static Style plain(String color, double width) {
    return new Style(color, "", Marker.NONE, width, 1);
  }

  /** The same style with a full, thin, faint line and no points. */
  public Style faint() {
    return new Style(color, "", Marker.NONE, 0.7, 0.22);
  }

  /** The same style with other points. */
  public Style with(Marker other) {
    return new Style(color, dash, other, width, opacity);
  }

  /** The same style with an opacity. */
  public Style fade(double newOpacity) {
    return new Style(color, dash, marker, width, newOpacity);
  }

  /** The same style with a line width (pixel) and dash. */
  public Style line(double newWidth, String newDash) {
    return new Style(color, newDash, marker, newWidth, opacity);
  }
}
