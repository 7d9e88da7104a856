package torqueloom.app.study;

import torqueloom.model.units.QuantityKind;
import torqueloom.model.units.QuantityParser;

/**
 * One end of a range, as the schema writes it: {@code > 0 nm} or {@code <= 1 um}.
 *
 * @param text the bound as written
 * @param below whether values must lie below it
 * @param included whether the bound itself is allowed
 * @param limit the bound (SI)
 */
record Bound(String text, boolean below, boolean included, double limit) {

  /**
   * Reads a bound.
   *
   * @param text comparison sign, space, quantity
   * @param kind what the quantity measures
   */
  static Bound of(String text, QuantityKind kind) {
    final int space = text.indexOf(' ');
    final String sign = text.substring(0, space);
    final double limit = QuantityParser.parse(text.substring(space + 1), kind);
    return new Bound(text, sign.startsWith("<"), sign.endsWith("="), limit);
  }

  /** Whether a value (SI) keeps the bound; NaN keeps none. */
  boolean allows(double value) {
    if (included && value == limit) {
      return true;
    }
    return below ? value < limit : value > limit;
  }

  /** The bound in words, e.g. {@code more than 0 nm}. */
  String words() {
    final String quantity = text.substring(text.indexOf(' ') + 1);
    if (below) {
      return (included ? "at most " : "less than ") + quantity;
    }
    return (included ? "at least " : "more than ") + quantity;
  }
}
