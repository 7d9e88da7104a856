package torqueloom.model.table;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.function.Predicate;

/**
 * The shortest decimal that reads back to the same double, the closest one if several are equally
 * short. {@code Double.toString} is neither shortest nor the same before Java 19, so it is not
 * used.
 *
 * <p>Notation as ECMAScript writes numbers (ECMA-262, Number::toString, from memory; also the rule
 * of RFC 8785, section 3.2.2.3), but without the plus sign of an exponent and keeping {@code -0}:
 * plain from 1e-6 to below 1e21, otherwise {@code 5e-10}, {@code 1.5e300}.
 */
final class ShortestDecimal {
  private static final int ALWAYS_ENOUGH = 17;

  /**
   * Decimals of so many digits differ as normal doubles, so the closest one is then the shortest.
   */
  private static final int ALWAYS_DISTINCT = 15;

  private static final double LARGEST_PLAIN_INTEGER = 0x1.0p53;

  private ShortestDecimal() {}

  /**
   * @param value finite
   */
  static String of(double value) {
    if (value == 0) {
      return 1 / value < 0 ? "-0" : "0";
    }
    if (Math.abs(value) < LARGEST_PLAIN_INTEGER && value == Math.rint(value)) {
      return Long.toString((long) value);
    }
    return notation(shortest(value));
  }

  /** The shortest decimal that reads back to the same float; {@code value} finite. */
  static String of(float value) {
    if (value == 0) {
      return of((double) value);
    }
    final BigDecimal exact = new BigDecimal(value);
    for (int digits = 1; digits < 9; digits++) {
      final BigDecimal candidate = closest(exact, digits, decimal -> decimal.floatValue() == value);
      if (candidate != null) {
        return notation(candidate);
      }
    }
    return notation(exact.round(new MathContext(9, RoundingMode.HALF_EVEN)));
  }

  private static BigDecimal shortest(double value) {
    final BigDecimal exact = new BigDecimal(value);
    final boolean normal = Math.abs(value) >= Double.MIN_NORMAL;
    for (int digits = normal ? ALWAYS_DISTINCT : 1; digits < ALWAYS_ENOUGH; digits++) {
      final BigDecimal candidate =
          closest(exact, digits, decimal -> decimal.doubleValue() == value);
      if (candidate != null) {
        return candidate;
      }
    }
    return exact.round(new MathContext(ALWAYS_ENOUGH, RoundingMode.HALF_EVEN));
  }

  /**
   * The closest decimal of so many digits that reads back. Both neighbors are tried: beside a power
   * of two the closer one may lie outside the narrower half of the rounding interval.
   */
  private static BigDecimal closest(BigDecimal exact, int digits, Predicate<BigDecimal> readsBack) {
    final BigDecimal nearest = exact.round(new MathContext(digits, RoundingMode.HALF_EVEN));
    if (readsBack.test(nearest)) {
      return nearest;
    }
    final RoundingMode away =
        nearest.abs().compareTo(exact.abs()) < 0 ? RoundingMode.UP : RoundingMode.DOWN;
    final BigDecimal other = exact.round(new MathContext(digits, away));
    return readsBack.test(other) ? other : null;
  }

  private static String notation(BigDecimal value) {
    final BigDecimal stripped = value.stripTrailingZeros();
    final int exponent = stripped.precision() - stripped.scale() - 1;
    if (exponent >= -6 && exponent < 21) {
      return stripped.toPlainString();
    }
    return stripped.scaleByPowerOfTen(-exponent).toPlainString() + "e" + exponent;
  }
}
