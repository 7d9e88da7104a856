package torqueloom.training.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import torqueloom.model.device.DriveProtocol;
import torqueloom.model.device.Gate;
import torqueloom.model.response.CalibrationSettings;
import torqueloom.model.response.LibraryInstance;
import torqueloom.model.response.ResponseCurve;
import torqueloom.model.response.ResponseLibrary;
import torqueloom.model.synapse.JunctionParameters;
import torqueloom.model.synapse.SynapseModel;
import torqueloom.model.synapse.SynapseSettings;
import torqueloom.model.tolerance.Spread;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.model.tolerance.Trim;
import torqueloom.model.work.Progress;
import torqueloom.model.work.UnitExecutor;
import torqueloom.training.chip.FakeDevice;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.evaluation.PairLayer;
import torqueloom.training.evaluation.PairWeights;
import torqueloom.training.evaluation.TrainedNetwork;
import torqueloom.training.learning.LabeledRows;

/**
 * A study small enough to work out by hand. Two inputs, two neurons, three slots of 10 ns, two
 * classes. Neurons that count in every slot make class 1, neurons that never count class 0; three
 * of the four test rows are of class 1. The library's neurons count with one probability whatever
 * the drive.
 */
final class TinyStudy {
  static final Tolerances FILM = new Tolerances(Map.of("film", new Spread(0.2, 0.2)));
  static final List<Double> TEMPERATURES = List.of(280.0, 300.0);
  static final double UNIT_DRIVE = 4e10;
  static final LabeledRows TEST =
      new LabeledRows(new float[] {1, 0, 1, 1, 1, 0, 1, 1}, new int[] {1, 1, 1, 0}, 2);

  private TinyStudy() {}

  /** Drives of the hidden neurons: (2, 2) for rows {1, 0} and (2.5, 2) for rows {1, 1}. */
  static TrainedNetwork network() {
    return new TrainedNetwork(
        new NetworkSettings(new int[] {2}, 3, NetworkSettings.Output.WEIGHTED_SUM, 0, 1),
        List.of(
            new PairLayer(2, 2, new float[] {1, 0, .5f, 0}, new float[4], new float[] {1, 2}),
            new PairLayer(2, 2, new float[] {0, 1, 0, 1}, new float[4], new float[] {.5f, 0})),
        PairWeights.straight(11),
        1f,
        "");
  }

  /** The same hidden layer before an output layer of two device neurons. */
  static TrainedNetwork networkWithDeviceOutput() {
    final TrainedNetwork network = network();
    return new TrainedNetwork(
        new NetworkSettings(new int[] {2}, 3, NetworkSettings.Output.DEVICE, 0, 1),
        network.layers(),
        network.curve(),
        1f,
        "");
  }

  /** The largest drive is 2.25 unit drives, which clips the first neuron on rows {1, 1}. */
  static StudyPlan plan(Tolerances tolerances, Optional<Trim> trim, double targetAccuracy) {
    return new StudyPlan(
        "tiny",
        17,
        "",
        FakeDevice.NOMINAL,
        new DriveProtocol(0, false, 9e10, 5e-10, 1e-8),
        tolerances,
        trim,
        new CalibrationSettings(3, 3, 0.1, 400),
        synapse(),
        Optional.empty(),
        network().settings(),
        null,
        new EvaluationSettings(8, 2, TEMPERATURES),
        new Targets(targetAccuracy, 0.9, 0.95),
        List.of());
  }

  private static SynapseSettings synapse() {
    final JunctionParameters junction =
        new JunctionParameters(
            0.1,
            0.06,
            80e-9,
            1.6e-9,
            1e6,
            0.03,
            5e-11,
            1.2,
            0.6,
            0.1,
            1.3e-9,
            Map.of("resistance-area", new Spread(0, 0.01)));
    return new SynapseSettings(
        SynapseSettings.Kind.JUNCTION,
        0.6,
        11,
        0.01,
        true,
        64,
        UNIT_DRIVE,
        Optional.empty(),
        5e-9,
        5,
        new Gate(2e-9, 6e-14, 1e9),
        Optional.of(junction));
  }

  static ChipStage stage(StudyPlan plan) {
    return new ChipStage(
        plan,
        SynapseModel.of(plan.synapse(), 300),
        new NetworkStage.Trained(network(), null, ""),
        new EncodedTask(null, null, null, null, TEST),
        engine());
  }

  static UnitExecutor engine() {
    return new UnitExecutor(1, null, Progress.NONE);
  }

  /**
   * @param at280 count in 100 slots at 280 K, at any drive
   * @param at300 the same at 300 K, the device's reference
   */
  static Responses responses(int at280, int at300) {
    final List<LibraryInstance> instances = new ArrayList<>();
    final List<ResponseCurve> curves = new ArrayList<>();
    for (final double temperature : TEMPERATURES) {
      for (int i = 0; i < 3; i++) {
        instances.add(
            new LibraryInstance(i, temperature, 2, new double[] {i == 0 ? 0 : 2 * i - 3}));
        curves.add(curve(i, temperature, temperature == 280 ? at280 : at300));
      }
    }
    return Responses.of(
        new ResponseLibrary(
            "",
            "A/m^2",
            TEMPERATURES,
            List.of("imbalance"),
            new double[] {1},
            instances,
            curves,
            0,
            0,
            0,
            0,
            ""),
        UNIT_DRIVE,
        300);
  }

  private static ResponseCurve curve(int instance, double temperature, int ones) {
    final int[] law = {100 - ones, ones};
    return new ResponseCurve(
        instance,
        temperature,
        5e-10,
        0,
        Double.NaN,
        new double[] {0, 1e11},
        new int[] {100, 100},
        0,
        new int[][] {law, law},
        List.of(new TreeMap<>(), new TreeMap<>()),
        new double[2],
        new double[2]);
  }
}
