package torqueloom.training.study;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.training.chip.ChipCodec;
import torqueloom.training.chip.ChipOutcome;

/** Chips as units, and their statistics against numbers worked out by hand. */
class ChipStageTest {
  private static final ChipOutcome NOTHING = new ChipOutcome(new byte[4], new int[2], 0);

  private static List<ChipOutcome> chip(double clipped, int first, int second, int... correct) {
    final byte[] rows = new byte[correct.length];
    for (int i = 0; i < rows.length; i++) {
      rows[i] = (byte) correct[i];
    }
    return List.of(NOTHING, new ChipOutcome(rows, new int[] {first, second}, clipped));
  }

  /** Accuracies 1, 0.75, 0.5 and 0.75 at the second temperature, none right at the first. */
  private static final List<List<ChipOutcome>> CHIPS =
      List.of(
          chip(0.1, 4, 4, 2, 2, 2, 2),
          chip(0.2, 3, 3, 2, 2, 2, 0),
          chip(0.3, 3, 1, 2, 1, 1, 0),
          chip(0.4, 4, 2, 2, 2, 1, 1));

  @Test
  void statisticsOfFourChips() {
    final TemperatureOutcome outcome =
        TinyStudy.stage(TinyStudy.plan(Tolerances.NONE, Optional.empty(), 0.75))
            .outcome(CHIPS, 1, 300, 1);
    assertEquals(300, outcome.temperatureKelvin());
    assertArrayEquals(new double[] {1, 0.75, 0.5, 0.75}, outcome.accuracies());
    assertEquals(0.75, outcome.median().estimate(), 1e-15);
    // Deviations 1/4, 0, -1/4, 0: sqrt((1/16 + 1/16)/3).
    assertEquals(Math.sqrt(1.0 / 24), outcome.standardDeviation(), 1e-15);
    // Positions 0.15 and 2.85 among 0.5, 0.75, 0.75, 1.
    assertEquals(0.5375, outcome.quantile05(), 1e-15);
    assertEquals(0.9625, outcome.quantile95(), 1e-15);
    // Two chips without scatter, two with passes a half apart (variance 1/8): sqrt(1/16).
    assertEquals(0.25, outcome.withinChipDeviation(), 1e-15);
    assertEquals(0.25, outcome.meanClippedShare(), 1e-15);
    // An accuracy equal to the target reaches it: three of four.
    assertEquals(0.75, outcome.yield().estimate());
    assertEquals(0.75, outcome.yieldOnNewCases().estimate());
    // Wilson's interval of 3 in 4 by its formula, z = 1.959964.
    assertEquals(0.3006, outcome.wilson().low(), 5e-5);
    assertEquals(0.9544, outcome.wilson().high(), 5e-5);
    assertTrue(outcome.yieldOnNewCases().low() <= outcome.yield().low());
    assertTrue(outcome.yieldOnNewCases().high() >= outcome.yield().high());
  }

  /** With three perfect chips every resampled table is perfect, yet three chips prove little. */
  @Test
  void newCasesAreNeverNarrower() {
    final List<List<ChipOutcome>> perfect = List.of(CHIPS.get(0), CHIPS.get(0), CHIPS.get(0));
    final TemperatureOutcome outcome =
        TinyStudy.stage(TinyStudy.plan(Tolerances.NONE, Optional.empty(), 0.75))
            .outcome(perfect, 1, 300, 1);
    assertEquals(outcome.yield(), outcome.yieldOnNewCases());
    assertTrue(outcome.yield().low() < 0.5);
  }

  private static List<List<ChipOutcome>> run(Responses responses, List<Integer> places, int chips)
      throws InterruptedException {
    final StudyPlan plan = TinyStudy.plan(TinyStudy.FILM, Optional.empty(), 0.7);
    return TinyStudy.stage(plan)
        .run(
            new ChipStage.Draw(
                "chips", responses, TinyStudy.FILM, Optional.empty(), true, places, chips));
  }

  /** Neurons never count at 280 K and always at 300 K: one and three of four rows are right. */
  @Test
  void temperaturesStandInTheOrderAskedFor() throws InterruptedException {
    final Responses responses = TinyStudy.responses(0, 100);
    final List<List<ChipOutcome>> both = run(responses, List.of(0, 1), 2);
    assertArrayEquals(new double[] {0.25, 0.25}, ChipStage.accuracies(both, 0));
    assertArrayEquals(new double[] {0.75, 0.75}, ChipStage.accuracies(both, 1));
    assertArrayEquals(
        new double[] {0.75, 0.75}, ChipStage.accuracies(run(responses, List.of(1), 2), 0));
  }

  private static List<String> lines(List<List<ChipOutcome>> chips) {
    return chips.stream().map(new ChipCodec()::encode).toList();
  }

  @Test
  void aChipDoesNotDependOnTheNumberOfChips() throws InterruptedException {
    final Responses responses = TinyStudy.responses(20, 15);
    final List<String> many = lines(run(responses, List.of(0, 1), 9));
    assertEquals(many.subList(0, 4), lines(run(responses, List.of(0, 1), 4)));
    // They do differ from one another.
    assertTrue(many.stream().distinct().count() > 4);
  }

  /** The law is the same at both temperatures, the noise is not. */
  @Test
  void everyTemperatureHasNoiseOfItsOwn() throws InterruptedException {
    final List<List<ChipOutcome>> chips = run(TinyStudy.responses(20, 20), List.of(0, 1), 9);
    final long alike =
        chips.stream()
            .filter(chip -> Arrays.equals(chip.get(0).correct(), chip.get(1).correct()))
            .count();
    assertTrue(alike < 9);
  }
}
