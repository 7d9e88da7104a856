package torqueloom.model.units;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.EnumSet;
import java.util.Set;

/**
 * SI number to text for people: {@code 4.00 mT}, {@code 7.8e11 A/m^2}, {@code 62.1}. Rounds half to
 * even from the exact value of the double; never depends on the locale.
 */
public final class QuantityFormat {
  private static final int DEFAULT_DIGITS = 3;
  private static final String PREFIXES = "afpnum kMGTP";
  private static final int SMALLEST_PREFIX = -18;
  private static final int LARGEST_PREFIX = 15;

  /** Kinds shown without prefix, because their unit has one already or a power would mislead. */
  private static final Set<QuantityKind> WITHOUT_PREFIX =
      EnumSet.of(
          QuantityKind.RATIO,
          QuantityKind.AREA,
          QuantityKind.VOLUME,
          QuantityKind.ANGLE,
          QuantityKind.TEMPERATURE,
          QuantityKind.GYROMAGNETIC_RATIO,
          QuantityKind.CURRENT_DENSITY,
          QuantityKind.ELECTRIC_FIELD,
          QuantityKind.RESISTIVITY,
          QuantityKind.RESISTANCE_AREA,
          QuantityKind.THERMAL_RESISTANCE);

  private QuantityFormat() {}

  /** Shows a value to three digits; see {@link #text(double, QuantityKind, int)}. */
  public static String text(double value, QuantityKind kind) {
    return text(value, kind, DEFAULT_DIGITS);
  }

  /**
   * Shows a value with its unit.
   *
   * @param value in SI units; NaN gives {@code unknown}
   * @param kind what it is, which decides the unit and whether it takes a prefix
   * @param digits significant digits, at least 1
   * @throws IllegalArgumentException if digits is below 1
   */
  public static String text(double value, QuantityKind kind, int digits) {
    if (digits < 1) {
      throw new IllegalArgumentException("digits must be at least 1, got " + digits);
    }
    if (Double.isNaN(value)) {
      return "unknown";
    }
    if (Double.isInfinite(value)) {
      return value > 0 ? "infinite" : "minus infinite";
    }
    if (WITHOUT_PREFIX.contains(kind)) {
      return withUnit(number(inDisplayUnit(value, kind), digits), kind.displayUnit());
    }
    return prefixed(new BigDecimal(value), kind.displayUnit(), digits);
  }

  /** A ratio as a percentage to three digits, such as {@code 92.4 %}. */
  public static String percent(double ratio) {
    return Double.isFinite(ratio)
        ? number(new BigDecimal(ratio).scaleByPowerOfTen(2), DEFAULT_DIGITS) + " %"
        : text(ratio, QuantityKind.RATIO);
  }

  private static BigDecimal inDisplayUnit(double value, QuantityKind kind) {
    return kind.displayUnit().isEmpty()
        ? new BigDecimal(value)
        : UnitReader.read(kind.displayUnit()).fromSi(value);
  }

  private static String prefixed(BigDecimal value, String unit, int digits) {
    if (value.signum() == 0) {
      return "0 " + unit;
    }
    final BigDecimal rounded = round(value, digits);
    final int power = Math.floorDiv(leadingExponent(rounded), 3) * 3;
    if (power < SMALLEST_PREFIX || power > LARGEST_PREFIX) {
      return scientific(rounded) + " " + unit;
    }
    final char prefix = PREFIXES.charAt((power - SMALLEST_PREFIX) / 3);
    return rounded.scaleByPowerOfTen(-power).toPlainString()
        + " "
        + (power == 0 ? "" : String.valueOf(prefix))
        + unit;
  }

  /** Plain between 0.001 and 100000, otherwise with a power of ten. */
  private static String number(BigDecimal value, int digits) {
    if (value.signum() == 0) {
      return "0";
    }
    final BigDecimal rounded = round(value, digits);
    final int exponent = leadingExponent(rounded);
    return exponent >= -3 && exponent < 5 ? rounded.toPlainString() : scientific(rounded);
  }

  /** Rounded to so many digits, written with exactly so many. */
  private static BigDecimal round(BigDecimal value, int digits) {
    final BigDecimal rounded = value.round(new MathContext(digits, RoundingMode.HALF_EVEN));
    return rounded.setScale(digits - 1 - leadingExponent(rounded), RoundingMode.UNNECESSARY);
  }

  private static int leadingExponent(BigDecimal value) {
    return value.precision() - value.scale() - 1;
  }

  private static String scientific(BigDecimal rounded) {
    final int exponent = leadingExponent(rounded);
    final BigDecimal mantissa = rounded.scaleByPowerOfTen(-exponent).stripTrailingZeros();
    return mantissa.toPlainString() + "e" + exponent;
  }

  private static String withUnit(String number, String unit) {
    return unit.isEmpty() ? number : number + " " + unit;
  }
}
