package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import torqueloom.model.tolerance.Spread;
import torqueloom.reports.document.Block;
import torqueloom.reports.document.Callout;
import torqueloom.reports.document.Cell;
import torqueloom.reports.document.Paragraph;
import torqueloom.reports.document.Section;
import torqueloom.reports.document.Table;
import torqueloom.training.study.ToleranceEffect;
import torqueloom.training.study.TrimComparison;

/** What the tolerances cost and what trim buys. */
final class ToleranceSection {
  private ToleranceSection() {}

  static Section of(StudyFacts facts) {
    final List<Block> blocks = new ArrayList<>();
    final ToleranceEffect effect = facts.result().toleranceEffect();
    blocks.add(
        Paragraph.of(
            "The same "
                + Words.count(effect.chips())
                + " chips at "
                + Words.kelvin(facts.reference())
                + ", once with all tolerances of neurons and synapses set to zero and "
                + "once as stated (paired draws): the median accuracy is "
                + Words.percent(effect.medianAtZero())
                + " and "
                + Words.percent(effect.medianAtStated())
                + "; the median of the paired loss is "
                + Words.points(effect.loss())
                + "."));
    blocks.add(spreads(facts.result().plan().tolerances().spreads()));
    blocks.add(new Section("trim", "Trim", trim(facts)));
    return new Section("tolerances", "Tolerances and trim", blocks);
  }

  private static List<Block> trim(StudyFacts facts) {
    final TrimComparison trim = facts.result().trim();
    final List<Block> blocks = new ArrayList<>();
    final Paragraph words = Paragraph.of(TrimWords.sentence(facts.result()));
    blocks.add(
        trim.assumed()
            ? new Callout(Callout.Tone.NOTE, "Assumed, not part of the study", List.of(words))
            : words);
    if (trim.chips() > 0) {
      blocks.add(comparison(trim));
    }
    blocks.add(
        Paragraph.of(
            "What is trimmed is the imbalance D = B_z − B_x of each neuron, through its own gate."
                + " Here the level nearest to the right one is always found and every gate reaches"
                + " it: a real trim measures with noise, drifts, and needs its gate voltage within"
                + " the breakdown field."));
    return blocks;
  }

  private static Table comparison(TrimComparison trim) {
    final String without = trim.assumed() ? "as proposed, no trim" : "without trim";
    final String with = trim.assumed() ? "with the assumed trim" : "as proposed, with trim";
    return new Table(
        "trim-table",
        "The same " + Words.count(trim.chips()) + " chips with and without trim.",
        List.of(
            Table.Column.text("Chips"),
            Table.Column.number("Median accuracy", "1"),
            Table.Column.number("Yield", "1"),
            Table.Column.number("its interval", ""),
            Table.Column.number("Neurons resting out of the film", "1")),
        List.of(
            row(without, trim.medianWithout(), trim.yieldWithout(), trim.outOfFilmWithout()),
            row(with, trim.medianWith(), trim.yieldWith(), trim.outOfFilmWith())));
  }

  private static List<Cell> row(
      String name, double median, torqueloom.training.study.Interval yield, double outOfFilm) {
    return List.of(
        Cell.of(name),
        Cell.number(Words.percent(median), median),
        Cell.number(Words.percent(yield.estimate()), yield.estimate()),
        Cell.of(Words.range(yield)),
        Cell.number(Words.percent(outOfFilm), outOfFilm));
  }

  private static Block spreads(Map<String, Spread> spreads) {
    if (spreads.isEmpty()) {
      return Paragraph.of("The study states no device tolerances.");
    }
    final List<List<Cell>> rows = new ArrayList<>();
    for (final Map.Entry<String, Spread> entry : spreads.entrySet()) {
      rows.add(
          List.of(
              Cell.of(entry.getKey().replace('-', ' ')),
              Cell.number(Words.round(entry.getValue().chip()), entry.getValue().chip()),
              Cell.number(Words.round(entry.getValue().device()), entry.getValue().device())));
    }
    return new Table(
        "tolerance-table",
        "Device tolerances as stated: one standard deviation, of the nominal value.",
        List.of(
            Table.Column.text("Parameter"),
            Table.Column.number("From chip to chip", "1"),
            Table.Column.number("From device to device", "1")),
        rows);
  }
}
