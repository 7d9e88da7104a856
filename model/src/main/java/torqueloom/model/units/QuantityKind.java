package torqueloom.model.units;

import java.util.Optional;

/**
 * The kinds of quantities a study may state: what a text is checked against, how a message names
 * it, and in which unit people like to read it.
 */
public enum QuantityKind {
  /** A plain number or a percentage (1). */
  RATIO("plain number or percentage", "2 %", Dimension.NONE, ""),
  /** Length (m). */
  LENGTH("length", "1.3 nm", Dimension.LENGTH, "m"),
  /** Area (m²). */
  AREA("area", "0.01 um^2", Dimension.LENGTH.power(2), "um^2"),
  /** Volume (m³). */
  VOLUME("volume", "4e4 nm^3", Dimension.LENGTH.power(3), "nm^3"),
  /** Time (s). */
  TIME("time", "0.5 ns", Dimension.TIME, "s"),
  /** Frequency (Hz); an angular rate in rad/s is not taken for one. */
  FREQUENCY("frequency", "2 GHz", Dimension.TIME.power(-1), "Hz"),
  /** Angle (rad). */
  ANGLE("angle", "30 deg", Dimension.ANGLE, "deg"),
  /** Absolute temperature (K). */
  TEMPERATURE("temperature in kelvin", "300 K", Dimension.TEMPERATURE, "K"),
  /** Magnetic flux density (T); a field strength in A/m is taken times µ0. */
  FIELD("magnetic field", "4 mT", Dimension.FLUX_DENSITY, "T"),
  /** Magnetization (A/m). */
  MAGNETIZATION("magnetization", "0.8 MA/m", Dimension.MAGNETIZATION, "A/m"),
  /** Energy per area (J/m²). */
  SURFACE_ENERGY(
      "energy per area", "1.379 mJ/m^2", Dimension.ENERGY.over(Dimension.LENGTH.power(2)), "J/m^2"),
  /** Energy per volume (J/m³). */
  ENERGY_DENSITY(
      "energy per volume", "5 kJ/m^3", Dimension.ENERGY.over(Dimension.LENGTH.power(3)), "J/m^3"),
  /** Exchange stiffness, energy per length (J/m). */
  EXCHANGE("exchange stiffness", "12 pJ/m", Dimension.ENERGY.over(Dimension.LENGTH), "J/m"),
  /** Gyromagnetic ratio (rad/(s T)). */
  GYROMAGNETIC_RATIO(
      "gyromagnetic ratio",
      "1.76e11 rad/(s T)",
      Dimension.ANGLE.over(Dimension.TIME).over(Dimension.FLUX_DENSITY),
      "rad/(s T)"),
  /** Electric current (A). */
  CURRENT("current", "10 uA", Dimension.CURRENT, "A"),
  /** Current density (A/m²). */
  CURRENT_DENSITY(
      "current density", "9e10 A/m^2", Dimension.CURRENT.over(Dimension.LENGTH.power(2)), "A/m^2"),
  /** Voltage (V). */
  VOLTAGE("voltage", "0.8 V", Dimension.VOLTAGE, "V"),
  /** Electric field (V/m). */
  ELECTRIC_FIELD("electric field", "1 V/nm", Dimension.VOLTAGE.over(Dimension.LENGTH), "V/nm"),
  /** Change of interface anisotropy per electric field, energy per voltage and length (J/(V m)). */
  VOLTAGE_COEFFICIENT(
      "voltage coefficient of anisotropy",
      "60 fJ/(V m)",
      Dimension.ENERGY.over(Dimension.VOLTAGE).over(Dimension.LENGTH),
      "J/(V m)"),
  /** Resistance (Ω). */
  RESISTANCE("resistance", "500 ohm", Dimension.RESISTANCE, "ohm"),
  /** Conductance (S). */
  CONDUCTANCE("conductance", "200 uS", Dimension.RESISTANCE.power(-1), "S"),
  /** Resistivity (Ω m). */
  RESISTIVITY(
      "resistivity", "150 uohm cm", Dimension.RESISTANCE.times(Dimension.LENGTH), "uohm cm"),
  /** Resistance-area product (Ω m²). */
  RESISTANCE_AREA(
      "resistance-area product",
      "100 ohm um^2",
      Dimension.RESISTANCE.times(Dimension.LENGTH.power(2)),
      "ohm um^2"),
  /** Capacitance (F). */
  CAPACITANCE("capacitance", "5 fF", Dimension.CHARGE.over(Dimension.VOLTAGE), "F"),
  /** Inductance (H). */
  INDUCTANCE("inductance", "10 pH", Dimension.FLUX.over(Dimension.CURRENT), "H"),
  /** Magnetic flux (Wb). */
  MAGNETIC_FLUX("magnetic flux", "2.07 fWb", Dimension.FLUX, "Wb"),
  /** Charge (C). */
  CHARGE("charge", "2 fC", Dimension.CHARGE, "C"),
  /** Energy (J). */
  ENERGY("energy", "1 pJ", Dimension.ENERGY, "J"),
  /** Power (W). */
  POWER("power", "20 uW", Dimension.POWER, "W"),
  /** Temperature rise per power (K/W). */
  THERMAL_RESISTANCE(
      "thermal resistance", "3.2e6 K/W", Dimension.TEMPERATURE.over(Dimension.POWER), "K/W");

  private final String plainName;
  private final String example;
  private final Dimension dimension;
  private final String displayUnit;

  QuantityKind(String plainName, String example, Dimension dimension, String displayUnit) {
    this.plainName = plainName;
    this.example = example;
    this.dimension = dimension;
    this.displayUnit = displayUnit;
  }

  /** The name in plain words, lower case, without article, such as {@code energy per area}. */
  public String plainName() {
    return plainName;
  }

  /** A text of this kind that is understood, such as {@code 1.3 nm}. */
  public String example() {
    return example;
  }

  /** The dimension a text must have. */
  public Dimension dimension() {
    return dimension;
  }

  /** The unit in which the kind is shown; {@link QuantityFormat} may put a prefix before it. */
  public String displayUnit() {
    return displayUnit;
  }

  /** The name with its article, such as {@code an energy per area}. */
  public String withArticle() {
    return ("aeio".indexOf(plainName.charAt(0)) >= 0 ? "an " : "a ") + plainName;
  }

  /** The first kind of this dimension, for messages. */
  static Optional<QuantityKind> of(Dimension dimension) {
    for (final QuantityKind kind : values()) {
      if (kind.dimension.equals(dimension)) {
        return Optional.of(kind);
      }
    }
    return Optional.empty();
  }
}
