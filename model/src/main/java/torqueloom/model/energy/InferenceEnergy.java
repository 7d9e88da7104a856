package torqueloom.model.energy;

import torqueloom.model.device.ElectricalChain;
import torqueloom.model.synapse.SynapseModel;

/**
 * Energy of one inference by part: pulses drawn from the supply (I V t), readout and electronics a
 * neuron and slot, one read of a pair a count, and the continuous bias over the latency. A gate holds
 * its level without current here: leakage and programming are not in it. Nor is the power of the
 * synapses' input stage, whose gain the synapse's summary states.
 */
public final class InferenceEnergy {
  private InferenceEnergy() {}

  /**
   * @param chain what one neuron costs
   * @param synapse what one read of a pair costs
   * @param activity what one inference does
   */
  public static InferenceCost cost(
      ElectricalChain chain, SynapseModel synapse, InferenceActivity activity) {
    final double drive = chain.pulseEnergy(activity.absoluteDrive());
    final double read = activity.neuronSlots() * chain.readEnergyPerSlot();
    final double synapses = activity.synapseReads() * synapse.readEnergyPerCount();
    final double electronics = activity.neuronSlots() * chain.electronicsEnergyPerSlot();
    final double bias = activity.neurons() * chain.biasPower() * activity.latency();
    final double total = drive + read + synapses + electronics + bias;
    return new InferenceCost(
        drive,
        read,
        synapses,
        0,
        electronics,
        bias,
        activity.latency(),
        activity.counts(),
        activity.multiplyAccumulates(),
        total / activity.latency());
  }
}
