package torqueloom.model.response;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;
import torqueloom.model.random.Purpose;

class ResponseMatcherTest {
  private static final Calibration CALIBRATION =
      CalibratorTest.calibration(FakeNeuron.NOMINAL, 40, 11);
  private static final ResponseLibrary LIBRARY = FakeNeuron.library(CALIBRATION);

  /**
   * Derived here: away from zero counts the mean count is linear with slope -1/SPACING in the
   * threshold and -1/(2 SPACING) in the imbalance (positive after trim), so the weights stand about
   * 2:1; drives without counts and the rounding of counts to whole numbers spread the ratio.
   */
  @Test
  void weightsFollowTheEffectOnCounts() {
    final double[] weights = LIBRARY.featureWeights();
    assertEquals(0, weights[2], "a feature without spread");
    assertTrue(weights[1] > 0.25 && weights[1] < 0.9, "threshold: " + weights[1]);
    assertTrue(weights[0] < weights[1], "imbalance: " + weights[0]);
    assertTrue(LIBRARY.matchingError() < 0.05, "error " + LIBRARY.matchingError());
  }

  @Test
  void everyInstanceIsNearestToItself() {
    final ResponseMatcher matcher = ResponseMatcher.of(LIBRARY);
    for (int t = 0; t < 3; t++) {
      for (int i = 0; i < 40; i++) {
        final NeuronChoice choice =
            matcher.choose(t, CALIBRATION.device(i, LIBRARY.temperatures().get(t)));
        assertEquals(i, choice.instance());
        final double torque = LIBRARY.instances().get(40 * t + i).torquePerDrive();
        assertEquals(
            torque / LIBRARY.instances().get(40 * t).torquePerDrive(), choice.driveFactor());
      }
    }
  }

  /** A drawn neuron's mean count through table and factor is near its own law's. */
  @Test
  void aMatchedNeuronAnswersLikeItself() {
    final ResponseMatcher matcher = ResponseMatcher.of(LIBRARY);
    final CountTables tables = CountTables.of(LIBRARY);
    double sum = 0;
    for (int chip = 0; chip < 50; chip++) {
      final FakeNeuron own =
          (FakeNeuron)
              CalibratorTest.TRIM.apply(
                  CalibratorTest.TOLERANCES.draw(
                      FakeNeuron.NOMINAL, 3, Purpose.CHIP_NEURON, chip, 0, 1),
                  300,
                  0.5);
      final NeuronChoice choice = matcher.choose(1, own);
      final CountTable table = tables.table(1, choice.instance());
      final double place = 8 * choice.driveFactor() / table.maximumDrive() * (table.points() - 1);
      final int cell = (int) place;
      final double mean =
          table.mean()[cell] + (place - cell) * (table.mean()[cell + 1] - table.mean()[cell]);
      sum += Math.abs(mean - ownMean(own.center(300, 8, Double.NaN)));
    }
    assertTrue(sum / 50 < 0.08, "mean difference " + sum / 50);
  }

  private static double ownMean(double center) {
    double mean = 0;
    final int points = 4000;
    for (int i = 0; i < points; i++) {
      final double z = new NormalDistribution().inverseCumulativeProbability((i + 0.5) / points);
      mean += Math.max(0, Math.floor(center + FakeNeuron.NOISE * z + 1)) / points;
    }
    return mean;
  }

  @Test
  void tablesShareOneGrid() {
    final CountTables tables = CountTables.of(LIBRARY);
    final CountTable first = tables.table(0, 0);
    for (int t = 0; t < 3; t++) {
      for (int i = 0; i < tables.instances(); i++) {
        final CountTable table = tables.table(t, i);
        assertEquals(first.maximumDrive(), table.maximumDrive());
        assertEquals(first.maximumCount(), table.maximumCount());
        assertEquals(24, table.points());
      }
    }
    assertEquals(1, tables.temperatureIndex(300));
    assertThrows(IllegalArgumentException.class, () -> tables.temperatureIndex(301));
  }

  /** The table holds the curve's shares; its mean is N less the sum of the cumulative ones. */
  @Test
  void tableHoldsTheCurve() {
    final CountTables tables = CountTables.of(LIBRARY);
    final ResponseCurve curve = LIBRARY.curves().get(3);
    final CountTable table = tables.table(0, 3);
    for (int d = 0; d < 24; d++) {
      assertEquals((float) curve.probability(d, 0), table.cumulative()[d * table.maximumCount()]);
      double mean = table.maximumCount();
      for (int k = 0; k < table.maximumCount(); k++) {
        mean -= table.cumulative()[d * table.maximumCount() + k];
      }
      assertEquals(mean, table.mean()[d], 1e-5);
    }
  }

  /** Derived here: slopes 1/2 and 0 at the two drives, root mean square sqrt(1/8). */
  @Test
  void regressionOnThreeInstances() {
    final double[][][] features = {{{1, 5}, {3, 5}, {2, 5}}};
    final double[][][] counts = {{{0, 1}, {1, 1}, {0, 2}}};
    assertArrayEquals(
        new double[] {Math.sqrt(0.125), 0}, FeatureWeights.of(features, counts), 1e-12);
  }

  @Test
  void fewInstancesFallBackToTheSpread() {
    final double[][][] features = {{{1, 5}, {3, 5}}};
    final double[][][] counts = {{{0, 1}, {1, 1}}};
    assertArrayEquals(new double[] {1, 0}, FeatureWeights.of(features, counts), 1e-15);
  }

  /** Two features that say the same share the effect through the ridge: half the slope each. */
  @Test
  void twinFeaturesShareTheEffect() {
    final double[][][] features = {{{1, 10}, {3, 30}, {2, 20}, {5, 50}}};
    final double[][][] counts = {{{1}, {3}, {2}, {5}}};
    assertArrayEquals(new double[] {0.5, 0.05}, FeatureWeights.of(features, counts), 1e-4);
  }
}
