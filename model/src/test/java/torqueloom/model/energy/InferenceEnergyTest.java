package torqueloom.model.energy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import torqueloom.model.device.ElectricalChain;
import torqueloom.model.device.Gate;
import torqueloom.model.synapse.JunctionParameters;
import torqueloom.model.synapse.SynapseModel;
import torqueloom.model.synapse.SynapseSettings;

class InferenceEnergyTest {
  private static final ElectricalChain CHAIN =
      new ElectricalChain(1300, 2.5e-16, 0.8, 0.5e-9, 2e-15, 1e-12, 1e-9);

  private static SynapseModel synapse() {
    final JunctionParameters junction =
        new JunctionParameters(
            0.1, 0.06, 80e-9, 1.6e-9, 1e6, 0.03, 50e-12, 1.2, 0.6, 0.1, 1.3e-9, Map.of());
    return SynapseModel.of(
        new SynapseSettings(
            SynapseSettings.Kind.JUNCTION,
            0.6,
            32,
            0.01,
            true,
            64,
            3.9e10,
            Optional.empty(),
            5e-9,
            5,
            new Gate(2e-9, 60e-15, 1e9),
            Optional.of(junction)),
        300);
  }

  /** Derived here by hand from the inputs, every part. */
  @Test
  void addsUpByPart() {
    final InferenceActivity activity = new InferenceActivity(1e13, 48, 384, 120, 700, 5000, 9e-8);
    final InferenceCost cost = InferenceEnergy.cost(CHAIN, synapse(), activity);
    assertEquals(1e13 * 2.5e-16 * 0.8 * 0.5e-9, cost.driveJoules(), 1e-26);
    assertEquals(384 * 2e-15, cost.readJoules(), 1e-26);
    assertEquals(384e-12, cost.electronicsJoules(), 1e-24);
    assertEquals(48 * 1e-9 * 9e-8, cost.staticJoules(), 1e-28);
    assertEquals(cost.totalJoules() / 9e-8, cost.supplyPowerWatts(), 1e-16);
    assertEquals(120, cost.countsPerInference());
  }

  /** Derived here: V² 2 G t with G = 0.89233 x 100.531 uS (area over RA; thermal tilt as tested). */
  @Test
  void oneReadOfAPair() {
    final double expected = 0.01 * 2 * 0.89233 * 100.531e-6 * 5e-9;
    assertEquals(expected, synapse().readEnergyPerCount(), 1e-5 * expected);
    final InferenceActivity activity = new InferenceActivity(0, 1, 0, 0, 10, 0, 1e-9);
    assertEquals(
        10 * synapse().readEnergyPerCount(),
        InferenceEnergy.cost(CHAIN, synapse(), activity).synapseJoules());
  }

  /** kT ln 2 at 300 K is 2.871e-21 J (from memory, 17.9 meV). */
  @Test
  void landauerLimit() {
    assertEquals(2.871e-21, ReferenceEnergies.perDecision(300), 0.001e-21);
  }

  @Test
  void refusesNonsense() {
    assertThrows(IllegalArgumentException.class, () -> new InferenceActivity(-1, 1, 1, 1, 1, 1, 1));
    assertThrows(IllegalArgumentException.class, () -> new InferenceActivity(1, 1, 1, 1, 1, 1, 0));
  }
}
