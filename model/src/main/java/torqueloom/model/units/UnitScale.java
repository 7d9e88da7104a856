package torqueloom.model.units;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * A unit as an exact fraction of its SI unit.
 *
 * @param numerator exact
 * @param denominator exact, not zero
 * @param dimension what the unit measures
 */
record UnitScale(BigDecimal numerator, BigDecimal denominator, Dimension dimension) {

  static final UnitScale ONE = new UnitScale(BigDecimal.ONE, BigDecimal.ONE, Dimension.NONE);

  /** Far more digits than a double keeps, so that one rounding remains in practice. */
  private static final MathContext WORKING = new MathContext(60);

  static UnitScale of(String numerator, Dimension dimension) {
    return new UnitScale(new BigDecimal(numerator), BigDecimal.ONE, dimension);
  }

  UnitScale scaled(int decimalExponent) {
    return new UnitScale(numerator.scaleByPowerOfTen(decimalExponent), denominator, dimension);
  }

  UnitScale times(UnitScale other) {
    return new UnitScale(
        numerator.multiply(other.numerator),
        denominator.multiply(other.denominator),
        dimension.times(other.dimension));
  }

  UnitScale inverse() {
    return new UnitScale(denominator, numerator, dimension.power(-1));
  }

  UnitScale power(int exponent) {
    final int size = Math.abs(exponent);
    final UnitScale positive =
        new UnitScale(numerator.pow(size), denominator.pow(size), dimension.power(size));
    return exponent < 0 ? positive.inverse() : positive;
  }

  /** A number in this unit, in SI, rounded to the nearest double; may overflow to infinity. */
  double toSi(BigDecimal number) {
    return number.multiply(numerator).divide(denominator, WORKING).doubleValue();
  }

  /** An SI number in this unit. */
  BigDecimal fromSi(double value) {
    return new BigDecimal(value).multiply(denominator).divide(numerator, WORKING);
  }
}
