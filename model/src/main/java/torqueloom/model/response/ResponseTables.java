package torqueloom.model.response;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import torqueloom.model.table.CsvFiles;
import torqueloom.model.table.NpyFiles;

/** Response curves as tables for other programs: CSV and NumPy arrays. */
public final class ResponseTables {
  private ResponseTables() {}

  /**
   * Writes {@code response.csv}, one row a curve and drive: instance, temperature, rest level,
   * previous drive (empty after a quiet slot), drive, trials, mean count, mean latency, jitter, and
   * for each n P(n) with its 95 % Wilson interval.
   *
   * @param path file to write
   * @throws IOException if it cannot be written
   */
  public static void writeCsv(Path path, ResponseLibrary library) throws IOException {
    final int most = maximumCount(library);
    final List<String> header =
        new ArrayList<>(
            List.of(
                "instance",
                "temperatureKelvin",
                "restLevel",
                "previousDrive",
                "drive",
                "trials",
                "meanCount",
                "latencySeconds",
                "jitterSeconds"));
    for (int n = 0; n <= most; n++) {
      header.addAll(List.of("p" + n, "p" + n + "Low", "p" + n + "High"));
    }
    final List<List<Object>> rows = new ArrayList<>();
    for (final ResponseCurve curve : library.curves()) {
      for (int d = 0; d < curve.drive().length; d++) {
        rows.add(row(curve, d, most));
      }
    }
    CsvFiles.write(path, header, rows);
  }

  private static List<Object> row(ResponseCurve curve, int d, int most) {
    final List<Object> row =
        new ArrayList<>(
            Arrays.asList(
                curve.instance(),
                curve.temperatureKelvin(),
                curve.restLevel(),
                curve.previousDrive(),
                curve.drive()[d],
                curve.trials()[d],
                curve.meanCount(d),
                curve.latencySeconds()[d],
                curve.jitterSeconds()[d]));
    for (int n = 0; n <= most; n++) {
      final WilsonInterval interval = WilsonInterval.of(curve.trialsWith(d, n), curve.trials()[d]);
      row.addAll(List.of(curve.probability(d, n), interval.low(), interval.high()));
    }
    return row;
  }

  /**
   * Writes P(n) after a quiet slot as float64 [temperatures][instances][drives][n], and the drives as
   * float64 [temperatures][instances][drives].
   *
   * @param probabilities file for P(n), e.g. {@code response.npy}
   * @param drives file for the drives, e.g. {@code response-drives.npy}
   * @throws IOException if a file cannot be written
   */
  public static void writeNpy(Path probabilities, Path drives, ResponseLibrary library)
      throws IOException {
    final int temperatures = library.temperatures().size();
    final int instances = library.instances().size() / temperatures;
    final ResponseCurve[][] curves = CountTables.quietCurves(library, instances);
    final int points = curves[0][0].drive().length;
    final int width = maximumCount(library) + 1;
    final double[] p = new double[temperatures * instances * points * width];
    final double[] drive = new double[temperatures * instances * points];
    int place = 0;
    for (final ResponseCurve[] row : curves) {
      for (final ResponseCurve curve : row) {
        for (int d = 0; d < points; d++) {
          drive[place] = curve.drive()[d];
          for (int n = 0; n < width; n++) {
            p[place * width + n] = curve.probability(d, n);
          }
          place++;
        }
      }
    }
    NpyFiles.write(probabilities, p, temperatures, instances, points, width);
    NpyFiles.write(drives, drive, temperatures, instances, points);
  }

  private static int maximumCount(ResponseLibrary library) {
    return library.curves().stream().mapToInt(ResponseCurve::maximumCount).max().orElse(0);
  }
}
