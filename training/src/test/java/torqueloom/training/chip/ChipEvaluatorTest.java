package torqueloom.training.chip;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import torqueloom.model.tolerance.Spread;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.evaluation.NeuronBank;
import torqueloom.training.evaluation.PairLayer;
import torqueloom.training.evaluation.PairWeights;
import torqueloom.training.evaluation.TrainedNetwork;

/** Chips of one neuron at 300 K and 380 K; instances stand at imbalances 0, -1, 1. */
class ChipEvaluatorTest {
  /**
   * The nominal device never counts at 300 K and always counts once at 380 K; its count drives
   * class 1. So class 0 is answered at 300 K (ties go to the lower class) and class 1 at 380 K.
   */
  @Test
  void chipsUseTheResponseOfTheirTemperature() {
    final ChipEvaluator evaluator =
        new ChipEvaluator(
            ChipFactoryTest.factory(Tolerances.NONE, Optional.empty(), 0, false),
            oneNeuron(),
            List.of(bank(1f), bank(0f)),
            List.of(0, 1),
            10f,
            new float[3],
            new int[] {0, 0, 1},
            3);
    final List<ChipOutcome> outcomes = evaluator.evaluate(0);
    assertArrayEquals(new byte[] {3, 3, 0}, outcomes.get(0).correct());
    assertArrayEquals(new int[] {2, 2, 2}, outcomes.get(0).perPass());
    assertEquals(2.0 / 3, outcomes.get(0).accuracy());
    assertArrayEquals(new byte[] {0, 0, 3}, outcomes.get(1).correct());
    assertEquals(1.0 / 3, outcomes.get(1).accuracy());
  }

  /**
   * Instance 0 never counts, instance 2 (at an imbalance of 1) always does. A nominal device drifts
   * from 0 at 300 K to 0.8 at 380 K, so it is answered for by the one and then by the other.
   */
  @Test
  void chipsUseTheInstanceOfTheirTemperature() {
    final NeuronBank bank =
        new NeuronBank(
            3, 2, 1, 10f, new float[] {1, 1, 1, 1, 0, 0}, new float[] {0, 0, 0, 0, 1, 1});
    final Tolerances hardly = new Tolerances(Map.of("film", new Spread(0, 1e-6)));
    final ChipEvaluator evaluator =
        new ChipEvaluator(
            ChipFactoryTest.factory(hardly, Optional.empty(), 0, false),
            oneNeuron(),
            List.of(bank, bank),
            List.of(0, 1),
            10f,
            new float[3],
            new int[] {0, 0, 1},
            1);
    final List<ChipOutcome> outcomes = evaluator.evaluate(0);
    assertArrayEquals(new byte[] {1, 1, 0}, outcomes.get(0).correct());
    assertArrayEquals(new byte[] {0, 0, 1}, outcomes.get(1).correct());
  }

  /** One neuron whose count drives class 1; without a count class 0 wins the tie. */
  private static TrainedNetwork oneNeuron() {
    return new TrainedNetwork(
        new NetworkSettings(new int[] {1}, 2, NetworkSettings.Output.WEIGHTED_SUM, 0, 1),
        List.of(
            new PairLayer(1, 1, new float[1], new float[1], new float[] {5f}),
            new PairLayer(1, 2, new float[] {0f, 1f}, new float[2], new float[2])),
        PairWeights.straight(11),
        1f,
        "");
  }

  /** All instances alike, P(no count) given. */
  private static NeuronBank bank(float none) {
    final float[] cumulative = new float[6];
    final float[] mean = new float[6];
    Arrays.fill(cumulative, none);
    Arrays.fill(mean, 1 - none);
    return new NeuronBank(3, 2, 1, 10f, cumulative, mean);
  }
}
