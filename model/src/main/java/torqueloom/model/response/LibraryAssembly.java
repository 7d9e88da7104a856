package torqueloom.model.response;

import java.util.Comparator;
import java.util.List;

/** Puts calibrated units together: feature weights, matching error, one library. */
final class LibraryAssembly {
  private LibraryAssembly() {}

  /**
   * @param calibration what was calibrated
   * @param digest of the calibration
   * @param units all units in any order
   * @param carryOver of the nominal device
   */
  static ResponseLibrary library(
      Calibration calibration, String digest, List<CalibratedUnit> units, CarryOver carryOver) {
    final List<Double> temperatures = calibration.temperatures();
    final List<CalibratedUnit> ordered =
        units.stream()
            .sorted(
                Comparator.<CalibratedUnit>comparingInt(
                        u -> temperatures.indexOf(u.instance().temperatureKelvin()))
                    .thenComparingInt(u -> u.instance().instance()))
            .toList();
    final List<LibraryInstance> instances = ordered.stream().map(CalibratedUnit::instance).toList();
    final List<ResponseCurve> curves = ordered.stream().map(CalibratedUnit::curve).toList();
    final double[][][] meanCounts = meanCounts(temperatures, curves);
    // At the reference alone: another temperature in the study then moves no match at this one.
    final int at = temperatures.indexOf(calibration.referenceTemperature());
    final double[] weights =
        FeatureWeights.of(
            new double[][][] {features(ResponseMatcher.byTemperature(temperatures, instances))[at]},
            new double[][][] {meanCounts[at]});
    final long steps = units.stream().mapToLong(CalibratedUnit::replicaSteps).sum();
    final double reference = calibration.referenceTemperature();
    final ResponseLibrary library =
        new ResponseLibrary(
            digest,
            calibration.nominal().driveUnit(),
            temperatures,
            calibration.nominal().featureNames(),
            weights,
            instances,
            curves,
            carryOver.totalVariation(),
            carryOver.floor(),
            Double.NaN,
            steps + carryOver.replicaSteps(),
            calibration.device(0, reference).simulator(reference, calibration.protocol()).kernel());
    return library.withMatchingError(matchingError(library, meanCounts));
  }

  /**
   * Mean absolute difference in mean count between an instance and the other instance nearest to
   * it, over instances, drives and temperatures; NaN with one instance. The counting error of both
   * curves is in it.
   */
  private static double matchingError(ResponseLibrary library, double[][][] meanCounts) {
    final ResponseMatcher matcher = ResponseMatcher.of(library);
    double sum = 0;
    long terms = 0;
    for (int t = 0; t < meanCounts.length; t++) {
      for (int i = 0; i < meanCounts[t].length; i++) {
        final int other = matcher.nearest(t, matcher.instance(t, i).features(), i);
        for (int d = 0; other >= 0 && d < meanCounts[t][i].length; d++) {
          sum += Math.abs(meanCounts[t][i][d] - meanCounts[t][other][d]);
          terms++;
        }
      }
    }
    return sum / terms;
  }

  private static double[][][] features(LibraryInstance[][] instances) {
    final double[][][] features = new double[instances.length][instances[0].length][];
    for (int t = 0; t < instances.length; t++) {
      for (int i = 0; i < instances[t].length; i++) {
        features[t][i] = instances[t][i].features();
      }
    }
    return features;
  }

  /** Mean counts as [temperature][instance][drive]. */
  private static double[][][] meanCounts(List<Double> temperatures, List<ResponseCurve> curves) {
    final double[][][] means =
        new double[temperatures.size()][curves.size() / temperatures.size()][];
    for (final ResponseCurve curve : curves) {
      final double[] row = new double[curve.drive().length];
      for (int d = 0; d < row.length; d++) {
        row[d] = curve.meanCount(d);
      }
      means[temperatures.indexOf(curve.temperatureKelvin())][curve.instance()] = row;
    }
    return means;
  }
}
