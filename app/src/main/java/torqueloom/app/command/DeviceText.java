package torqueloom.app.command;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import torqueloom.model.device.DerivedQuantity;
import torqueloom.model.device.DeviceSummary;
import torqueloom.model.device.DeviceWarning;
import torqueloom.model.units.QuantityFormat;
import torqueloom.model.units.QuantityKind;

/** A device's summary as text for people. */
final class DeviceText {
  private static final int LINE = 96;

  private static final Map<String, QuantityKind> KINDS =
      Map.ofEntries(
          Map.entry("T", QuantityKind.FIELD),
          Map.entry("A/m^2", QuantityKind.CURRENT_DENSITY),
          Map.entry("A/m", QuantityKind.MAGNETIZATION),
          Map.entry("m", QuantityKind.LENGTH),
          Map.entry("m^2", QuantityKind.AREA),
          Map.entry("m^3", QuantityKind.VOLUME),
          Map.entry("s", QuantityKind.TIME),
          Map.entry("Hz", QuantityKind.FREQUENCY),
          Map.entry("K", QuantityKind.TEMPERATURE),
          Map.entry("rad", QuantityKind.ANGLE),
          Map.entry("J", QuantityKind.ENERGY),
          Map.entry("J/m^2", QuantityKind.SURFACE_ENERGY),
          Map.entry("W", QuantityKind.POWER),
          Map.entry("V", QuantityKind.VOLTAGE),
          Map.entry("V/m", QuantityKind.ELECTRIC_FIELD),
          Map.entry("A", QuantityKind.CURRENT),
          Map.entry("ohm", QuantityKind.RESISTANCE),
          Map.entry("S", QuantityKind.CONDUCTANCE),
          Map.entry("F", QuantityKind.CAPACITANCE),
          Map.entry("1", QuantityKind.RATIO));

  private DeviceText() {}

  static String of(String name, DeviceSummary summary) {
    final StringBuilder text = new StringBuilder();
    text.append(name).append('\n');
    text.append(summary.kind()).append(" at ");
    text.append(QuantityFormat.text(summary.temperatureKelvin(), QuantityKind.TEMPERATURE));
    text.append('\n');
    table(text, "Device", summary.device());
    table(text, "Electrical chain", summary.electrical());
    warnings(text, summary.warnings());
    return text.toString();
  }

  static void table(StringBuilder text, String title, List<DerivedQuantity> quantities) {
    if (quantities.isEmpty()) {
      return;
    }
    text.append('\n').append(title).append('\n');
    final int width = quantities.stream().mapToInt(q -> label(q).length()).max().orElse(0);
    for (final DerivedQuantity quantity : quantities) {
      final String label = label(quantity);
      text.append("  ").append(label).append(" ".repeat(width + 2 - label.length()));
      text.append(value(quantity)).append('\n');
    }
  }

  static void warnings(StringBuilder text, List<DeviceWarning> warnings) {
    text.append('\n').append(warnings.isEmpty() ? "No warnings." : "Warnings").append('\n');
    for (final DeviceWarning warning : warnings) {
      text.append("  ").append(warning.code()).append('\n');
      text.append(wrapped(warning.text(), "    "));
    }
  }

  private static String label(DerivedQuantity quantity) {
    return quantity.symbol().isEmpty()
        ? quantity.label()
        : quantity.label() + " (" + quantity.symbol() + ")";
  }

  /** A value with its unit, three digits. */
  static String value(DerivedQuantity quantity) {
    if (quantity.value() instanceof double[] many) {
      return Arrays.stream(many)
          .mapToObj(each -> number(each, quantity.unit()))
          .collect(Collectors.joining(", ", "[", "]"));
    }
    if (quantity.value() instanceof Number number) {
      return number(number.doubleValue(), quantity.unit());
    }
    return String.valueOf(quantity.value());
  }

  private static String number(double value, String unit) {
    final QuantityKind kind = KINDS.get(unit);
    if (kind != null) {
      return QuantityFormat.text(value, kind);
    }
    final String number = QuantityFormat.text(value, QuantityKind.RATIO);
    return unit.isEmpty() ? number : number + " " + unit;
  }

  /** Text broken at blanks, each line indented. */
  static String wrapped(String text, String indent) {
    final StringBuilder lines = new StringBuilder();
    StringBuilder line = new StringBuilder(indent);
    for (final String word : text.split("\\s+")) {
      if (line.length() > indent.length() && line.length() + 1 + word.length() > LINE) {
        lines.append(line).append('\n');
        line = new StringBuilder(indent);
      }
      line.append(line.length() > indent.length() ? " " : "").append(word);
    }
    return lines.append(line).append('\n').toString();
  }
}
