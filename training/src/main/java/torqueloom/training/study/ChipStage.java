package torqueloom.training.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import torqueloom.model.synapse.SynapseModel;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.model.tolerance.Trim;
import torqueloom.model.work.Engine;
import torqueloom.model.work.Stage;
import torqueloom.model.work.WorkUnit;
import torqueloom.training.chip.ChipCodec;
import torqueloom.training.chip.ChipEvaluator;
import torqueloom.training.chip.ChipFactory;
import torqueloom.training.chip.ChipOutcome;

/** Runs chips as work units; one unit is one chip at all temperatures asked for. */
final class ChipStage {
  private static final String STAGE = "chips/1";

  /** Bootstrap replicates: with 1000 the 2.5 % point rests on some 25 of them. */
  private static final int REPLICATES = 1000;

  private final StudyPlan plan;
  private final SynapseModel synapse;
  private final NetworkStage.Trained trained;
  private final EncodedTask task;
  private final Engine engine;

  ChipStage(
      StudyPlan plan,
      SynapseModel synapse,
      NetworkStage.Trained trained,
      EncodedTask task,
      Engine engine) {
    this.plan = plan;
    this.synapse = synapse;
    this.trained = trained;
    this.task = task;
    this.engine = engine;
  }

  /**
   * Which chips are drawn.
   *
   * @param name name of the stage in progress and store
   * @param responses library whose instances answer
   * @param tolerances of the device
   * @param trim of the neurons
   * @param synapseSpread whether the synapses have their tolerances
   * @param temperatureIndices temperatures, as indices into the library's
   * @param chips number of chips
   */
  record Draw(
      String name,
      Responses responses,
      Tolerances tolerances,
      Optional<Trim> trim,
      boolean synapseSpread,
      List<Integer> temperatureIndices,
      int chips) {}

  /** Outcomes as [chip][temperature]. */
  List<List<ChipOutcome>> run(Draw draw) throws InterruptedException {
    final ChipEvaluator evaluator = evaluator(draw);
    final List<WorkUnit<List<ChipOutcome>>> units = new ArrayList<>();
    IntStream.range(0, draw.chips())
        .forEach(chip -> units.add(WorkUnit.of("chip=" + chip, () -> evaluator.evaluate(chip))));
    return engine.run(new Stage<>(draw.name(), digest(draw), units, new ChipCodec()));
  }

  /** Draws the chips of a draw, for surveys of their devices. */
  ChipFactory factory(Draw draw) {
    return new ChipFactory(
        plan.device(),
        draw.tolerances(),
        draw.trim(),
        synapse,
        draw.synapseSpread(),
        draw.responses().matcher(),
        draw.responses().library().temperatures(),
        plan.seed());
  }

  private ChipEvaluator evaluator(Draw draw) {
    return new ChipEvaluator(
        factory(draw),
        trained.network(),
        draw.responses().banks(),
        draw.temperatureIndices(),
        NetworkStage.clip(plan),
        task.test().x(),
        task.test().labels(),
        plan.evaluation().noisePasses());
  }

  private String digest(Draw draw) {
    final Map<String, Object> inputs = new LinkedHashMap<>();
    inputs.put("network", trained.digest());
    inputs.put("library", draw.responses().library().digest());
    inputs.put("tolerances", draw.tolerances().spreads());
    inputs.put("trim", draw.trim().map(t -> (Object) t).orElse("none"));
    inputs.put("synapseSpread", draw.synapseSpread());
    inputs.put("mismatch", synapse.pairMismatch());
    inputs.put("chipGain", synapse.chipGainError());
    inputs.put("writeVerify", synapse.settings().writeVerify());
    inputs.put("temperatures", draw.temperatureIndices());
    inputs.put("passes", plan.evaluation().noisePasses());
    return StageDigest.of(STAGE, inputs);
  }

  /** Accuracies of all chips at one temperature, [chips]. */
  static double[] accuracies(List<List<ChipOutcome>> chips, int temperature) {
    return chips.stream().mapToDouble(chip -> chip.get(temperature).accuracy()).toArray();
  }

  /** Statistics of all chips at one temperature. */
  TemperatureOutcome outcome(
      List<List<ChipOutcome>> chips, int temperature, double kelvin, int threads) {
    final double[] accuracies = accuracies(chips, temperature);
    final Targets targets = plan.targets();
    final double confidence = targets.confidence();
    final int passing = passing(accuracies, targets.accuracy());
    final Interval onThisSet = ProportionInterval.anytime(passing, accuracies.length, confidence);
    return new TemperatureOutcome(
        kelvin,
        accuracies,
        QuantileInterval.anytime(accuracies, 0.5, confidence, 0, 1),
        deviation(accuracies),
        QuantileInterval.of(accuracies, 0.05),
        QuantileInterval.of(accuracies, 0.95),
        Math.sqrt(
            chips.stream().mapToDouble(c -> c.get(temperature).passVariance()).sum()
                / chips.size()),
        onThisSet,
        onNewCases(chips, temperature, onThisSet, threads),
        ProportionInterval.wilson(passing, accuracies.length, confidence),
        chips.stream().mapToDouble(c -> c.get(temperature).clippedShare()).sum() / chips.size());
  }

  /** Chips that reach a target; an accuracy equal to it but for rounding reaches it. */
  static int passing(double[] accuracies, double target) {
    return (int) Arrays.stream(accuracies).filter(a -> a >= target - 1e-12).count();
  }

  /**
   * The pigeonhole bootstrap, widened to the interval on this test set: when all chips stand clear
   * of the target it would claim certainty from however few chips.
   */
  private Interval onNewCases(
      List<List<ChipOutcome>> chips, int temperature, Interval onThisSet, int threads) {
    final byte[][] correct =
        chips.stream().map(c -> c.get(temperature).correct()).toArray(byte[][]::new);
    final Interval bootstrap =
        PigeonholeBootstrap.run(
                correct,
                plan.evaluation().noisePasses(),
                plan.targets().accuracy(),
                plan.targets().confidence(),
                REPLICATES,
                plan.seed(),
                threads)
            .yield();
    return new Interval(
        onThisSet.estimate(),
        Math.min(bootstrap.low(), onThisSet.low()),
        Math.max(bootstrap.high(), onThisSet.high()));
  }

  private static double deviation(double[] values) {
    if (values.length < 2) {
      return 0;
    }
    final double mean = Arrays.stream(values).sum() / values.length;
    final double squares = Arrays.stream(values).map(v -> (v - mean) * (v - mean)).sum();
    return Math.sqrt(squares / (values.length - 1));
  }
}
