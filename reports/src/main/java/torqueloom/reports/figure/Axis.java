package torqueloom.reports.figure;

import java.util.List;
import java.util.Objects;

/**
 * One axis of a chart. Values are given in the axis's own unit: the caller divides by the unit before
 * drawing.
 *
 * @param label what is measured
 * @param unit unit as shown, empty for a pure number
 * @param kind how values map to places
 * @param low fixed lower end, NaN to follow the data
 * @param high fixed upper end, NaN to follow the data
 * @param categories names at 0, 1, 2 ... for {@link Kind#CATEGORY}, else empty
 */
public record Axis(
    String label, String unit, Kind kind, double low, double high, List<String> categories) {
  /** How values map to places. */
  public enum Kind {
    /** Equal steps, equal lengths. */
    LINEAR,
    /** Equal factors, equal lengths; values must be positive. */
    LOGARITHMIC,
    /** Names at whole numbers. */
    CATEGORY
  }

  /** Copies the list. */
  public Axis {
    Objects.requireNonNull(label, "label");
    Objects.requireNonNull(unit, "unit");
    Objects.requireNonNull(kind, "kind");
    categories = List.copyOf(categories);
  }

  /** A linear axis that follows the data. */
  public static Axis linear(String label, String unit) {
    return new Axis(label, unit, Kind.LINEAR, Double.NaN, Double.NaN, List.of());
  }

  /** A logarithmic axis that follows the data. */
  public static Axis logarithmic(String label, String unit) {
    return new Axis(label, unit, Kind.LOGARITHMIC, Double.NaN, Double.NaN, List.of());
  }

  /** An axis of names. */
  public static Axis categories(String label, List<String> names) {
    return new Axis(label, "", Kind.CATEGORY, -0.5, Math.max(1, names.size()) - 0.5, names);
  }

  /** The same axis with fixed ends; NaN lets an end follow the data. */
  public Axis between(double newLow, double newHigh) {
    return new Axis(label, unit, kind, newLow, newHigh, categories);
  }

  /** Label with the unit in parentheses. */
  String caption() {
    return unit.isEmpty() ? label : label + " (" + unit + ")";
  }

  /** A value in words, for tooltips: "drive 6.7 mT". */
  String describe(double value) {
    if (kind == Kind.CATEGORY) {
      final int index = (int) Math.rint(value);
      return index >= 0 && index < categories.size() ? categories.get(index) : label;
    }
    return label + " " + amount(value);
  }

  /** A value with its unit. */
  String amount(double value) {
    final String number = Numbers.significant(value, 4);
    return unit.isEmpty() ? number : unit.equals("%") ? number + " %" : number + " " + unit;
  }
}
