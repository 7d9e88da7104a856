package torqueloom.model.units;

import java.util.Objects;

/**
 * A number with its dimension.
 *
 * @param value in SI units, radians for angles; finite
 * @param dimension what the number measures
 */
public record Quantity(double value, Dimension dimension) {

  /**
   * @throws IllegalArgumentException if the value is NaN or infinite
   */
  public Quantity {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("a quantity must be finite, got " + value);
    }
    Objects.requireNonNull(dimension, "dimension");
  }

  @Override
  public String toString() {
    return value + " " + dimension;
  }
}
