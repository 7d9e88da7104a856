package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.List;
import torqueloom.reports.document.Block;
import torqueloom.reports.document.Bullets;
import torqueloom.reports.document.Callout;
import torqueloom.reports.document.Cell;
import torqueloom.reports.document.Paragraph;
import torqueloom.reports.document.Section;
import torqueloom.reports.document.Table;
import torqueloom.reports.document.Text;
import torqueloom.reports.document.Tiles;
import torqueloom.training.study.StudyResult;
import torqueloom.training.study.TemperatureOutcome;
import torqueloom.training.study.Verdict;

/** What stands at the top: the verdict, why, and the numbers it rests on. */
final class AnswerLead {
  private AnswerLead() {}

  static List<Block> of(StudyFacts facts) {
    return List.of(verdict(facts), tiles(facts));
  }

  private static Block verdict(StudyFacts facts) {
    final StudyResult result = facts.result();
    final List<Block> blocks = new ArrayList<>();
    final String claim = VerdictText.claim(facts);
    blocks.add(Paragraph.of(Character.toUpperCase(claim.charAt(0)) + claim.substring(1)));
    blocks.add(new Paragraph(Text.EMPTY.strong("Why")));
    blocks.add(Bullets.of(Diagnosis.causes(facts)));
    if (result.verdict().kind() != Verdict.Kind.MET) {
      blocks.add(new Paragraph(Text.EMPTY.strong("What would change it")));
      final List<String> changes = new ArrayList<>(facts.advice());
      changes.add(TrimWords.sentence(result));
      blocks.add(Bullets.of(changes));
    }
    SlotMemory.caution(result).ifPresent(caution -> blocks.add(Paragraph.of(caution)));
    return new Callout(tone(result.verdict().kind()), VerdictText.headline(result), blocks);
  }

  private static Callout.Tone tone(Verdict.Kind kind) {
    return switch (kind) {
      case MET -> Callout.Tone.MET;
      case NOT_MET -> Callout.Tone.NOT_MET;
      case UNDECIDED -> Callout.Tone.UNDECIDED;
    };
  }

  private static Block tiles(StudyFacts facts) {
    final StudyResult result = facts.result();
    final List<Tiles.Tile> tiles = new ArrayList<>();
    facts.worst().ifPresent(worst -> tiles.addAll(chips(worst, facts)));
    tiles.add(
        new Tiles.Tile(
            "Ideal network", Words.percent(result.ideal()), "the same network on nominal devices"));
    tiles.add(
        new Tiles.Tile(
            "Logistic regression",
            Words.percent(result.baseline()),
            "the simplest rival, same rows"));
    tiles.add(
        new Tiles.Tile(
            "Energy per inference",
            Words.quantity(result.cost().totalJoules(), "J"),
            "mean over the test rows"));
    tiles.add(
        new Tiles.Tile(
            "Latency",
            Words.quantity(result.cost().latencySeconds(), "s"),
            "first pulse to answer"));
    return new Tiles(tiles);
  }

  private static List<Tiles.Tile> chips(TemperatureOutcome worst, StudyFacts facts) {
    final String at = " at " + Words.kelvin(worst.temperatureKelvin());
    return List.of(
        new Tiles.Tile(
            "Yield" + at,
            Words.percent(worst.yield().estimate()),
            Words.range(worst.yield()) + "; target " + Words.round(facts.targets().yield())),
        new Tiles.Tile(
            "Median chip" + at,
            Words.percent(worst.median().estimate()),
            Words.range(worst.median()) + "; target " + Words.round(facts.targets().accuracy())));
  }

  /** The section that follows the verdict: every temperature with both intervals. */
  static Section section(StudyFacts facts) {
    final List<Block> blocks = new ArrayList<>();
    blocks.add(
        Paragraph.of(
            "Yield is the share of chips whose accuracy reaches "
                + Words.round(facts.targets().accuracy())
                + ". The first interval is over chips and speaks of this test set only; it holds at"
                + " any number of chips (beta-binomial mixture, Robbins 1970). The second one asks"
                + " about new cases too: chips and test cases are resampled independently"
                + " (pigeonhole bootstrap, Owen 2007). The target is met where both intervals lie"
                + " above it at every temperature, and not met where both lie below it at some"
                + " one."));
    blocks.add(table(facts));
    if (!facts.advice().isEmpty()) {
      blocks.add(Paragraph.of("What would decide:"));
      blocks.add(Bullets.of(facts.advice()));
    }
    return new Section("answer", "The answer at each temperature", blocks);
  }

  private static Table table(StudyFacts facts) {
    final List<Table.Column> columns =
        List.of(
            Table.Column.number("Temperature", "K"),
            Table.Column.number("Chips", ""),
            Table.Column.number("Median accuracy", "1"),
            Table.Column.number("Yield, this test set", "1"),
            Table.Column.number("its interval", ""),
            Table.Column.number("on new cases", ""),
            Table.Column.text("Answer"));
    final List<List<Cell>> rows = new ArrayList<>();
    for (final TemperatureAnswer answer : facts.answers()) {
      final TemperatureOutcome outcome = answer.outcome();
      rows.add(
          List.of(
              Cell.number(Words.kelvin(outcome.temperatureKelvin()), outcome.temperatureKelvin()),
              Cell.number(Words.count(outcome.accuracies().length), outcome.accuracies().length),
              Cell.number(Words.percent(outcome.median().estimate()), outcome.median().estimate()),
              Cell.number(Words.percent(outcome.yield().estimate()), outcome.yield().estimate()),
              Cell.of(Words.range(outcome.yield())),
              Cell.of(Words.range(outcome.yieldOnNewCases())),
              Cell.of(answer.word())));
    }
    return new Table(
        "answer-table",
        "Yield with both "
            + Words.round(facts.targets().confidence())
            + " intervals; the target is "
            + Words.round(facts.targets().yield())
            + ".",
        columns,
        rows);
  }
}
