package torqueloom.model.dynamics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Filter, comparator, winding and noise of the readout. */
class ReadoutTest {
  private final ScalarKernel kernel = new ScalarKernel();

  /** A tile whose first replica is steered by hand; the filter follows at once. */
  private Tile tile(float level) {
    final Tile tile = new Tile();
    tile.filtered[0] = level;
    tile.high[0] = level > 0 ? -1 : 0;
    tile.firstCount[0] = -1f;
    return tile;
  }

  private void show(Tile tile, float signal, float time) {
    tile.mx[0] = signal;
    final ReadConstants open =
        new ReadConstants(0, 1, 0, new FilterStep(1f, 0f, 0f, 0f), -.3f, .3f);
    kernel.read(tile, 1, open, time);
  }

  @ParameterizedTest(name = "from {0}: {1} gives {2}")
  @CsvSource({
    "1, '-1 1', 1",
    "1, '-1 1 -1 1', 2",
    "1, '-0.2 1', 0",
    "1, '-1 0.2 -1 0.2', 0",
    "1, '-1 -0.9 0 0.31', 1",
    "1, '-1', 0",
    "-1, '1', 0",
    "-1, '1 -1', 0",
    "-1, '1 -1 1', 1",
    "1, '0.2 -0.2 0.2', 0"
  })
  void countIsACompletedSpike(float start, String signals, int expected) {
    final Tile tile = tile(start);
    float time = 0;
    for (final String signal : signals.split(" ")) {
      show(tile, Float.parseFloat(signal), time += 1f);
    }
    assertEquals(expected, tile.counts[0]);
  }

  @Test
  void firstCountIsDatedToItsRise() {
    final Tile tile = tile(1);
    show(tile, -1f, 1f);
    show(tile, -1f, 2f);
    show(tile, 1f, 3f);
    show(tile, -1f, 4f);
    show(tile, 1f, 5f);
    assertEquals(3f, tile.firstCount[0]);
  }

  @ParameterizedTest(name = "{0} degrees a frame")
  @CsvSource({"20", "-20", "75", "-75"})
  void windingCountsSignedTurns(double degrees) {
    final Tile tile = tile(1);
    tile.lastX[0] = 1f;
    final int frames = (int) Math.round(3 * 360 / Math.abs(degrees));
    for (int i = 1; i <= frames; i++) {
      final double phi = Math.toRadians(degrees * i);
      tile.mz[0] = (float) Math.sin(phi);
      show(tile, (float) Math.cos(phi), i);
    }
    assertEquals(3 * Math.signum(degrees), tile.turns[0]);
  }

  /** Second-order Butterworth: 1/sqrt(1 + (f/f_c)^4) of a sine, held in 400 steps a period. */
  @ParameterizedTest(name = "{0} of the corner")
  @CsvSource({".25", ".5", "1", "2"})
  void filterGain(double ratio) {
    final double corner = 2e9;
    final double frame = 1 / (ratio * corner * 400);
    final FilterStep filter = FilterStep.of(SignalChain.ofMoment(corner, 0, -1, 1), frame);
    final Tile tile = tile(0);
    double cosine = 0;
    double sine = 0;
    final int periods = 40;
    for (int i = 0; i < periods * 400; i++) {
      final double phase = 2 * Math.PI * i / 400;
      tile.mx[0] = (float) Math.sin(phase);
      kernel.read(tile, 1, new ReadConstants(0, 1, 0, filter, -1, 1), 0);
      if (i >= periods * 200) {
        cosine += tile.filtered[0] * Math.cos(phase) / (periods * 100);
        sine += tile.filtered[0] * Math.sin(phase) / (periods * 100);
      }
    }
    assertEquals(1 / Math.sqrt(1 + Math.pow(ratio, 4)), Math.hypot(cosine, sine), 1e-3);
  }

  private static SlotEnsemble quiet(double noise) {
    final double bandwidth = 2e9;
    final double density = noise * noise / (bandwidth * Math.PI / (2 * Math.sqrt(2)));
    return SlotEnsemble.of(
        new MacrospinParameters(.1, .074, 4e-3, 4e-3, 0, 0, 0),
        SignalChain.ofMoment(bandwidth, density, -.3, .3),
        List.of(new RestLevel(1, 0, 0, 8e-3)),
        1e-9);
  }

  /**
   * Noise alone falls through a level at Rice's rate f exp(-d²/2); the rate does not depend on the
   * step because the filter has two poles. Four standard errors, plus 3 per cent for the held input.
   */
  @ParameterizedTest(name = "noise {0}, step factor {1}")
  @CsvSource({".4, 1", ".4, .4", ".5, 1"})
  void falseCountsFollowRice(double noise, double factor) {
    final int trials = 8192;
    final SlotProgram program =
        new SlotProgram(TorqueField.NONE, null, TorqueField.NONE, 1e-9, 9e-9);
    final SlotTrials result = quiet(noise).withStepFactor(factor).run(program, 0, 0, trials, 3);
    double counted = 0;
    for (final int count : result.counts()) {
      counted += count;
    }
    final double d = 1.3 / noise;
    final double expected = 2e9 * 10e-9 * Math.exp(-d * d / 2) * trials;
    // Falls that come back before the upper threshold is reached merge with the next: a few per
    // cent, so the count lies between 0.88 and 1 of the falls.
    final double error = 4 * Math.sqrt(expected);
    assertEquals(.94 * expected, counted, .09 * expected + error);
  }
}
