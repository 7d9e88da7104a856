package torqueloom.training.layer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import org.deeplearning4j.nn.conf.NeuralNetConfiguration;
import org.deeplearning4j.nn.conf.layers.DenseLayer;
import org.deeplearning4j.nn.conf.layers.OutputLayer;
import org.deeplearning4j.nn.multilayer.MultiLayerNetwork;
import org.deeplearning4j.util.ModelSerializer;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.nd4j.linalg.activations.Activation;
import org.nd4j.linalg.api.ndarray.INDArray;
import org.nd4j.linalg.factory.Nd4j;
import org.nd4j.linalg.learning.config.Adam;
import org.nd4j.linalg.lossfunctions.LossFunctions.LossFunction;

/**
 * The build leaves out libraries that DL4J asks for (see DEVELOPERS.md): a network must still
 * train, save and load.
 */
class TrimmedLibraryTest {

  @BeforeAll
  static void library() {
    NativeCheck.ensure();
  }

  /** The exclusive or, which no network without a working hidden layer can learn. */
  @Test
  void aNetworkTrainsSavesAndLoads(@TempDir Path folder) throws IOException {
    final INDArray inputs = Nd4j.createFromArray(new float[][] {{0, 0}, {0, 1}, {1, 0}, {1, 1}});
    final INDArray labels = Nd4j.createFromArray(new float[][] {{1, 0}, {0, 1}, {0, 1}, {1, 0}});
    final MultiLayerNetwork network = network();
    for (int i = 0; i < 300; i++) {
      network.fit(inputs, labels);
    }
    assertEquals(labels.argMax(1), network.output(inputs).argMax(1));

    final Path file = folder.resolve("network.zip");
    ModelSerializer.writeModel(network, file.toFile(), true);
    final MultiLayerNetwork loaded = ModelSerializer.restoreMultiLayerNetwork(file.toFile(), true);
    assertEquals(network.params(), loaded.params());
    assertEquals(network.output(inputs), loaded.output(inputs));

    loaded.fit(inputs, labels);
    assertTrue(loaded.score() < 0.1, () -> "loss after loading: " + loaded.score());
  }

  private static MultiLayerNetwork network() {
    final MultiLayerNetwork network =
        new MultiLayerNetwork(
            new NeuralNetConfiguration.Builder()
                .seed(1)
                .updater(new Adam(0.05))
                .list()
                .layer(new DenseLayer.Builder().nIn(2).nOut(8).activation(Activation.TANH).build())
                .layer(
                    new OutputLayer.Builder(LossFunction.MCXENT)
                        .nIn(8)
                        .nOut(2)
                        .activation(Activation.SOFTMAX)
                        .build())
                .build());
    network.init();
    return network;
  }
}
