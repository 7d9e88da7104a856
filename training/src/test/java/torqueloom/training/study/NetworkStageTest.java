package torqueloom.training.study;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.deeplearning4j.nn.multilayer.MultiLayerNetwork;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.nd4j.linalg.learning.config.Adam;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.evaluation.NeuronBank;
import torqueloom.training.evaluation.PairLayer;
import torqueloom.training.evaluation.PairWeights;
import torqueloom.training.evaluation.TrainedNetwork;
import torqueloom.training.layer.NetworkBuilder;
import torqueloom.training.layer.NetworkFiles;
import torqueloom.training.learning.TrainingHistory;

/** Which network in a run folder is taken for the trained one. */
class NetworkStageTest {
  private static final StudyPlan PLAN = TinyStudy.plan(Tolerances.NONE, Optional.empty(), 0.7);
  private static final NetworkSettings SHAPE = PLAN.network();

  @TempDir Path folder;
  private Path file;
  private MultiLayerNetwork model;
  private final Map<String, Object> card = new LinkedHashMap<>();

  @BeforeEach
  void train() throws IOException {
    file = folder.resolve(NetworkStage.FILE);
    model = model(SHAPE, PairWeights.straight(11));
    card.put("digest", "d");
    card.put("parameters", NetworkStage.parameterDigest(NetworkBuilder.plain(model, SHAPE)));
    card.put("bestEpoch", 0);
    card.put("epochs", List.of(new TrainingHistory.Epoch(0.5, 0.75, 0.5, 0)));
    NetworkFiles.write(file, model, card);
  }

  private static MultiLayerNetwork model(NetworkSettings settings, float[] curve) {
    final NeuronBank bank = new NeuronBank(1, 2, 1, 9f, new float[] {1f, 0f}, new float[] {0f, 1f});
    final List<PairLayer> layers = TinyStudy.network().layers();
    return new NetworkBuilder(settings, 2, 2, bank, "lib", 2f, 1f, curve, 0, 0, false, 1)
        .build(layers, new Adam(0.01));
  }

  private Optional<NetworkStage.Trained> kept() throws IOException {
    return new NetworkStage(PLAN, null, null, null).kept(file, "d");
  }

  @Test
  void takesTheNetworkThatTrainingWrote() throws IOException {
    final NetworkStage.Trained trained = kept().orElseThrow();
    final TrainedNetwork written = NetworkBuilder.plain(model, SHAPE);
    assertArrayEquals(written.layers().get(0).plus(), trained.network().layers().get(0).plus());
    assertEquals(0.75, trained.history().epochs().get(0).trainAccuracy());
  }

  @Test
  void anotherDigestIsComputedAnew() throws IOException {
    card.put("digest", "e");
    NetworkFiles.write(file, model, card);
    assertTrue(kept().isEmpty());
  }

  @Test
  void editedParametersAreComputedAnew() throws IOException {
    model.params().putScalar(0, 0.125f);
    NetworkFiles.write(file, model, card);
    assertTrue(kept().isEmpty());
  }

  @Test
  void anEditedTuningCurveIsComputedAnew() throws IOException {
    final float[] curve = PairWeights.straight(11);
    curve[5] += 0.01f;
    NetworkFiles.write(file, model(SHAPE, curve), card);
    assertTrue(kept().isEmpty());
  }

  /** The same parameters under another number of slots. */
  @Test
  void anotherShapeIsComputedAnew() throws IOException {
    final NetworkSettings other =
        new NetworkSettings(new int[] {2}, 4, NetworkSettings.Output.WEIGHTED_SUM, 0, 1);
    NetworkFiles.write(file, model(other, PairWeights.straight(11)), card);
    assertTrue(kept().isEmpty());
  }

  @Test
  void aCardThatNamesNoEpochIsComputedAnew() throws IOException {
    for (final Object best : List.of(1, -1, "first")) {
      card.put("bestEpoch", best);
      NetworkFiles.write(file, model, card);
      assertTrue(kept().isEmpty(), "best epoch " + best);
    }
  }

  @Test
  void aFileCutShortIsComputedAnew() throws IOException {
    final byte[] whole = Files.readAllBytes(file);
    for (final int length : new int[] {0, 10, 100, whole.length / 2}) {
      Files.write(file, java.util.Arrays.copyOf(whole, length));
      assertTrue(kept().isEmpty(), length + " bytes");
    }
  }
}
