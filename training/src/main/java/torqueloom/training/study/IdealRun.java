package torqueloom.training.study;

import torqueloom.model.device.ElectricalChain;
import torqueloom.model.energy.InferenceActivity;
import torqueloom.model.energy.InferenceCost;
import torqueloom.model.energy.InferenceEnergy;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;
import torqueloom.model.synapse.SynapseModel;
import torqueloom.training.evaluation.Accuracy;
import torqueloom.training.evaluation.CountKernel;
import torqueloom.training.evaluation.ForwardPass;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.evaluation.PairLayer;
import torqueloom.training.evaluation.TrainedNetwork;
import torqueloom.training.learning.LabeledRows;

/**
 * The test rows on the ideal network: nominal devices, weights at their levels without write error,
 * thermal noise on.
 *
 * @param accuracy mean over the noise passes (1)
 * @param clippedShare share of pulses clipped at the maximum drive (1)
 * @param activity what one inference does on average
 */
record IdealRun(double accuracy, double clippedShare, InferenceActivity activity) {

  static IdealRun of(
      StudyPlan plan, Responses responses, TrainedNetwork network, LabeledRows test) {
    final ForwardPass ideal =
        ForwardPass.ideal(responses.referenceBank(), network, NetworkStage.clip(plan));
    final int passes = plan.evaluation().noisePasses();
    final CountKernel.Tally[] tallies = ideal.tallies();
    double accuracy = 0;
    for (int pass = 0; pass < passes; pass++) {
      final long key = Streams.key(plan.seed(), Purpose.IDEAL_COUNTS, pass);
      accuracy +=
          Accuracy.of(ideal.predict(test.x(), test.rows(), key, tallies), test.labels()) / passes;
    }
    return new IdealRun(
        accuracy,
        CountKernel.Tally.clippedShare(tallies),
        activity(plan, network, test, tallies, passes));
  }

  /** Cost of one inference. */
  InferenceCost cost(StudyPlan plan, SynapseModel synapse) {
    final ElectricalChain chain =
        plan.device().electrical(plan.device().referenceTemperature(), plan.protocol());
    return InferenceEnergy.cost(chain, synapse, activity);
  }

  private static InferenceActivity activity(
      StudyPlan plan,
      TrainedNetwork network,
      LabeledRows test,
      CountKernel.Tally[] tallies,
      int passes) {
    final NetworkSettings settings = network.settings();
    final double runs = (double) passes * test.rows();
    final int slots = settings.slots();
    // A level of x counts reads each of its pairs x times in every slot.
    double senders = sum(test.x()) / test.rows() * slots;
    double reads = 0;
    double applications = 0;
    double drive = 0;
    double counts = 0;
    int neurons = 0;
    for (int layer = 0; layer < network.layers().size(); layer++) {
      final PairLayer shape = network.layers().get(layer);
      reads += senders * shape.outputs();
      applications += (double) shape.inputs() * shape.outputs() * slots;
      if (layer < tallies.length) {
        neurons += shape.outputs();
        drive += tallies[layer].drive / runs;
        senders = tallies[layer].counts / runs;
        counts += senders;
      }
    }
    return new InferenceActivity(
        drive * plan.synapse().unitDrive(),
        neurons,
        (double) neurons * slots,
        counts,
        reads,
        applications,
        (slots + settings.deviceLayers()) * plan.protocol().slot());
  }

  private static double sum(float[] values) {
    double sum = 0;
    for (final float value : values) {
      sum += value;
    }
    return sum;
  }
}
