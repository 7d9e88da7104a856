package torqueloom.training.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import torqueloom.model.energy.InferenceActivity;
import torqueloom.model.energy.InferenceCost;
import torqueloom.model.synapse.SynapseModel;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.training.evaluation.TrainedNetwork;

/** Activity, latency and energy of a network of two neurons, worked out by hand. */
class IdealRunTest {
  private static final StudyPlan PLAN = TinyStudy.plan(Tolerances.NONE, Optional.empty(), 0.7);

  private static IdealRun run(TrainedNetwork network) {
    return IdealRun.of(PLAN, TinyStudy.responses(0, 100), network, TinyStudy.TEST);
  }

  @Test
  void takesTheResponsesAtTheReferenceTemperature() {
    final IdealRun run = run(TinyStudy.network());
    // At 300 K every neuron counts, so every row is answered with class 1.
    assertEquals(0.75, run.accuracy(), 1e-15);
    // Clipped: the first of two neurons on half of the rows.
    assertEquals(0.25, run.clippedShare(), 1e-15);
  }

  @Test
  void activityOfAWeightedSum() {
    final InferenceActivity activity = run(TinyStudy.network()).activity();
    // Two neurons in three slots, one count in each.
    assertEquals(2, activity.neurons());
    assertEquals(6, activity.neuronSlots());
    assertEquals(6, activity.counts(), 1e-12);
    // Drives 2 + 2 and 2.25 (clipped) + 2 unit drives a slot: 4.125 on average, in three slots.
    assertEquals(3 * 4.125 * 4e10, activity.absoluteDrive(), 1);
    // Inputs sum to 1 or 2: 1.5 in three slots, two pairs each; then six counts, two pairs each.
    assertEquals(4.5 * 2 + 6 * 2, activity.synapseReads(), 1e-12);
    assertEquals(3 * (4 + 4), activity.multiplyAccumulates());
    // S + L slots: three and one.
    assertEquals(4e-8, activity.latency(), 1e-20);
  }

  @Test
  void aDeviceOutputIsOneLayerMore() {
    final InferenceActivity activity = run(TinyStudy.networkWithDeviceOutput()).activity();
    assertEquals(4, activity.neurons());
    assertEquals(12, activity.neuronSlots());
    assertEquals(12, activity.counts(), 1e-12);
    assertEquals(5e-8, activity.latency(), 1e-20);
    // The output's drives are 0.5 and the two counts, 2.
    assertEquals(3 * (4.125 + 2.5) * 4e10, activity.absoluteDrive(), 1);
    assertEquals(4.5 * 2 + 6 * 2, activity.synapseReads(), 1e-12);
  }

  /**
   * A chain of 1e-15 A per A/m², 0.8 V, 0.5 ns pulses, 1 fJ and 1 pJ a slot, 1 uW of bias: I V t is
   * 4.95e11 x 1e-15 x 0.8 x 5e-10 = 1.98e-13 J, two neurons' bias over 40 ns 8e-14 J.
   */
  @Test
  void energyOfAWeightedSum() {
    final SynapseModel synapse = SynapseModel.of(PLAN.synapse(), 300);
    final InferenceCost cost = run(TinyStudy.network()).cost(PLAN, synapse);
    assertEquals(1.98e-13, cost.driveJoules(), 1e-25);
    assertEquals(6e-15, cost.readJoules(), 1e-27);
    assertEquals(6e-12, cost.electronicsJoules(), 1e-24);
    assertEquals(8e-14, cost.staticJoules(), 1e-26);
    assertTrue(synapse.readEnergyPerCount() > 0);
    final double synapses = 21 * synapse.readEnergyPerCount();
    assertEquals(synapses, cost.synapseJoules(), 1e-12 * synapses);
    final double total = 1.98e-13 + 6e-15 + 6e-12 + 8e-14 + synapses;
    assertEquals(total, cost.totalJoules(), 1e-12 * total);
    assertEquals(4e-8, cost.latencySeconds(), 1e-20);
    assertEquals(total / 4e-8, cost.supplyPowerWatts(), 1e-12 * total / 4e-8);
  }
}
