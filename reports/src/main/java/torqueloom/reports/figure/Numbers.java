package torqueloom.reports.figure;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers as text, the same on every machine and in every locale. */
public final class Numbers {
  private static final String[] DIGITS = {"⁰", "¹", "²", "³", "⁴", "⁵", "⁶", "⁷", "⁸", "⁹"};

  private Numbers() {}

  /** A coordinate in the drawing, to a hundredth of a pixel, without trailing zeros. */
  static String coordinate(double pixels) {
    return plain(new BigDecimal(pixels).setScale(2, RoundingMode.HALF_EVEN));
  }

  /** A number with a fixed number of decimals. */
  public static String fixed(double value, int decimals) {
    final BigDecimal rounded =
        new BigDecimal(Double.toString(value)).setScale(decimals, RoundingMode.HALF_EVEN);
    return minus(rounded.signum() == 0 ? rounded.abs().toPlainString() : rounded.toPlainString());
  }

  /**
   * A number with a few significant digits: plain between 0.001 and a million, else as a power of
   * ten.
   *
   * @param value finite or not; a value that is not finite is shown as a dash
   * @param digits significant digits, &gt;= 1
   */
  public static String significant(double value, int digits) {
    if (!Double.isFinite(value)) {
      return "–";
    }
    if (value == 0) {
      return "0";
    }
    final BigDecimal rounded =
        new BigDecimal(Double.toString(value))
            .round(new MathContext(digits, RoundingMode.HALF_EVEN));
    final int exponent = rounded.precision() - rounded.scale() - 1;
    if (exponent >= -3 && exponent < 6) {
      return minus(plain(rounded));
    }
    return minus(plain(rounded.movePointLeft(exponent))) + "×10" + superscript(exponent);
  }

  /** An integer as superscript digits. */
  public static String superscript(int exponent) {
    final StringBuilder out = new StringBuilder(exponent < 0 ? "⁻" : "");
    for (final char digit : Integer.toString(Math.abs(exponent)).toCharArray()) {
      out.append(DIGITS[digit - '0']);
    }
    return out.toString();
  }

  private static String plain(BigDecimal value) {
    return value.signum() == 0 ? "0" : value.stripTrailingZeros().toPlainString();
  }

  private static String minus(String text) {
    return text.startsWith("-") ? "−" + text.substring(1) : text;
  }
}
