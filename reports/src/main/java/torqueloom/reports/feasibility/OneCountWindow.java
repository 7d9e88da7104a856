package torqueloom.reports.feasibility;

import torqueloom.model.response.ResponseCurve;

/**
 * Where a device answers with exactly one count.
 *
 * @param best largest share of exactly one count at any drive (1)
 * @param bestDrive the drive where it stands (drive unit)
 * @param low lowest calibrated drive of the widest run with a share of at least {@link
 *     StudyFacts#CLEAN}, NaN without one
 * @param high highest drive of that run, NaN without one
 * @param mostCounts largest mean count at any drive (1)
 */
record OneCountWindow(double best, double bestDrive, double low, double high, double mostCounts) {
  static OneCountWindow of(ResponseCurve curve) {
    double best = 0;
    double bestDrive = Double.NaN;
    double most = 0;
    for (int i = 0; i < curve.drive().length; i++) {
      if (curve.probability(i, 1) > best) {
        best = curve.probability(i, 1);
        bestDrive = curve.drive()[i];
      }
      most = Math.max(most, curve.trials()[i] > 0 ? curve.meanCount(i) : 0);
    }
    final double[] run = widestRun(curve);
    return new OneCountWindow(best, bestDrive, run[0], run[1], most);
  }

  boolean clean() {
    return best >= StudyFacts.CLEAN;
  }

  private static double[] widestRun(ResponseCurve curve) {
    double[] widest = {Double.NaN, Double.NaN};
    int start = -1;
    for (int i = 0; i <= curve.drive().length; i++) {
      final boolean inside =
          i < curve.drive().length && curve.probability(i, 1) >= StudyFacts.CLEAN;
      if (inside && start < 0) {
        start = i;
      } else if (!inside && start >= 0) {
        final double width = curve.drive()[i - 1] - curve.drive()[start];
        if (!(width <= widest[1] - widest[0])) {
          widest = new double[] {curve.drive()[start], curve.drive()[i - 1]};
        }
        start = -1;
      }
    }
    return widest;
  }
}
