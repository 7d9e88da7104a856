package torqueloom.model.units;

/** Brings the many ways to type a quantity into one: ASCII letters, {@code *}, {@code ^}. */
final class Spelling {
  /** The capital omega; kept as one character because it always ends a symbol. */
  static final char OHM = '\u03A9';

  private static final String SUPERSCRIPTS =
      "\u2070\u00B9\u00B2\u00B3\u2074\u2075\u2076\u2077\u2078\u2079";
  private static final char SUPERSCRIPT_MINUS = '\u207B';

  private Spelling() {}

  /** The same text in plain spelling, without blanks at its ends. */
  static String plain(String text) {
    final StringBuilder plain = new StringBuilder(text.length());
    boolean raised = false;
    for (int i = 0; i < text.length(); i++) {
      final char c = text.charAt(i);
      final boolean superscript = c == SUPERSCRIPT_MINUS || SUPERSCRIPTS.indexOf(c) >= 0;
      if (superscript && !raised) {
        plain.append('^');
      }
      raised = superscript;
      plain.append(plain(c));
    }
    return plain.toString().replace("**", "^").strip();
  }

  private static String plain(char c) {
    final int digit = SUPERSCRIPTS.indexOf(c);
    if (digit >= 0) {
      return String.valueOf(digit);
    }
    return switch (c) {
      case SUPERSCRIPT_MINUS, '\u2212' -> "-";
      // Micro sign and Greek mu; ohm sign and Greek omega; angstrom sign and letter.
      case '\u00B5', '\u03BC' -> "u";
      case '\u2126' -> String.valueOf(OHM);
      case '\u212B' -> "\u00C5";
      case '\u00B0' -> "deg";
      case '\u00B7', '\u22C5', '\u2219', '\u00D7' -> "*";
      case '\t', '\u00A0', '\u2009', '\u202F' -> " ";
      default -> String.valueOf(c);
    };
  }
}
