package torqueloom.training.study;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import torqueloom.model.synapse.SynapseModel;
import torqueloom.model.table.FileContentException;
import torqueloom.model.table.JsonFields;
import torqueloom.model.work.Progress;
import torqueloom.training.data.TaskSettings;
import torqueloom.training.evaluation.NeuronBank;
import torqueloom.training.evaluation.PairWeights;
import torqueloom.training.evaluation.SurrogateTable;
import torqueloom.training.evaluation.TrainedNetwork;
import torqueloom.training.layer.NetworkBuilder;
import torqueloom.training.layer.NetworkFileException;
import torqueloom.training.layer.NetworkFiles;
import torqueloom.training.learning.SurrogateTrainer;
import torqueloom.training.learning.TrainingHistory;

/** Trains the network of a study, or takes it from the run folder when nothing relevant changed. */
final class NetworkStage {
  /** Name of the network file in the run folder. */
  static final String FILE = "network.zip";

  private static final String STAGE = "train/2";

  private final StudyPlan plan;
  private final SynapseModel synapse;
  private final Responses responses;
  private final EncodedTask task;

  NetworkStage(StudyPlan plan, SynapseModel synapse, Responses responses, EncodedTask task) {
    this.plan = plan;
    this.synapse = synapse;
    this.responses = responses;
    this.task = task;
  }

  /**
   * A trained network and the course of its training.
   *
   * @param network plain values
   * @param history course of the training
   * @param digest digest of all that the network depends on
   */
  record Trained(TrainedNetwork network, TrainingHistory history, String digest) {}

  /** Largest drive of the study (unit drives). */
  static float clip(StudyPlan plan) {
    return (float) (plan.protocol().maximumDrive() / plan.synapse().unitDrive());
  }

  Trained run(Path folder, Progress progress) throws IOException {
    final String digest = digest();
    final Path file = folder.resolve(FILE);
    final Optional<Trained> kept = kept(file, digest);
    if (kept.isPresent()) {
      return kept.get();
    }
    final int epochs = plan.training().epochs(task.train().rows());
    final SurrogateTrainer.Result result =
        new SurrogateTrainer(builder(), plan.training())
            .train(
                task.train(),
                task.validation(),
                (epoch, record) ->
                    progress.report(
                        "train",
                        epoch + 1,
                        epochs,
                        String.format(
                            java.util.Locale.ROOT,
                            "loss %.3f, validation %.1f %%",
                            record.loss(),
                            100 * record.validationAccuracy())));
    final Map<String, Object> card = new LinkedHashMap<>();
    card.put("digest", digest);
    card.put("parameters", parameterDigest(result.network()));
    card.put("libraryDigest", responses.library().digest());
    card.put("classes", task.classes());
    card.put("network", plan.network());
    card.put("encoderLower", task.encoder().lower());
    card.put("encoderUpper", task.encoder().upper());
    card.put("bestEpoch", result.history().bestEpoch());
    card.put("epochs", result.history().epochs());
    NetworkFiles.write(file, result.model(), card);
    return new Trained(result.network(), result.history(), digest);
  }

  private NetworkBuilder builder() {
    final NeuronBank bank = responses.referenceBank();
    final double width = plan.training().surrogateWidth();
    final float clip = clip(plan);
    return new NetworkBuilder(
        plan.network(),
        task.train().inputs(),
        task.classes().size(),
        bank,
        responses.library().digest(),
        clip,
        Double.isNaN(width) ? SurrogateTable.automaticWidth(bank) : (float) width,
        curve(),
        synapse.writeError(),
        synapse.pairMismatch(),
        plan.training().variationAware(),
        plan.seed());
  }

  private float[] curve() {
    if (!synapse.limited()) {
      return PairWeights.straight(0);
    }
    final float[] curve = PairWeights.straight(synapse.settings().levels());
    for (int i = 0; i < curve.length; i++) {
      curve[i] = (float) synapse.curve().value(curve[i]);
    }
    return curve;
  }

  private String digest() {
    final Map<String, Object> inputs = new LinkedHashMap<>();
    inputs.put("library", responses.library().digest());
    final TaskSettings settings = plan.task().orElseThrow();
    inputs.put("data", task.split().digests());
    inputs.put("label", settings.label());
    inputs.put(
        "shares", List.of(settings.trainShare(), settings.validationShare(), settings.testShare()));
    inputs.put("network", plan.network());
    inputs.put("training", plan.training());
    inputs.put("clip", clip(plan));
    inputs.put("curve", curve());
    inputs.put("writeError", synapse.writeError());
    inputs.put("mismatch", synapse.pairMismatch());
    inputs.put("seed", plan.seed());
    return StageDigest.of(STAGE, inputs);
  }

  /** Digest of all trained values, so that edited ones are not taken for them. */
  static String parameterDigest(TrainedNetwork network) {
    return StageDigest.of(
        "parameters/2",
        Map.of(
            "layers", network.layers(),
            "curve", network.curve(),
            "gain", network.readoutGain(),
            "library", network.libraryDigest()));
  }

  /** The network in the folder, if it is the one that training would give. */
  Optional<Trained> kept(Path file, String digest) throws IOException {
    if (!Files.exists(file)) {
      return Optional.empty();
    }
    try {
      final NetworkFiles.Content content = NetworkFiles.read(file);
      if (!digest.equals(content.card().get("digest"))) {
        return Optional.empty();
      }
      final JsonFields card = JsonFields.of(content.card(), file.toString());
      final TrainedNetwork network = NetworkBuilder.plain(content.model(), plan.network());
      if (!parameterDigest(network).equals(content.card().get("parameters"))) {
        return Optional.empty();
      }
      return Optional.of(new Trained(network, history(card), digest));
    } catch (NetworkFileException | FileContentException | RuntimeException e) {
      // Damaged or foreign: it is computed anew and replaced.
      return Optional.empty();
    }
  }

  private static TrainingHistory history(JsonFields card) throws FileContentException {
    final List<TrainingHistory.Epoch> epochs = new ArrayList<>();
    for (final JsonFields epoch : card.objects("epochs")) {
      epochs.add(
          new TrainingHistory.Epoch(
              epoch.number("loss"),
              epoch.number("trainAccuracy"),
              epoch.number("validationAccuracy"),
              epoch.number("clippedShare")));
    }
    final int best = card.integer("bestEpoch");
    Objects.checkIndex(best, epochs.size());
    return new TrainingHistory(List.copyOf(epochs), best);
  }
}
