package torqueloom.training.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import torqueloom.model.tolerance.Trim;
import torqueloom.training.chip.ChipOutcome;

/** Signs and temperatures of the paired comparisons, with chips whose accuracies are known. */
class ComparisonsTest {
  private static final Optional<Trim> TRIM = Optional.of(new Trim(2, 41, 300, true));

  /** Eight chips with the given numbers of right rows in each of two passes over four rows. */
  private static List<List<ChipOutcome>> stated(int at280, int at300) {
    return Collections.nCopies(8, List.of(outcome(at280), outcome(at300)));
  }

  private static ChipOutcome outcome(int right) {
    final byte[] rows = new byte[4];
    for (int i = 0; i < right; i++) {
      rows[i] = 2;
    }
    return new ChipOutcome(rows, new int[] {right, right}, 0);
  }

  private static Comparisons comparisons(Optional<Trim> trim) {
    final StudyPlan plan = TinyStudy.plan(TinyStudy.FILM, trim, 0.7);
    return new Comparisons(
        plan, TinyStudy.stage(plan), TinyStudy.responses(0, 100), TinyStudy.engine());
  }

  /** Without tolerances three of four rows are right at 300 K; the stated chips get one. */
  @Test
  void lossIsZeroToleranceLessStated() throws InterruptedException {
    final ToleranceEffect effect = comparisons(TRIM).toleranceEffect(stated(2, 1));
    assertEquals(8, effect.chips());
    assertEquals(0.75, effect.medianAtZero());
    assertEquals(0.25, effect.medianAtStated());
    assertEquals(new Interval(0.5, 0.5, 0.5), effect.loss());
  }

  /** The counterpart is simulated and never counts, so one of four rows is right without trim. */
  @Test
  void aStatedTrimIsComparedWithNone() throws InterruptedException {
    final TrimComparison trim = comparisons(TRIM).trim(stated(2, 3));
    assertFalse(trim.assumed());
    assertEquals(41, trim.levels());
    assertEquals(0.75, trim.medianWith());
    assertEquals(0.25, trim.medianWithout());
    assertEquals(new Interval(0.5, 0.5, 0.5), trim.difference());
    assertEquals(1, trim.yieldWith().estimate());
    assertEquals(0, trim.yieldWithout().estimate());
  }

  @Test
  void anAssumedTrimIsComparedWithTheStatedChips() throws InterruptedException {
    final TrimComparison trim = comparisons(Optional.empty()).trim(stated(2, 3));
    assertTrue(trim.assumed());
    assertEquals(64, trim.levels());
    assertEquals(0.25, trim.medianWith());
    assertEquals(0.75, trim.medianWithout());
    assertEquals(new Interval(-0.5, -0.5, -0.5), trim.difference());
    assertEquals(0, trim.yieldWith().estimate());
    assertEquals(1, trim.yieldWithout().estimate());
    // Two and a half deviations of the imbalance; its chip and device parts of 0.2 are drawn for each of 2000
    // devices, so one standard error is 1.6 % or 0.0112: by chance once in 10^5 seeds beyond 0.06.
    assertEquals(2.5 * 0.2 * Math.sqrt(2), trim.range(), 0.05);
  }
}
