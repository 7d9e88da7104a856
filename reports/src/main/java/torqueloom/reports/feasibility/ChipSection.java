package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.List;
import torqueloom.reports.document.Block;
import torqueloom.reports.document.Cell;
import torqueloom.reports.document.Figure;
import torqueloom.reports.document.Paragraph;
import torqueloom.reports.document.Section;
import torqueloom.reports.document.Table;
import torqueloom.reports.document.Text;
import torqueloom.training.study.StudyResult;
import torqueloom.training.study.TemperatureOutcome;

/** What the drawn chips reach. */
final class ChipSection {
  private ChipSection() {}

  static Section of(StudyFacts facts) {
    final StudyResult result = facts.result();
    final ChipPictures pictures = new ChipPictures(facts);
    final List<Block> blocks = new ArrayList<>();
    blocks.add(
        Paragraph.of(
            "Every chip draws all its neurons and synapses from the tolerances; thermal noise is"
                + " drawn anew in every slot. A chip's accuracy is the mean over "
                + Words.count(result.plan().evaluation().noisePasses())
                + " thermal draws of the test rows. The same chips are used at every"
                + " temperature."));
    blocks.add(
        new Figure(
            "chips-accuracy",
            pictures.distribution(),
            Text.of(
                "Accuracy of every chip, by temperature. Boxes span the middle half of the chips"
                    + " with the median across, whiskers reach from the 5 % to the 95 %"
                    + " quantile.")));
    if (result.chips().size() > 1) {
      blocks.add(
          new Figure(
              "chips-temperature",
              pictures.accuracyAgainstTemperature(),
              Text.of(
                  "Accuracy against temperature: median chip with its interval, and the band that"
                      + " holds the middle 90 % of the chips.")));
    }
    blocks.add(
        new Figure(
            "chips-yield",
            pictures.yield(),
            Text.of(
                "Yield by temperature with both intervals: over chips on this test set, and with"
                    + " the test cases resampled too.")));
    blocks.add(table(result));
    return new Section("chips", "Chips", blocks);
  }

  private static Table table(StudyResult result) {
    final List<List<Cell>> rows = new ArrayList<>();
    for (final TemperatureOutcome outcome : result.chips()) {
      rows.add(
          List.of(
              Cell.number(Words.kelvin(outcome.temperatureKelvin()), outcome.temperatureKelvin()),
              share(outcome.median().estimate()),
              Cell.of(Words.range(outcome.median())),
              points(outcome.standardDeviation()),
              share(outcome.quantile05()),
              share(outcome.quantile95()),
              points(outcome.withinChipDeviation()),
              Cell.of(Words.share(outcome.wilson())),
              share(outcome.meanClippedShare())));
    }
    return new Table(
        "chips-table",
        "Chips in numbers. The Wilson interval holds because the number of chips was fixed"
            + " beforehand.",
        List.of(
            Table.Column.number("Temperature", "K"),
            Table.Column.number("Median", "1"),
            Table.Column.number("its interval", ""),
            Table.Column.number("Spread of chips (s.d.)", "1"),
            Table.Column.number("5 % quantile", "1"),
            Table.Column.number("95 % quantile", "1"),
            Table.Column.number("Noise within a chip (s.d.)", "1"),
            Table.Column.number("Yield (Wilson)", ""),
            Table.Column.number("Clipped pulses", "1")),
        rows);
  }

  private static Cell share(double value) {
    return Cell.number(Words.percent(value), value);
  }

  private static Cell points(double value) {
    return Cell.number(Words.points(value), value);
  }
}
