package torqueloom.model.device;

/** Range checks of the records' constructors; messages start with the field's study-file key. */
final class Require {
  private Require() {}

  static void positive(String key, double value, String unit) {
    if (!(value > 0 && Double.isFinite(value))) {
      throw new IllegalArgumentException(
          key + " must be positive and finite, got " + value + " " + unit);
    }
  }

  static void notNegative(String key, double value, String unit) {
    if (!(value >= 0 && Double.isFinite(value))) {
      throw new IllegalArgumentException(
          key + " must be zero or positive and finite, got " + value + " " + unit);
    }
  }

  static void finite(String key, double value, String unit) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(key + " must be finite, got " + value + " " + unit);
    }
  }

  /** Value in (low, high]. */
  static void above(String key, double value, double low, double high, String unit) {
    if (!(value > low && value <= high)) {
      throw new IllegalArgumentException(
          key + " must be above " + low + " and at most " + high + ", got " + value + " " + unit);
    }
  }

  static <T> T present(String key, T value) {
    if (value == null) {
      throw new IllegalArgumentException(key + " is missing");
    }
    return value;
  }
}
