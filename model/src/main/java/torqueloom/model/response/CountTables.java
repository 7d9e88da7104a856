package torqueloom.model.response;

import java.util.List;

/**
 * The library's quiet-state responses (no pulse in the slot before, first rest level) as tables for
 * the network kernels: one a temperature and instance. The grid is the calibration's own uniform
 * grid of drives, so between its points the kernels' linear interpolation is all there is and
 * nothing is resampled. All tables have the same largest count.
 */
public final class CountTables {
  private final List<Double> temperatures;
  private final CountTable[][] tables;

  private CountTables(List<Double> temperatures, CountTable[][] tables) {
    this.temperatures = temperatures;
    this.tables = tables;
  }

  /**
   * @param library with one quiet curve an instance and temperature
   * @throws IllegalArgumentException if such a curve is missing or its drives are not uniform from 0
   */
  public static CountTables of(ResponseLibrary library) {
    int most = 1;
    int instances = 0;
    for (final ResponseCurve curve : library.curves()) {
      if (isQuiet(curve)) {
        most = Math.max(most, curve.maximumCount());
        instances = Math.max(instances, curve.instance() + 1);
      }
    }
    final CountTable[][] tables = new CountTable[library.temperatures().size()][instances];
    for (final ResponseCurve curve : library.curves()) {
      if (isQuiet(curve)) {
        final int t = library.temperatures().indexOf(curve.temperatureKelvin());
        tables[t][curve.instance()] = table(curve, most);
      }
    }
    requireComplete(tables);
    return new CountTables(library.temperatures(), tables);
  }

  /**
   * @param temperatureIndex place in {@link ResponseLibrary#temperatures()}
   * @param instance 0 for the nominal device
   */
  public CountTable table(int temperatureIndex, int instance) {
    return tables[temperatureIndex][instance];
  }

  /** Number of instances, the nominal one included. */
  public int instances() {
    return tables[0].length;
  }

  /** Temperatures (K), in the library's order. */
  public List<Double> temperatures() {
    return temperatures;
  }

  /**
   * Place of a temperature.
   *
   * @throws IllegalArgumentException if the library does not hold it
   */
  public int temperatureIndex(double temperatureKelvin) {
    final int index = temperatures.indexOf(temperatureKelvin);
    if (index < 0) {
      throw new IllegalArgumentException(
          "the response library holds " + temperatures + " K, not " + temperatureKelvin + " K");
    }
    return index;
  }

  /** Whether a curve starts after a quiet slot in the first rest level. */
  static boolean isQuiet(ResponseCurve curve) {
    return curve.restLevel() == 0 && Double.isNaN(curve.previousDrive());
  }

  /** One curve as a table; N is the largest count of the table. */
  static CountTable table(ResponseCurve curve, int maximumCount) {
    final double[] drive = curve.drive();
    final int points = drive.length;
    requireUniform(drive);
    final float[] cumulative = new float[points * maximumCount];
    final float[] mean = new float[points];
    final float[] latency = new float[points];
    for (int d = 0; d < points; d++) {
      long sum = 0;
      for (int k = 0; k < maximumCount; k++) {
        sum += curve.trialsWith(d, k);
        cumulative[d * maximumCount + k] = (float) ((double) sum / curve.trials()[d]);
      }
      mean[d] = (float) curve.meanCount(d);
      latency[d] = (float) curve.latencySeconds()[d];
    }
    return new CountTable(drive[points - 1], points, maximumCount, cumulative, mean, latency);
  }

  private static void requireUniform(double[] drive) {
    final int last = drive.length - 1;
    for (int d = 0; d <= last; d++) {
      if (!(Math.abs(drive[d] - drive[last] * d / last) <= 1e-9 * drive[last])) {
        throw new IllegalArgumentException(
            "a count table needs drives on a uniform grid from 0, point " + d + " is " + drive[d]);
      }
    }
  }

  private static void requireComplete(CountTable[][] tables) {
    for (int t = 0; t < tables.length; t++) {
      for (int i = 0; i < tables[t].length; i++) {
        if (tables[t][i] == null) {
          throw new IllegalArgumentException(
              "the response library lacks instance " + i + " at its temperature " + t);
        }
      }
    }
    if (tables.length == 0 || tables[0].length == 0) {
      throw new IllegalArgumentException("the response library is empty");
    }
  }
}
