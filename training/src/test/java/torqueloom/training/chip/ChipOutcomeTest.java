package torqueloom.training.chip;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

class ChipOutcomeTest {
  @Test
  void theCodecGivesOutcomesBack() {
    final ChipCodec codec = new ChipCodec();
    final List<ChipOutcome> back =
        codec.decode(
            codec.encode(
                List.of(
                    new ChipOutcome(new byte[] {3, 0, 127}, new int[] {2, 1}, 0.125),
                    new ChipOutcome(new byte[] {1}, new int[] {0}, 0))));
    assertEquals(2, back.size());
    assertArrayEquals(new byte[] {3, 0, 127}, back.get(0).correct());
    assertArrayEquals(new int[] {2, 1}, back.get(0).perPass());
    assertEquals(0.125, back.get(0).clippedShare());
    assertArrayEquals(new byte[] {1}, back.get(1).correct());
    assertArrayEquals(new int[] {0}, back.get(1).perPass());
  }

  /** Variance of the accuracy over passes with 1, 2 and 3 of 4 rows right: (1/4)². */
  @Test
  void passVarianceIsTheSampleVariance() {
    final ChipOutcome outcome = new ChipOutcome(new byte[] {3, 2, 1, 0}, new int[] {1, 2, 3}, 0);
    assertEquals(0.5, outcome.accuracy());
    assertEquals(0.0625, outcome.passVariance(), 1e-15);
  }
}
