package torqueloom.training.layer;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Set;
import torqueloom.model.table.JsonReader;

/** Checks the class names in a network's configuration against those a network file may name. */
final class ConfigurationCheck {
  private static final Set<String> CLASSES =
      Set.of(
          DeviceLayer.class.getName(),
          CountReadout.class.getName(),
          CountSum.class.getName(),
          "org.deeplearning4j.nn.conf.layers.LossLayer",
          "org.deeplearning4j.nn.conf.layers.DenseLayer",
          "org.deeplearning4j.nn.conf.layers.OutputLayer",
          "org.deeplearning4j.nn.conf.layers.DropoutLayer",
          "org.deeplearning4j.nn.conf.dropout.Dropout",
          "org.deeplearning4j.nn.weights.WeightInitXavier",
          "org.deeplearning4j.nn.weights.WeightInitRelu");

  /** Packages of value classes without side effects. */
  private static final List<String> PACKAGES =
      List.of(
          "org.nd4j.linalg.activations.impl.",
          "org.nd4j.linalg.lossfunctions.impl.",
          "org.nd4j.linalg.learning.config.",
          "org.nd4j.linalg.learning.regularization.",
          "org.nd4j.linalg.schedule.");

  private static final Set<String> TYPE_KEYS = Set.of("@class", "@type", "class", "type");

  private ConfigurationCheck() {}

  /**
   * @param text the configuration
   * @param path file named in messages
   * @throws NetworkFileException naming the first class that is not allowed
   */
  static void check(String text, Path path) throws NetworkFileException {
    try {
      walk(JsonReader.parse(text, path + "!configuration.json"), path);
    } catch (NetworkFileException e) {
      throw e;
    } catch (IOException e) {
      throw new NetworkFileException(path, e.getMessage());
    }
  }

  private static void walk(Object value, Path path) throws NetworkFileException {
    if (value instanceof Map<?, ?> map) {
      for (final Map.Entry<?, ?> entry : map.entrySet()) {
        if (TYPE_KEYS.contains(entry.getKey()) && entry.getValue() instanceof String name) {
          checkName(name, path);
        }
        walk(entry.getValue(), path);
      }
    } else if (value instanceof List<?> list) {
      for (final Object item : list) {
        walk(item, path);
      }
    }
  }

  private static void checkName(String name, Path path) throws NetworkFileException {
    // Only words with a dot are class names; the library also writes plain enum words here.
    if (name.indexOf('.') >= 0 && !CLASSES.contains(name) && !inPackage(name)) {
      throw new NetworkFileException(path, "the configuration names the class " + name);
    }
  }

  /** Whether a class stands directly in one of the packages. */
  private static boolean inPackage(String name) {
    return PACKAGES.stream().anyMatch(p -> name.startsWith(p) && name.indexOf('.', p.length()) < 0);
  }
}
