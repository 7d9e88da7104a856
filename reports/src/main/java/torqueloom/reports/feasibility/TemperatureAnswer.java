package torqueloom.reports.feasibility;

import torqueloom.training.study.Interval;
import torqueloom.training.study.Targets;
import torqueloom.training.study.TemperatureOutcome;
import torqueloom.training.study.Verdict;

/**
 * The answer at one temperature.
 *
 * @param outcome what the chips gave
 * @param kind on which side of the target both intervals lie
 */
record TemperatureAnswer(TemperatureOutcome outcome, Verdict.Kind kind) {
  static TemperatureAnswer of(TemperatureOutcome outcome, Targets targets) {
    final double target = targets.yield();
    final Interval here = outcome.yield();
    final Interval anew = outcome.yieldOnNewCases();
    if (here.low() > target && anew.low() > target) {
      return new TemperatureAnswer(outcome, Verdict.Kind.MET);
    }
    return new TemperatureAnswer(
        outcome,
        here.high() < target && anew.high() < target
            ? Verdict.Kind.NOT_MET
            : Verdict.Kind.UNDECIDED);
  }

  /** The answer in a word or two. */
  String word() {
    return word(kind);
  }

  /** An answer in a word or two. */
  static String word(Verdict.Kind kind) {
    return switch (kind) {
      case MET -> "met";
      case NOT_MET -> "not met";
      case UNDECIDED -> "undecided";
    };
  }
}
