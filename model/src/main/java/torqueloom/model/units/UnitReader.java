package torqueloom.model.units;

/**
 * Reads a unit such as {@code fJ/(V m)}.
 *
 * <pre>
 *   unit    = product [ "/" ( factor | "(" product ")" ) ]
 *   product = factor { [ "*" ] factor }
 *   factor  = symbol [ [ "^" ] exponent ]
 * </pre>
 *
 * <p>At most one slash, and a product under it stands in parentheses: {@code a/b/c} and {@code a/b
 * c} are read in two ways by different people. Expects text that {@link Spelling} has made plain.
 */
final class UnitReader {
  private static final int LARGEST_EXPONENT = 9;

  private final String text;
  private int at;

  private UnitReader(String text) {
    this.text = text;
  }

  /**
   * @throws UnitRefusal with the reason, if this is no unit
   */
  static UnitScale read(String text) {
    final UnitReader reader = new UnitReader(text);
    final UnitScale above = reader.product();
    reader.skipBlanks();
    final UnitScale unit = reader.peek() == '/' ? above.times(reader.divisor()) : above;
    reader.skipBlanks();
    if (reader.at < text.length()) {
      throw reader.unexpected();
    }
    return unit;
  }

  private UnitScale divisor() {
    at++;
    skipBlanks();
    final boolean grouped = peek() == '(';
    final UnitScale below = grouped ? group() : factor();
    skipBlanks();
    if (peek() == '/' || (!grouped && (peek() == '*' || isSymbolPart(peek()) || peek() == '('))) {
      throw new UnitRefusal(
          "\"" + text + "\" can be read in two ways; write one fraction, e.g. fJ/(V m)");
    }
    return below.inverse();
  }

  private UnitScale group() {
    at++;
    final UnitScale inside = product();
    skipBlanks();
    if (peek() != ')') {
      throw new UnitRefusal("a closing parenthesis is missing in \"" + text + "\"");
    }
    at++;
    return inside;
  }

  private UnitScale product() {
    UnitScale product = factor();
    while (true) {
      skipBlanks();
      final boolean sign = peek() == '*';
      if (!sign && !isSymbolPart(peek())) {
        return product;
      }
      if (sign) {
        at++;
      }
      product = product.times(factor());
    }
  }

  private UnitScale factor() {
    skipBlanks();
    final String symbol = symbol();
    if (symbol.isEmpty()) {
      throw unexpected();
    }
    final UnitScale unit = UnitTable.find(symbol).orElseThrow(() -> unknown(symbol));
    return unit.power(exponent());
  }

  private String symbol() {
    final int start = at;
    while (at < text.length() && isSymbolPart(text.charAt(at))) {
      if (text.charAt(at++) == Spelling.OHM) {
        break;
      }
    }
    return text.substring(start, at).replace(String.valueOf(Spelling.OHM), "ohm");
  }

  private int exponent() {
    final boolean caret = peek() == '^';
    if (caret) {
      at++;
    }
    final boolean grouped = caret && peek() == '(';
    if (grouped) {
      at++;
    }
    final int start = at;
    if (peek() == '-' || (caret && peek() == '+')) {
      at++;
    }
    while (Character.isDigit(peek())) {
      at++;
    }
    final String digits = text.substring(start, at);
    if (digits.isEmpty() && !caret) {
      return 1;
    }
    if (grouped && peek() == ')') {
      at++;
    }
    return checked(digits);
  }

  private int checked(String digits) {
    if (digits.matches("[+-]?[0-9]{1,2}")) {
      final int exponent = Integer.parseInt(digits);
      if (exponent != 0 && Math.abs(exponent) <= LARGEST_EXPONENT) {
        return exponent;
      }
    }
    throw new UnitRefusal(
        "an exponent in \"" + text + "\" is no whole number from 1 to 9 or -1 to -9");
  }

  private UnitRefusal unknown(String symbol) {
    if (symbol.matches("deg[CF]|C?celsius|Celsius")) {
      return new UnitRefusal("temperatures are absolute, in kelvin");
    }
    return new UnitRefusal(
        "\""
            + symbol
            + "\" is no known unit"
            + UnitTable.nearest(symbol).map(near -> " (nearest: " + near + ")").orElse(""));
  }

  private UnitRefusal unexpected() {
    if (at >= text.length()) {
      return new UnitRefusal("the unit \"" + text + "\" is not complete");
    }
    return new UnitRefusal("\"" + text.substring(at) + "\" does not belong to a unit");
  }

  private void skipBlanks() {
    while (peek() == ' ') {
      at++;
    }
  }

  /** The next character, or 0 at the end. */
  private char peek() {
    return at < text.length() ? text.charAt(at) : 0;
  }

  private static boolean isSymbolPart(char c) {
    return Character.isLetter(c) || c == '%' || c == Spelling.OHM;
  }
}
