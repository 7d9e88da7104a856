package torqueloom.app.study;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.device.DriveProtocol;
import torqueloom.model.device.Gate;
import torqueloom.model.response.CalibrationSettings;
import torqueloom.model.synapse.JunctionParameters;
import torqueloom.model.synapse.SynapseSettings;
import torqueloom.model.tolerance.Spread;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.model.tolerance.Trim;
import torqueloom.training.data.TaskSettings;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.learning.TrainingSettings;
import torqueloom.training.study.EvaluationSettings;
import torqueloom.training.study.StudyPlan;
import torqueloom.training.study.Targets;

/** Turns checked values into the plain records of the lower packages. */
final class PlanBuilder {
  /** Unit drives in the maximum drive where nothing states them (1). */
  private static final double UNIT_DRIVES = 20;

  private final Values values;
  private final Path folder;

  /**
   * @param values checked values
   * @param folder the study's folder
   */
  PlanBuilder(Values values, Path folder) {
    this.values = values;
    this.folder = folder;
  }

  /**
   * @param withTask whether the task is wanted; its fields may be missing otherwise
   */
  StudyPlan plan(String digest, List<String> notices, boolean withTask) {
    return new StudyPlan(
        values.text("name"),
        values.longWhole("seed"),
        digest,
        device(values),
        protocol(values),
        new Tolerances(spreads("tolerances")),
        trim(),
        calibration(),
        synapse(),
        withTask ? Optional.of(task()) : Optional.empty(),
        network(),
        training(),
        evaluation(),
        targets(),
        notices);
  }

  static DeviceKind device(Values values) {
    return DeviceBuilder.easyPlaneFerromagnet(values);
  }

  static DriveProtocol protocol(Values values) {
    return new DriveProtocol(
        values.number("protocol.bias"),
        values.text("protocol.polarity").equals("bipolar"),
        values.number("protocol.maximum-drive"),
        values.number("protocol.pulse"),
        values.number("protocol.slot"));
  }

  static Gate gate(Values values, String block) {
    return new Gate(
        values.number(block + ".dielectric-thickness"),
        values.number(block + ".voltage-coefficient"),
        values.number(block + ".breakdown-field"));
  }

  /** Spreads by parameter; a parameter that does not stand has none. */
  private Map<String, Spread> spreads(String block) {
    final Map<String, Spread> spreads = new TreeMap<>();
    for (final Key key : StudySchema.inner(StudySchema.find(block).orElseThrow().type())) {
      final String name = block + "." + key.name();
      if (values.has(name)) {
        spreads.put(
            key.name(), new Spread(values.number(name + ".chip"), values.number(name + ".device")));
      }
    }
    return spreads;
  }

  private Optional<Trim> trim() {
    if (!values.has("trim")) {
      return Optional.empty();
    }
    return Optional.of(
        new Trim(
            values.number("trim.range"),
            values.whole("trim.levels"),
            values.number("trim.temperature"),
            values.flag("trim.retrim")));
  }

  private CalibrationSettings calibration() {
    return new CalibrationSettings(
        values.whole("calibration.instances"),
        values.whole("calibration.drives"),
        values.number("calibration.half-width"),
        values.whole("calibration.maximum-trials"));
  }

  /** A study without a synapse, read for its responses only, gets the unlimited one. */
  private SynapseSettings unlimitedSynapse() {
    return new SynapseSettings(
        SynapseSettings.Kind.UNLIMITED,
        0.5,
        2,
        0,
        true,
        1,
        values.number("protocol.maximum-drive") / UNIT_DRIVES,
        Optional.empty(),
        values.number("protocol.slot"),
        0,
        gate(values, "device.gate"),
        Optional.empty());
  }

  private SynapseSettings synapse() {
    if (!values.isWritten("synapse")) {
      return unlimitedSynapse();
    }
    final boolean junction = values.text("synapse.kind").equals("junction");
    return new SynapseSettings(
        junction ? SynapseSettings.Kind.JUNCTION : SynapseSettings.Kind.UNLIMITED,
        values.number("synapse.tuning-range"),
        values.whole("synapse.levels"),
        values.number("synapse.write-error"),
        values.flag("synapse.write-verify"),
        values.whole("synapse.fan-in"),
        values.number("synapse.unit-drive"),
        values.findNumber("synapse.gain"),
        values.number("synapse.read-window"),
        values.number("synapse.line-resistance"),
        gate(values, "synapse.gate"),
        junction ? Optional.of(junction()) : Optional.empty());
  }

  private JunctionParameters junction() {
    final String block = "synapse.junction.";
    return new JunctionParameters(
        values.number(block + "anisotropy-field"),
        values.number(block + "bias-field"),
        values.number(block + "diameter"),
        values.number(block + "thickness"),
        values.number(block + "saturation-magnetization"),
        values.number(block + "damping"),
        values.number(block + "resistance-area"),
        values.number(block + "magnetoresistance"),
        values.number(block + "polarization"),
        values.number(block + "read-voltage"),
        values.number(block + "barrier"),
        spreads(block + "tolerances"));
  }

  private TaskSettings task() {
    return new TaskSettings(
        path("task.data"),
        path("task.data.features"),
        path("task.data.labels"),
        path("task.train"),
        path("task.test"),
        values.findText("task.label").orElse(""),
        values.number("task.split.train"),
        values.number("task.split.validation"),
        values.number("task.split.test"));
  }

  private Optional<Path> path(String key) {
    return values.findText(key).map(text -> DataFiles.resolve(folder, text));
  }

  // What a study read for its responses only may lack is filled in, and used by nothing.

  private NetworkSettings network() {
    if (!values.has("network.hidden")) {
      return new NetworkSettings(new int[] {1}, 1, NetworkSettings.Output.WEIGHTED_SUM, 0, 1);
    }
    final boolean device = values.text("network.output").equals("device");
    return new NetworkSettings(
        values.wholes("network.hidden"),
        values.whole("network.slots"),
        device ? NetworkSettings.Output.DEVICE : NetworkSettings.Output.WEIGHTED_SUM,
        values.whole("network.input-levels"),
        values.number("network.input-full-scale"));
  }

  private TrainingSettings training() {
    if (!values.has("training.batch")) {
      return new TrainingSettings(1, 1, 1, false, Double.NaN, 1);
    }
    return new TrainingSettings(
        values.whole("training.epochs"),
        values.whole("training.batch"),
        values.number("training.learning-rate"),
        values.flag("training.variation-aware"),
        values.findNumber("training.surrogate-width").orElse(Double.NaN),
        values.whole("training.patience"));
  }

  private EvaluationSettings evaluation() {
    if (!values.has("evaluation.chips")) {
      return new EvaluationSettings(1, 1, List.of(values.number("device.temperature")));
    }
    return new EvaluationSettings(
        values.whole("evaluation.chips"),
        values.whole("evaluation.noise-passes"),
        values.numbers("evaluation.temperatures"));
  }

  private Targets targets() {
    if (!values.has("targets.accuracy")) {
      return new Targets(0.5, 0.5, 0.95);
    }
    return new Targets(
        values.number("targets.accuracy"),
        values.number("targets.yield"),
        values.number("targets.confidence"));
  }
}
