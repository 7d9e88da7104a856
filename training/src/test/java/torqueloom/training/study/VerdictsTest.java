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
    "open, met, UNDECIDED",
    "open, open, UNDECIDED",
    "missed, met, NOT_MET",
    "open, missed, NOT_MET",
    "met, missed, NOT_MET",
    "missed, open, NOT_MET",
    "missed, missed, NOT_MET"
  })
  void severalTemperatures(String first, String second, Verdict.Kind expected) {
    final List<TemperatureOutcome> outcomes = List.of(kind(first), kind(second));
    assertEquals(expected, Verdicts.judge(outcomes, TARGETS, 500).kind());
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
    assertTrue(advice.contains("more test cases would: about 3147 instead of 540"), advice);
  }

  @Test
  void namesOnlyChipsWhereTheChipsStandClearOfTheTargetAccuracy() {
    final TemperatureOutcome few = outcome(300, chips(40, 39, .99, .5), .83, 1, .83, 1);
    final String advice = Verdicts.judge(List.of(few), TARGETS, 2000).reasons().get(0);
    assertTrue(advice.contains("chips would decide"), advice);
    assertFalse(advice.contains("test cases"), advice);
  }

  /** The decisive tenth of the chips lies at the target accuracy itself. */
  @Test
  void namesNeitherWhereTheDecisiveChipsLieAtTheTargetAccuracy() {
    final TemperatureOutcome at = outcome(300, chips(100, 95, .9, .8), .85, .99, .1, 1);
    final String advice = Verdicts.judge(List.of(at), TARGETS, 540).reasons().get(0);
    assertTrue(advice.contains("neither more chips nor any number of test cases"), advice);
  }

  /** Advice for the open temperatures first, then one sentence a temperature in their order. */
  @Test
  void adviceStandsFirstAndTemperaturesKeepTheirOrder() {
    final TemperatureOutcome met = outcome(290, chips(1, 1, .95, 0), .95, 1, .93, 1);
    final TemperatureOutcome open = outcome(300, chips(40, 39, .99, .5), .83, 1, .83, 1);
    final TemperatureOutcome other = outcome(310, chips(40, 39, .99, .5), .83, 1, .83, 1);
    final List<String> reasons = Verdicts.judge(List.of(met, open, other), TARGETS, 2000).reasons();
    assertEquals(5, reasons.size());
    assertTrue(reasons.get(0).startsWith("At 300 K about"), reasons.get(0));
    assertTrue(reasons.get(1).startsWith("At 310 K about"), reasons.get(1));
    assertTrue(reasons.get(2).startsWith("At 290 K, 100.0 %"), reasons.get(2));
    assertTrue(reasons.get(2).endsWith("above the target of 90.0 %."), reasons.get(2));
    assertTrue(reasons.get(3).startsWith("At 300 K, 97.5 %"), reasons.get(3));
    assertTrue(reasons.get(4).startsWith("At 310 K, 97.5 %"), reasons.get(4));
  }

  /**
   * Robbins' mixture with weight Beta(1/2, 1/2): n passes in a row put a yield above y as soon as
   * y^n is at most 1 - C of the mixture's C(2n, n)/4^n (from memory; 53 also with scipy).
   */
  @Test
  void fewestChips() {
    int n = 0;
    double mixture = 1;
    double likelihood = 1;
    while (likelihood > 0.05 * mixture) {
      n++;
      mixture *= (2 * n - 1) / (2.0 * n);
      likelihood *= 0.9;
    }
    assertEquals(53, n);
    assertEquals(53, Verdicts.fewestChips(0.9, 0.95));
  }
}
