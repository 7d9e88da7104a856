package torqueloom.reports.document;

/** Plain text made safe for XML. */
public final class Markup {
  private static final char REPLACEMENT = '\uFFFD';

  private Markup() {}

  /**
   * Text for element contents and for attribute values in double quotes: the five special characters
   * are written as references; characters that XML 1.0 cannot hold (controls, lone surrogates) become
   * U+FFFD.
   */
  public static String escape(String text) {
    final StringBuilder out = new StringBuilder(text.length() + 16);
    int i = 0;
    while (i < text.length()) {
      final int point = text.codePointAt(i);
      append(out, point);
      i += Character.charCount(point);
    }
    return out.toString();
  }

  private static void append(StringBuilder out, int point) {
    switch (point) {
      case '<' -> out.append("&lt;");
      case '>' -> out.append("&gt;");
      case '&' -> out.append("&amp;");
      case '"' -> out.append("&quot;");
      case '\'' -> out.append("&#39;");
      default -> out.appendCodePoint(allowed(point) ? point : REPLACEMENT);
    }
  }

  private static boolean allowed(int point) {
    return point == '\t'
        || point == '\n'
        || point >= 0x20 && point <= 0xD7FF
        || point >= 0xE000 && point <= 0xFFFD
        || point >= 0x10000;
  }
}
