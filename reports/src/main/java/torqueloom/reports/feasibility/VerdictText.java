package torqueloom.reports.feasibility;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import torqueloom.training.study.StudyResult;
import torqueloom.training.study.Targets;
import torqueloom.training.study.TemperatureOutcome;
import torqueloom.training.study.Verdict;

/** The verdict in words. */
public final class VerdictText {
  private VerdictText() {}

  /**
   * Three lines for a terminal: the answer, its numbers, and why or what would decide. Rare signs
   * are written plainly, since a terminal may lack them.
   */
  public static List<String> lines(StudyResult result) {
    final StudyFacts facts = new StudyFacts(result);
    return Stream.of(headline(result) + ": " + claim(facts), numbers(facts), reason(facts))
        .map(line -> line.replace("\u202F", "").replace('−', '-'))
        .toList();
  }

  /** Why; for an open question what would decide it. */
  private static String reason(StudyFacts facts) {
    return facts.advice().isEmpty() ? Diagnosis.causes(facts).get(0) : facts.advice().get(0);
  }

  /** The answer in three words or fewer. */
  public static String headline(StudyResult result) {
    return switch (result.verdict().kind()) {
      case MET -> "Targets met";
      case NOT_MET -> "Targets not met";
      case UNDECIDED -> "Undecided";
    };
  }

  /** What was asked and how it was answered, as the rest of a sentence. */
  static String claim(StudyFacts facts) {
    final String asked = asked(facts.targets());
    return switch (facts.result().verdict().kind()) {
      case MET -> "at every temperature " + asked + ", at " + confidence(facts) + " confidence.";
      case NOT_MET ->
          "the study asks that "
              + asked
              + "; at "
              + confidence(facts)
              + " confidence this fails at "
              + Words.list(failed(facts))
              + ".";
      case UNDECIDED ->
          "whether "
              + asked
              + " is not decided at "
              + confidence(facts)
              + " confidence at "
              + Words.list(facts.temperatures(Verdict.Kind.UNDECIDED))
              + ".";
    };
  }

  private static List<String> failed(StudyFacts facts) {
    final List<String> failed = facts.temperatures(Verdict.Kind.NOT_MET);
    return failed.isEmpty() ? List.of("some temperature") : failed;
  }

  private static String asked(Targets targets) {
    return "at least "
        + Words.round(targets.yield())
        + " of the chips reach an accuracy of "
        + Words.round(targets.accuracy());
  }

  private static String confidence(StudyFacts facts) {
    return Words.round(facts.targets().confidence());
  }

  private static String numbers(StudyFacts facts) {
    final StudyResult result = facts.result();
    final Optional<TemperatureOutcome> worst = facts.worst();
    final String references =
        "ideal network "
            + Words.percent(result.ideal())
            + ", logistic regression "
            + Words.percent(result.baseline())
            + ".";
    if (worst.isEmpty()) {
      return "No chips were evaluated; " + references;
    }
    final TemperatureOutcome outcome = worst.get();
    return (result.chips().size() > 1 ? "Lowest yield, at " : "Yield at ")
        + Words.kelvin(outcome.temperatureKelvin())
        + ": "
        + Words.share(outcome.yield())
        + " on this test set, "
        + Words.share(outcome.yieldOnNewCases())
        + " on new cases; "
        + Words.count(outcome.accuracies().length)
        + " chips, median accuracy "
        + Words.percent(outcome.median().estimate())
        + "; "
        + references;
  }
}
