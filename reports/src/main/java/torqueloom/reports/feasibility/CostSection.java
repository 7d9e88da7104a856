package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.List;
import torqueloom.model.constants.PhysicalConstants;
import torqueloom.model.energy.InferenceCost;
import torqueloom.reports.document.Block;
import torqueloom.reports.document.Cell;
import torqueloom.reports.document.Figure;
import torqueloom.reports.document.Paragraph;
import torqueloom.reports.document.Section;
import torqueloom.reports.document.Table;
import torqueloom.reports.document.Text;
import torqueloom.reports.figure.Axis;
import torqueloom.reports.figure.BarMark;
import torqueloom.reports.figure.Chart;
import torqueloom.reports.figure.Mark;
import torqueloom.reports.figure.Marker;
import torqueloom.reports.figure.Palette;
import torqueloom.reports.figure.Style;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.study.StudyResult;

/**
 * Energy and latency of one inference, beside digital arithmetic and the thermodynamic limit.
 *
 * <p>Digital figures: M. Horowitz, "Computing's energy problem (and what we can do about it)", IEEE
 * ISSCC Digest 10-14 (2014), doi:10.1109/ISSCC.2014.6757323, 45 nm at 0.9 V. The 32-bit ones were
 * checked against a published quotation of the table, the 8-bit ones are from memory. Limit: R.
 * Landauer, IBM J. Res. Dev. 5, 183 (1961), k_B T ln 2 for each erased bit.
 */
final class CostSection {
  /** Multiplication 0.2 pJ and addition 0.03 pJ of 8-bit integers (J). */
  static final double DIGITAL_8_BIT = 0.23e-12;

  /** Multiplication 3.7 pJ and addition 0.9 pJ of 32-bit floating-point numbers (J). */
  static final double DIGITAL_32_BIT = 4.6e-12;

  private static final double LN_2 = 0.6931471805599453;

  private CostSection() {}

  /**
   * One line of the table and one bar.
   *
   * @param name what it is
   * @param joules energy of one inference (J)
   * @param kind 0 a part, 1 the sum, 2 something to compare with
   */
  private record Item(String name, double joules, int kind) {}

  static Section of(StudyFacts facts) {
    final StudyResult result = facts.result();
    final InferenceCost cost = result.cost();
    final List<Item> items = items(facts);
    final List<Block> blocks = new ArrayList<>();
    blocks.add(Paragraph.of(summary(result)));
    blocks.add(
        new Figure(
            "cost-energy",
            picture(items),
            Text.of(
                    "Energy of one inference by part, on a logarithmic scale, beside the arithmetic"
                        + " of the same number of multiply-accumulates in digital logic (45 nm, 0.9"
                        + " V; arithmetic only, without fetching a weight from memory) and beside"
                        + " the thermodynamic limit ")
                .plus(Text.symbol("k_B"))
                .plus("T ln 2 for each count decision.")));
    blocks.add(table(items, cost));
    blocks.add(
        Paragraph.of(
            "Digital figures: M. Horowitz, IEEE ISSCC Digest of Technical Papers, 10–14 (2014),"
                + " doi:10.1109/ISSCC.2014.6757323; they were published for another technology and"
                + " another job and give a sense of scale, no ranking. Limit: R. Landauer, IBM J."
                + " Res. Dev. 5, 183 (1961). Left out here: leakage of the gates while they hold,"
                + " the input stage's amplifiers beyond the stated electronics, memory, clock and"
                + " everything off the chip."));
    return new Section("cost", "Energy and latency", blocks);
  }

  private static String summary(StudyResult result) {
    final InferenceCost cost = result.cost();
    final double share = cost.electronicsJoules() / cost.totalJoules();
    return "One inference takes "
        + Words.quantity(cost.latencySeconds(), "s")
        + " and "
        + Words.quantity(cost.totalJoules(), "J")
        + ", a supply power of "
        + Words.quantity(cost.supplyPowerWatts(), "W")
        + " while it runs. It applies "
        + Words.quantity(cost.multiplyAccumulates(), "1")
        + " weights, "
        + Words.quantity(cost.totalJoules() / cost.multiplyAccumulates(), "J")
        + " each, and sees "
        + Words.quantity(cost.countsPerInference(), "1")
        + " counts. The electronics around the devices take "
        + Words.percent(share)
        + " of the energy.";
  }

  private static List<Item> items(StudyFacts facts) {
    final InferenceCost cost = facts.result().cost();
    final double limit = PhysicalConstants.BOLTZMANN * facts.reference() * LN_2 * decisions(facts);
    return List.of(
        new Item("drive pulses", cost.driveJoules(), 0),
        new Item("readout junctions", cost.readJoules(), 0),
        new Item("synapse currents", cost.synapseJoules(), 0),
        new Item("gates", cost.gateJoules(), 0),
        new Item("electronics", cost.electronicsJoules(), 0),
        new Item("continuous bias", cost.staticJoules(), 0),
        new Item("whole inference", cost.totalJoules(), 1),
        new Item("digital, 8-bit integers", DIGITAL_8_BIT * cost.multiplyAccumulates(), 2),
        new Item("digital, 32-bit floating point", DIGITAL_32_BIT * cost.multiplyAccumulates(), 2),
        new Item("limit of the count decisions", limit, 2));
  }

  /** Count decisions of one inference: one for each device neuron and slot. */
  private static double decisions(StudyFacts facts) {
    final NetworkSettings network = facts.result().plan().network();
    double neurons = 0;
    for (final int size : network.hidden()) {
      neurons += size;
    }
    if (network.output() == NetworkSettings.Output.DEVICE) {
      neurons += facts.result().classes().size();
    }
    return neurons * network.slots();
  }

  private static Chart picture(List<Item> items) {
    final List<String> names = items.stream().map(Item::name).toList();
    final String[] colors = {Palette.series(0).color(), Palette.INK, Palette.series(1).color()};
    final String[] labels = {"parts", "sum", "for comparison"};
    final List<Mark> marks = new ArrayList<>();
    for (int kind = 0; kind < 3; kind++) {
      marks.add(bars(items, kind, labels[kind], new Style(colors[kind], "", Marker.NONE, 1, 1)));
    }
    final Axis energy = Axis.logarithmic("energy per inference", "J");
    final double most =
        items.stream().mapToDouble(Item::joules).filter(Double::isFinite).max().orElse(1);
    return Chart.of(
            "Energy of one inference",
            "Bars for each part, the sum and three comparisons, logarithmic.",
            most > 0 ? energy.between(Double.NaN, most * 30) : energy,
            Axis.categories("", names),
            marks)
        .withHeight(60 + 30 * items.size());
  }

  private static Mark bars(List<Item> items, int kind, String label, Style style) {
    final List<Integer> rows = new ArrayList<>();
    for (int i = 0; i < items.size(); i++) {
      if (items.get(i).kind() == kind) {
        rows.add(i);
      }
    }
    final double[] places = rows.stream().mapToDouble(i -> i).toArray();
    final double[] values =
        rows.stream()
            .mapToDouble(i -> items.get(i).joules())
            .map(v -> v > 0 ? v : Double.NaN)
            .toArray();
    final String[] numbers =
        rows.stream().map(i -> Words.quantity(items.get(i).joules(), "J")).toArray(String[]::new);
    return new BarMark(label, places, values, numbers, style);
  }

  private static Table table(List<Item> items, InferenceCost cost) {
    final List<List<Cell>> rows = new ArrayList<>();
    for (final Item item : items) {
      final double share = item.joules() / cost.totalJoules();
      final double each = item.joules() / cost.multiplyAccumulates();
      rows.add(
          List.of(
              Cell.of(item.name()),
              Cell.number(Words.quantity(item.joules(), "J"), item.joules()),
              item.kind() == 2 ? Cell.of("") : Cell.number(Words.percent(share), share),
              Cell.number(Words.quantity(each, "J"), each)));
    }
    return new Table(
        "cost-table",
        "Energy of one inference, mean over the test rows.",
        List.of(
            Table.Column.text("Part"),
            Table.Column.number("Energy", "J"),
            Table.Column.number("Share of the sum", "1"),
            Table.Column.number("Per weight applied", "J")),
        rows);
  }
}
