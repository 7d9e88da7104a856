package torqueloom.training.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The rule: both intervals on one side, at every temperature to meet, at some one to miss. */
class VerdictsTest {
  private static final Targets TARGETS = new Targets(0.9, 0.9, 0.95);

  private static TemperatureOutcome outcome(
      double kelvin, double[] accuracies, double low, double high, double newLow, double newHigh) {
    final double passing = Arrays.stream(accuracies).filter(a -> a >= 0.9).count();
    final double share = passing / accuracies.length;
    return new TemperatureOutcome(
        kelvin,
        accuracies,
        new Interval(0.9, 0.9, 0.9),
        0,
        0,
        0,
        0,
        new Interval(share, low, high),
        new Interval(share, newLow, newHigh),
        new Interval(share, low, high),
        0);
  }

  private static TemperatureOutcome outcome(
      double low, double high, double newLow, double newHigh) {
    return outcome(300, new double[] {0.95}, low, high, newLow, newHigh);
  }

  @ParameterizedTest(name = "[{0}, {1}] and on new cases [{2}, {3}]: {4}")
  @CsvSource({
    ".91, 1, .905, 1, MET",
    ".90, 1, .95, 1, UNDECIDED",
    ".91, 1, .90, 1, UNDECIDED",
    ".91, 1, .50, 1, UNDECIDED",
    ".10, .89, .05, .895, NOT_MET",
    ".10, .90, .05, .80, UNDECIDED",
    ".10, .50, .05, .95, UNDECIDED",
    ".85, .95, .80, .97, UNDECIDED"
  })
  void oneTemperature(
      double low, double high, double newLow, double newHigh, Verdict.Kind expected) {
    assertEquals(
        expected,
        Verdicts.judge(List.of(outcome(low, high, newLow, newHigh)), TARGETS, 500).kind());
  }

  @ParameterizedTest(name = "{0} and {1}: {2}")
  @CsvSource({
    "met, met, MET",
    "met, open, UNDECIDED",
    "open, open, UNDECIDED",
    "met, missed, NOT_MET",
    "missed, open, NOT_MET",
    "missed, missed, NOT_MET"
  })
  void severalTemperatures(String first, String second, Verdict.Kind expected) {
    final List<TemperatureOutcome> outcomes = List.of(kind(first), kind(second));
    final Verdict verdict = Verdicts.judge(outcomes, TARGETS, 500);
    assertEquals(expected, verdict.kind());
    // One sentence a temperature stands last, in order.
    assertTrue(verdict.reasons().size() >= 2);
  }

  private static TemperatureOutcome kind(String word) {
    return switch (word) {
      case "met" -> outcome(.95, 1, .93, 1);
      case "missed" -> outcome(.2, .4, .1, .5);
      default -> outcome(.8, .95, .7, .97);
    };
  }

  private static double[] chips(int count, int passing, double pass, double fail) {
    final double[] accuracies = new double[count];
    Arrays.fill(accuracies, fail);
    Arrays.fill(accuracies, 0, passing, pass);
    return accuracies;
  }

  /** 91 % of the chips pass by a hair: no number of chips helps while the cases are few. */
  @Test
  void namesTestCasesWhereChipsAloneWouldNotDecide() {
    final TemperatureOutcome close = outcome(300, chips(1000, 910, .901, .896), .884, .932, .02, 1);
    final String advice = Verdicts.judge(List.of(close), TARGETS, 540).reasons().get(0);
    assertTrue(advice.contains("more chips alone would not decide"), advice);
    assertTrue(advice.contains("test cases instead of 540"), advice);
  }

  @Test
  void namesOnlyTestCasesWhereTheChipsHaveDecidedOnThisSet() {
    final TemperatureOutcome close = outcome(300, chips(500, 490, .91, .89), .96, .99, .3, 1);
    final String advice = Verdicts.judge(List.of(close), TARGETS, 540).reasons().get(0);
    assertTrue(advice.contains("more chips would not decide"), advice);
    // The decisive accuracy .91 stands .01 off: .91 * .09 * (1.959964/.01)^2 = 3146.2.
    assertTrue(advice.contains("about 3147 test cases instead of 540"), advice);
  }

  @Test
  void namesOnlyChipsWhereTheChipsStandClearOfTheTargetAccuracy() {
    final TemperatureOutcome few = outcome(300, chips(40, 39, .99, .5), .83, 1, .83, 1);
    final String advice = Verdicts.judge(List.of(few), TARGETS, 2000).reasons().get(0);
    assertTrue(advice.contains("chips would decide"), advice);
    assertFalse(advice.contains("test cases"), advice);
  }

  /** 53 passes in a row put a yield above 0.9 at 95 %: computed independently with scipy. */
  @Test
  void fewestChips() {
    assertEquals(53, Verdicts.fewestChips(0.9, 0.95));
  }
}
