package torqueloom.reports.render;

import torqueloom.reports.document.Callout;

/** The page's ornaments, drawn here: a woven band at the top and the signs of the callouts. */
final class Weave {
  /** A band of threads that pass over and under each other; says nothing, so it is hidden from readers. */
  static final String BAND = band();

  private Weave() {}

  private static String band() {
    final StringBuilder cell = new StringBuilder();
    final String[] warp = {"#17406d", "#d9822b", "#4f9d8a", "#8c3b6b", "#b9a22b", "#5b6573"};
    for (int column = 0; column < warp.length; column++) {
      cell.append(rect(column * 12 + 2, 0, 8, 36, warp[column]));
      for (int row = 0; row < 3; row++) {
        if ((row + column) % 2 == 0) {
          cell.append(rect(column * 12, row * 12 + 2, 12, 8, "#e9e4d8"));
        } else {
          cell.append(rect(column * 12, row * 12 + 2, 2, 8, "#e9e4d8"));
          cell.append(rect(column * 12 + 10, row * 12 + 2, 2, 8, "#e9e4d8"));
        }
      }
    }
    return "<svg class=\"weave\" xmlns=\"http://www.w3.org/2000/svg\" width=\"100%\" height=\"36\""
        + " aria-hidden=\"true\" focusable=\"false\"><defs><pattern id=\"weave-cell\" width=\"72\""
        + " height=\"36\" patternUnits=\"userSpaceOnUse\">"
        + cell
        + "</pattern></defs>"
        + "<rect width=\"100%\" height=\"36\" fill=\"url(#weave-cell)\"/></svg>";
  }

  private static String rect(int x, int y, int width, int height, String color) {
    return "<rect x=\""
        + x
        + "\" y=\""
        + y
        + "\" width=\""
        + width
        + "\" height=\""
        + height
        + "\" fill=\""
        + color
        + "\"/>";
  }

  /** A small sign whose shape, not its color, tells the tone. */
  static String sign(Callout.Tone tone) {
    final String path =
        switch (tone) {
          case MET -> "M6 17l7 7L27 9";
          case NOT_MET -> "M8 8l16 16M24 8L8 24";
          case UNDECIDED -> "M11 12a5 5 0 1 1 7 5c-2 1-2 2-2 4M16 25v0.6";
          case CAUTION -> "M16 6v13M16 24v1";
          case NOTE -> "M16 8v1M16 14v11";
        };
    return "<svg class=\"sign\" xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 32 32\" width=\"32\""
        + " height=\"32\" aria-hidden=\"true\" focusable=\"false\"><path d=\""
        + path
        + "\" fill=\"none\" stroke=\"currentColor\" stroke-width=\"4\" stroke-linecap=\"round\""
        + " stroke-linejoin=\"round\"/></svg>\n";
  }
}
