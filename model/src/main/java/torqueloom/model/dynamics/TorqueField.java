package torqueloom.model.dynamics;

/**
 * Spin torque of a drive with polarization p = +y, as fields.
 *
 * @param dampingLike B_DL (T); positive pulls the moment toward +y
 * @param fieldLike B_FL (T); acts as a field along y
 */
public record TorqueField(double dampingLike, double fieldLike) {
  /** No torque. */
  public static final TorqueField NONE = new TorqueField(0, 0);

  /** @throws IllegalArgumentException if a field is not finite */
  public TorqueField {
    if (!Double.isFinite(dampingLike) || !Double.isFinite(fieldLike)) {
      throw new IllegalArgumentException(
          "torque fields must be finite, got " + dampingLike + " and " + fieldLike + " T");
    }
  }

  double largest() {
    return Math.abs(dampingLike) + Math.abs(fieldLike);
  }
}
