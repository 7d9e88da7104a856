package torqueloom.model.units;

/**
 * Exponents of the SI base units that devices need, with the plane angle kept apart so that a
 * percentage is no angle and rad/s is no hertz. Amount of substance and luminous intensity are left
 * out.
 *
 * @param length exponent of the meter
 * @param mass exponent of the kilogram
 * @param time exponent of the second
 * @param current exponent of the ampere
 * @param temperature exponent of the kelvin
 * @param angle exponent of the radian
 */
public record Dimension(int length, int mass, int time, int current, int temperature, int angle) {

  /** The dimension of a plain number. */
  public static final Dimension NONE = new Dimension(0, 0, 0, 0, 0, 0);

  static final Dimension LENGTH = new Dimension(1, 0, 0, 0, 0, 0);
  static final Dimension MASS = new Dimension(0, 1, 0, 0, 0, 0);
  static final Dimension TIME = new Dimension(0, 0, 1, 0, 0, 0);
  static final Dimension CURRENT = new Dimension(0, 0, 0, 1, 0, 0);
  static final Dimension TEMPERATURE = new Dimension(0, 0, 0, 0, 1, 0);
  static final Dimension ANGLE = new Dimension(0, 0, 0, 0, 0, 1);
  static final Dimension ENERGY = new Dimension(2, 1, -2, 0, 0, 0);
  static final Dimension POWER = ENERGY.over(TIME);
  static final Dimension CHARGE = CURRENT.times(TIME);
  static final Dimension VOLTAGE = POWER.over(CURRENT);
  static final Dimension RESISTANCE = VOLTAGE.over(CURRENT);
  static final Dimension FLUX = VOLTAGE.times(TIME);
  static final Dimension FLUX_DENSITY = FLUX.over(LENGTH.power(2));
  static final Dimension MAGNETIZATION = CURRENT.over(LENGTH);

  /** The dimension of a product. */
  public Dimension times(Dimension other) {
    return new Dimension(
        length + other.length,
        mass + other.mass,
        time + other.time,
        current + other.current,
        temperature + other.temperature,
        angle + other.angle);
  }

  /** The dimension of a quotient. */
  public Dimension over(Dimension other) {
    return times(other.power(-1));
  }

  /** The dimension of an integer power. */
  public Dimension power(int exponent) {
    return new Dimension(
        length * exponent,
        mass * exponent,
        time * exponent,
        current * exponent,
        temperature * exponent,
        angle * exponent);
  }

  /** The SI base units, such as {@code kg s^-2 A^-1}; {@code 1} for a plain number. */
  @Override
  public String toString() {
    final StringBuilder text = new StringBuilder();
    append(text, "m", length);
    append(text, "kg", mass);
    append(text, "s", time);
    append(text, "A", current);
    append(text, "K", temperature);
    append(text, "rad", angle);
    return text.length() == 0 ? "1" : text.toString();
  }

  private static void append(StringBuilder text, String symbol, int exponent) {
    if (exponent == 0) {
      return;
    }
    if (text.length() > 0) {
      text.append(' ');
    }
    text.append(symbol);
    if (exponent != 1) {
      text.append('^').append(exponent);
    }
  }
}
