package torqueloom.model.response;

import java.util.List;

/**
 * The library's quiet-state responses (no pulse in the slot before, first rest level) as tables for
 * the network kernels: one a temperature and instance.
 *
 * <p>Every instance was calibrated over the same torque fields, each with drives of its own. The
 * tables' common axis is that torque field as a drive of the nominal device; a neuron's drive is
 * brought onto it by {@link NeuronChoice#driveFactor}. The grid is the calibration's own uniform
 * grid, so nothing is resampled. All tables have the same grid and the same largest count.
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
   * @throws IllegalArgumentException if such a curve is missing, its drives are not uniform from 0,
   *     or it does not cover the nominal device's torque fields
   */
  public static CountTables of(ResponseLibrary library) {
    final int most = Math.max(1, maximumCount(library));
    final LibraryInstance[][] instances =
        ResponseMatcher.byTemperature(library.temperatures(), library.instances());
    final ResponseCurve[][] curves = quietCurves(library, instances[0].length);
    final CountTable[][] tables = new CountTable[curves.length][instances[0].length];
    for (int t = 0; t < tables.length; t++) {
      final double[] nominal = curves[t][0].drive();
      final double axis = nominal[nominal.length - 1];
      for (int i = 0; i < tables[t].length; i++) {
        final double own = curves[t][i].drive()[nominal.length - 1];
        final double ratio = instances[t][i].torquePerDrive() / instances[t][0].torquePerDrive();
        if (!(Math.abs(own * ratio - axis) <= 1e-9 * axis)) {
          throw new IllegalArgumentException(
              "instance " + i + " does not cover the nominal device's torque fields");
        }
        tables[t][i] = table(curves[t][i], axis, most);
      }
    }
    return new CountTables(library.temperatures(), tables);
  }

  private static int maximumCount(ResponseLibrary library) {
    return library.curves().stream()
        .filter(CountTables::isQuiet)
        .mapToInt(ResponseCurve::maximumCount)
        .max()
        .orElse(0);
  }

  /** Quiet curves as [temperature][instance], complete. */
  static ResponseCurve[][] quietCurves(ResponseLibrary library, int instances) {
    final ResponseCurve[][] table = new ResponseCurve[library.temperatures().size()][instances];
    for (final ResponseCurve curve : library.curves()) {
      if (isQuiet(curve)) {
        table[library.temperatures().indexOf(curve.temperatureKelvin())][curve.instance()] = curve;
      }
    }
    for (final ResponseCurve[] row : table) {
      for (int i = 0; i < instances; i++) {
        if (row[i] == null) {
          throw new IllegalArgumentException("the response library lacks a curve of instance " + i);
        }
      }
    }
    return table;
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

  private static CountTable table(ResponseCurve curve, double axis, int maximumCount) {
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
    return new CountTable(axis, points, maximumCount, cumulative, mean, latency);
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
}
