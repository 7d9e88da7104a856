package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.List;
import torqueloom.model.device.DerivedQuantity;
import torqueloom.model.device.DeviceSummary;
import torqueloom.model.device.DeviceWarning;
import torqueloom.reports.document.Block;
import torqueloom.reports.document.Callout;
import torqueloom.reports.document.Cell;
import torqueloom.reports.document.Paragraph;
import torqueloom.reports.document.Section;
import torqueloom.reports.document.Table;
import torqueloom.reports.document.Text;

/** The proposed device and its electrical chain; the synapse in the same form. */
final class DeviceSection {
  /** Longer texts are set as sentences below the table (characters). */
  private static final int LONGEST_VALUE = 24;

  private DeviceSection() {}

  static Section device(StudyFacts facts) {
    final DeviceSummary device = facts.result().device();
    final List<Block> blocks = new ArrayList<>();
    blocks.add(
        Paragraph.of(
            "Derived quantities of the nominal device ("
                + device.kind().replace('-', ' ')
                + ") at "
                + Words.kelvin(device.temperatureKelvin())
                + "."));
    blocks.addAll(warnings(device.warnings()));
    blocks.addAll(quantities("device-table", "Magnetic quantities.", device.device()));
    if (!device.electrical().isEmpty()) {
      blocks.add(
          new Section(
              "electrical",
              "Electrical chain",
              quantities("electrical-table", "Drive, readout and heating.", device.electrical())));
    }
    return new Section("device", "Device", blocks);
  }

  static Section synapse(StudyFacts facts) {
    final List<Block> blocks = new ArrayList<>(warnings(facts.result().synapse().warnings()));
    final List<DerivedQuantity> quantities = facts.result().synapse().quantities();
    if (quantities.isEmpty()) {
      blocks.add(Paragraph.of("Weights are taken as exact numbers; no synapse device is modeled."));
    } else {
      blocks.addAll(quantities("synapse-table", "Derived quantities of the synapse.", quantities));
    }
    return new Section("synapse", "Synapses", blocks);
  }

  private static List<Block> warnings(List<DeviceWarning> warnings) {
    final List<Block> out = new ArrayList<>();
    for (final DeviceWarning warning : warnings) {
      final String title = warning.code().replace('-', ' ');
      out.add(
          new Callout(
              Callout.Tone.CAUTION,
              title.isEmpty()
                  ? "Warning"
                  : Character.toUpperCase(title.charAt(0)) + title.substring(1),
              List.of(Paragraph.of(Words.pretty(warning.text())))));
    }
    return out;
  }

  /** A table, and below it what is a sentence rather than a value. */
  private static List<Block> quantities(
      String id, String caption, List<DerivedQuantity> quantities) {
    final List<Block> out = new ArrayList<>();
    out.add(table(id, caption, quantities.stream().filter(q -> !isSentence(q)).toList()));
    for (final DerivedQuantity quantity : quantities) {
      if (isSentence(quantity)) {
        out.add(Paragraph.of(sentence(quantity)));
      }
    }
    return out;
  }

  private static boolean isSentence(DerivedQuantity quantity) {
    return quantity.value() instanceof String text && text.length() > LONGEST_VALUE;
  }

  private static String sentence(DerivedQuantity quantity) {
    final String label = quantity.label();
    return Character.toUpperCase(label.charAt(0))
        + label.substring(1)
        + ": "
        + quantity.value()
        + ".";
  }

  private static Table table(String id, String caption, List<DerivedQuantity> quantities) {
    final List<List<Cell>> rows = new ArrayList<>();
    for (final DerivedQuantity quantity : quantities) {
      final String shown = Words.value(quantity.value(), quantity.unit());
      rows.add(
          List.of(
              Cell.of(Text.withSymbols(Words.pretty(quantity.label()))),
              Cell.of(Words.symbol(quantity.symbol())),
              quantity.value() instanceof Number number
                  ? Cell.number(shown, number)
                  : Cell.of(shown),
              Cell.of(quantity.value() instanceof String ? "" : quantity.unit())));
    }
    return new Table(
        id,
        caption,
        List.of(
            Table.Column.text("Quantity"),
            Table.Column.text("Symbol"),
            Table.Column.number("Value", ""),
            Table.Column.hidden("SI unit")),
        rows);
  }
}
