package torqueloom.model.response;

import java.util.List;
import torqueloom.model.device.DeviceKind;

/**
 * Finds the library instance that answers for a drawn device: the one with the smallest
 *
 * <pre>  sum over features k of (w_k (x_k - y_k))^2</pre>
 *
 * with the library's feature weights ({@link FeatureWeights}), so that the distance is, to first
 * order, a difference in mean counts. Features hold no torque: drives are rescaled instead.
 */
public final class ResponseMatcher {
  private final List<Double> temperatures;
  private final double[] weights;
  private final LibraryInstance[][] instances;

  private ResponseMatcher(
      List<Double> temperatures, double[] weights, LibraryInstance[][] instances) {
    this.temperatures = temperatures;
    this.weights = weights;
    this.instances = instances;
  }

  /** @throws IllegalArgumentException if an instance is missing at a temperature */
  public static ResponseMatcher of(ResponseLibrary library) {
    return new ResponseMatcher(
        library.temperatures(),
        library.featureWeights(),
        byTemperature(library.temperatures(), library.instances()));
  }

  /** Instances sorted into [temperature][instance]. */
  static LibraryInstance[][] byTemperature(
      List<Double> temperatures, List<LibraryInstance> instances) {
    final int count = instances.stream().mapToInt(LibraryInstance::instance).max().orElse(-1) + 1;
    final LibraryInstance[][] table = new LibraryInstance[temperatures.size()][count];
    for (final LibraryInstance instance : instances) {
      table[temperatures.indexOf(instance.temperatureKelvin())][instance.instance()] = instance;
    }
    for (final LibraryInstance[] row : table) {
      for (int i = 0; i < count; i++) {
        if (row[i] == null) {
          throw new IllegalArgumentException("the response library lacks instance " + i);
        }
      }
    }
    return table;
  }

  /**
   * The nearest instance; of equally near ones the first.
   *
   * @param temperatureIndex place in {@link ResponseLibrary#temperatures()}
   * @param features as {@link DeviceKind#features} at that temperature, after trim
   */
  public int nearest(int temperatureIndex, double[] features) {
    return nearest(temperatureIndex, features, -1);
  }

  /** The nearest instance other than one; -1 excludes none. */
  int nearest(int temperatureIndex, double[] features, int excluded) {
    int best = -1;
    double least = Double.POSITIVE_INFINITY;
    for (final LibraryInstance candidate : instances[temperatureIndex]) {
      final double distance = distance(features, candidate.features());
      if (candidate.instance() != excluded && (best < 0 || distance < least)) {
        best = candidate.instance();
        least = distance;
      }
    }
    return best;
  }

  /**
   * Instance and drive factor for a drawn device at a temperature.
   *
   * @param temperatureIndex place in {@link ResponseLibrary#temperatures()}
   * @param device the neuron after trim at that temperature
   */
  public NeuronChoice choose(int temperatureIndex, DeviceKind device) {
    final double temperature = temperatures.get(temperatureIndex);
    final int instance = nearest(temperatureIndex, device.features(temperature));
    final double torque = device.torquePerDrive(temperature);
    return new NeuronChoice(instance, torque / instances[temperatureIndex][0].torquePerDrive());
  }

  /** One library instance at one temperature. */
  public LibraryInstance instance(int temperatureIndex, int instance) {
    return instances[temperatureIndex][instance];
  }

  private double distance(double[] x, double[] y) {
    double sum = 0;
    for (int k = 0; k < weights.length; k++) {
      final double difference = weights[k] * (x[k] - y[k]);
      sum += difference * difference;
    }
    return sum;
  }
}
