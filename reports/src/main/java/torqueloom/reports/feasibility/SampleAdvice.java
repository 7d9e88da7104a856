package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.List;
import torqueloom.training.study.Interval;
import torqueloom.training.study.TemperatureOutcome;
import torqueloom.training.study.Verdict;

/**
 * What would decide an open study. Interval widths shrink about as one over the square root of the
 * sample, so the sample that moves the nearer end to the target is about n (width/gap)²: an estimate
 * of the order of magnitude, good while the estimate itself stays where it is.
 */
final class SampleAdvice {
  /** Beyond this factor no sample is recommended. */
  private static final double HOPELESS = 1000;

  private SampleAdvice() {}

  /** One sentence for each open temperature. */
  static List<String> sentences(StudyFacts facts) {
    final List<String> out = new ArrayList<>();
    final double target = facts.targets().yield();
    final int cases = facts.result().rows().length > 2 ? facts.result().rows()[2] : 0;
    for (final TemperatureAnswer answer : facts.answers()) {
      if (answer.kind() == Verdict.Kind.UNDECIDED) {
        out.add(sentence(answer.outcome(), target, cases));
      }
    }
    return out;
  }

  private static String sentence(TemperatureOutcome outcome, double target, int cases) {
    final String start = "At " + Words.kelvin(outcome.temperatureKelvin()) + " ";
    final boolean chipsOpen = straddles(outcome.yield(), target);
    final boolean casesOpen = straddles(outcome.yieldOnNewCases(), target);
    if (chipsOpen) {
      return start + "the chips do not decide yet: their interval " + Words.range(outcome.yield())
          + " holds the target. " + need(outcome.yield(), target, outcome.accuracies().length, "chips")
          + (casesOpen ? " The interval on new cases holds it too, so more test cases are needed as well."
              + " " + need(outcome.yieldOnNewCases(), target, cases, "test cases") : "");
    }
    if (casesOpen) {
      return start + "the chips decide on this test set (" + Words.range(outcome.yield())
          + "), but another test set could decide otherwise: the interval on new cases, "
          + Words.range(outcome.yieldOnNewCases()) + ", holds the target. More chips do not help. "
          + need(outcome.yieldOnNewCases(), target, cases, "test cases");
    }
    return start + "the two intervals lie on different sides of the target; more test cases are needed.";
  }

  private static boolean straddles(Interval interval, double target) {
    return !(interval.low() >= target) && !(interval.high() < target);
  }

  /** The sample that would move the end nearer to the target onto it. */
  static String need(Interval interval, double target, int sample, String what) {
    final double gap = Math.abs(interval.estimate() - target);
    final double width =
        interval.estimate() >= target
            ? interval.estimate() - interval.low()
            : interval.high() - interval.estimate();
    final double factor = (width / gap) * (width / gap);
    if (!(factor < HOPELESS) || sample < 1) {
      return "The estimate lies so near the target that no affordable number of " + what
          + " would decide; move the target or the design.";
    }
    return "About " + Words.count(rounded(sample * Math.max(1, factor))) + " " + what + " instead of "
        + Words.count(sample) + " would decide if the estimate stays where it is.";
  }

  /** Rounded up to two digits. */
  private static long rounded(double value) {
    long step = 1;
    while (value / step >= 100) {
      step *= 10;
    }
    return (long) Math.ceil(value / step) * step;
  }
}
