package torqueloom.training.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * Judges the chips. Met and not met need both intervals of the yield, on this test set and on new
 * cases, on one side of the target: above it at every temperature, or below it at some one.
 */
public final class Verdicts {
  /** Most chips that are looked for when it is said how many would decide. */
  private static final int MOST_CHIPS = 1_000_000;

  /** Test cases beyond this number are taken to be out of reach. */
  private static final double MOST_CASES = 1e7;

  private Verdicts() {}

  /**
   * @param outcomes one a temperature
   * @param targets what must be reached
   * @param cases number of test cases
   */
  public static Verdict judge(List<TemperatureOutcome> outcomes, Targets targets, int cases) {
    final List<String> reasons = new ArrayList<>();
    boolean met = true;
    boolean notMet = false;
    for (final TemperatureOutcome outcome : outcomes) {
      final boolean above = above(outcome, targets.yield());
      final boolean below = below(outcome, targets.yield());
      met &= above;
      notMet |= below;
      reasons.add(sentence(outcome, targets, above, below));
    }
    if (notMet) {
      return new Verdict(Verdict.Kind.NOT_MET, reasons);
    }
    if (met) {
      return new Verdict(Verdict.Kind.MET, reasons);
    }
    reasons.addAll(0, whatWouldDecide(outcomes, targets, cases));
    return new Verdict(Verdict.Kind.UNDECIDED, reasons);
  }

  /**
   * Fewest chips with which a yield could be shown to lie above a target: all of them passing.
   *
   * @param yield target (1), in (0, 1)
   * @param confidence (1), in (0, 1)
   */
  public static int fewestChips(double yield, double confidence) {
    for (int n = 1; n < MOST_CHIPS; n++) {
      if (ProportionInterval.anytime(n, n, confidence).low() > yield) {
        return n;
      }
    }
    return MOST_CHIPS;
  }

  private static boolean above(TemperatureOutcome outcome, double yield) {
    return outcome.yield().low() > yield && outcome.yieldOnNewCases().low() > yield;
  }

  private static boolean below(TemperatureOutcome outcome, double yield) {
    return outcome.yield().high() < yield && outcome.yieldOnNewCases().high() < yield;
  }

  private static String sentence(
      TemperatureOutcome outcome, Targets targets, boolean above, boolean below) {
    return String.format(
        Locale.ROOT,
        "At %s K, %s of the chips reach %s: on this test set %s to %s, on new cases %s to %s; that"
            + " is %s %s.",
        number(outcome.temperatureKelvin()),
        percent(outcome.yield().estimate()),
        percent(targets.accuracy()),
        percent(outcome.yield().low()),
        percent(outcome.yield().high()),
        percent(outcome.yieldOnNewCases().low()),
        percent(outcome.yieldOnNewCases().high()),
        above ? "above the target of" : below ? "below the target of" : "not decided against",
        percent(targets.yield()));
  }

  private static List<String> whatWouldDecide(
      List<TemperatureOutcome> outcomes, Targets targets, int cases) {
    final List<String> lines = new ArrayList<>();
    for (final TemperatureOutcome outcome : outcomes) {
      final double yield = targets.yield();
      if (above(outcome, yield) || below(outcome, yield)) {
        continue;
      }
      lines.add(
          "At " + number(outcome.temperatureKelvin()) + " K " + advice(outcome, targets, cases));
    }
    return lines;
  }

  /**
   * Chips narrow the interval on this test set. The interval on new cases also holds the scatter of
   * a chip's accuracy over other test sets, which no chip removes: where that scatter alone reaches
   * from the decisive chip to the target accuracy, test cases must be added.
   */
  private static String advice(TemperatureOutcome outcome, Targets targets, int cases) {
    final boolean chips = straddles(outcome.yield(), targets.yield());
    final boolean casesToo =
        straddles(outcome.yieldOnNewCases(), targets.yield())
            && casesNeeded(outcome, targets) > cases;
    if (casesToo) {
      return casesAdvice(outcome, targets, cases, chips);
    }
    return chips
        ? chipsThatWouldDecide(outcome, targets)
        : "the interval on new cases just reaches the target; somewhat more test cases would"
            + " decide.";
  }

  private static boolean straddles(Interval interval, double target) {
    return interval.low() <= target && interval.high() >= target;
  }

  /** Chips at which the anytime-valid interval would leave the target, were the share to stay. */
  private static String chipsThatWouldDecide(TemperatureOutcome outcome, Targets targets) {
    final double share = outcome.yield().estimate();
    for (long n = outcome.accuracies().length; n <= MOST_CHIPS; n += Math.max(1, n / 20)) {
      final Interval interval =
          ProportionInterval.anytime(Math.round(share * n), n, targets.confidence());
      if (interval.low() > targets.yield() || interval.high() < targets.yield()) {
        return String.format(
            Locale.ROOT, "about %d chips would decide, were their share to stay as it is.", n);
      }
    }
    return "no number of chips up to a million would decide: the share lies at the target.";
  }

  /**
   * Test cases at which the accuracy at the decisive quantile would stand clear of the target
   * accuracy. A case is right or wrong, so the accuracy of a chip on new cases scatters with
   * sqrt(a(1-a)/cases).
   */
  private static double casesNeeded(TemperatureOutcome outcome, Targets targets) {
    final double decisive = QuantileInterval.of(outcome.accuracies(), 1 - targets.yield());
    final double margin = Math.abs(decisive - targets.accuracy());
    if (margin == 0) {
      return Double.POSITIVE_INFINITY;
    }
    final double z =
        new NormalDistribution().inverseCumulativeProbability(0.5 + 0.5 * targets.confidence());
    return decisive * (1 - decisive) * (z / margin) * (z / margin);
  }

  private static String casesAdvice(
      TemperatureOutcome outcome, Targets targets, int cases, boolean chips) {
    final double needed = casesNeeded(outcome, targets);
    if (!(needed < MOST_CASES)) {
      return "neither more chips nor any number of test cases in reach would decide: the decisive"
          + " chips lie at the target accuracy.";
    }
    final long least = Math.max(cases + 1L, (long) Math.ceil(needed));
    if (!chips) {
      return String.format(
          Locale.ROOT,
          "more chips would not decide, more test cases would: about %d instead of %d.",
          least,
          cases);
    }
    return String.format(
        Locale.ROOT,
        "more chips alone would not decide: about %d test cases instead of %d are needed too. With"
            + " them, %s",
        least,
        cases,
        chipsThatWouldDecide(outcome, targets));
  }

  private static String percent(double share) {
    return String.format(Locale.ROOT, "%.1f %%", 100 * share);
  }

  private static String number(double value) {
    return value == Math.rint(value) ? Long.toString((long) value) : Double.toString(value);
  }
}
