package torqueloom.model.response;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;
import torqueloom.model.device.DriveProtocol;
import torqueloom.model.tolerance.Spread;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.model.tolerance.Trim;

class CalibratorTest {
  static final DriveProtocol PROTOCOL = new DriveProtocol(0, false, 10, 0.5e-9, 10e-9);
  static final Tolerances TOLERANCES =
      new Tolerances(
          Map.of(
              "threshold", new Spread(0.05, 0.02),
              "anisotropy", new Spread(0.01, 0.01),
              "torque", new Spread(0.03, 0.01)));
  static final Trim TRIM = new Trim(6, 65, 300, true);

  static Calibration calibration(FakeNeuron neuron, int instances, long seed) {
    return new Calibration(
        neuron,
        PROTOCOL,
        TOLERANCES,
        Optional.of(TRIM),
        new CalibrationSettings(instances, 24, 0.02, 4000),
        List.of(290.0, 300.0, 310.0),
        seed);
  }

  private static final Calibration SMALL = calibration(FakeNeuron.NOMINAL, 24, 5);
  private static final ResponseLibrary LIBRARY = FakeNeuron.library(SMALL);

  /**
   * Against the closed form: P(0) = Φ(-center/noise). Each of 24 x 72 shares stands within 5 standard
   * errors of its value; chance of a false alarm below 0.1 %.
   */
  @Test
  void probabilitiesFollowTheDevicesLaw() {
    final NormalDistribution normal = new NormalDistribution();
    for (final ResponseCurve curve : LIBRARY.curves()) {
      final double temperature = curve.temperatureKelvin();
      final FakeNeuron device = (FakeNeuron) SMALL.device(curve.instance(), temperature);
      for (int d = 0; d < curve.drive().length; d++) {
        final double center = device.center(temperature, curve.drive()[d], Double.NaN);
        final double p = normal.cumulativeProbability(-center / FakeNeuron.NOISE);
        final double error = Math.sqrt(p * (1 - p) / curve.trials()[d]) + 0.5 / curve.trials()[d];
        assertEquals(p, curve.probability(d, 0), 5 * error, () -> "at " + center);
      }
    }
  }

  @Test
  void everyShareReachesTheWantedHalfWidth() {
    int most = 0;
    for (final ResponseCurve curve : LIBRARY.curves()) {
      for (int d = 0; d < curve.drive().length; d++) {
        for (final int trials : curve.counts()[d]) {
          assertTrue(WilsonInterval.of(trials, curve.trials()[d]).halfWidth() <= 0.02);
        }
        most = Math.max(most, curve.trials()[d]);
      }
      assertEquals(128, curve.trials()[0]);
    }
    assertTrue(most > 2300 && most < 2600, "even odds need about 2400 trials, got " + most);
  }

  @Test
  void latencyIsThatOfTheSlotsThatCount() {
    final ResponseCurve nominal = LIBRARY.curves().get(24);
    assertEquals(0, nominal.instance());
    assertTrue(Double.isNaN(nominal.latencySeconds()[0]));
    final int last = nominal.drive().length - 1;
    assertEquals(1e-9, nominal.latencySeconds()[last], 5 * 1e-10 / Math.sqrt(128));
    assertEquals(1e-10, nominal.jitterSeconds()[last], 0.3e-10);
    assertEquals(nominal.counts()[last][2], nominal.halfTurns().get(last).getOrDefault(-4, 0));
  }

  /** Derived here: torque alone has an effect on torque, so the margin is 4 sqrt(0.03² + 0.01²). */
  @Test
  void everyInstanceCoversTheSameTorqueFields() {
    final double end = 10 * (1 + 4 * Math.hypot(0.03, 0.01));
    for (int i = 0; i < LIBRARY.curves().size(); i++) {
      final LibraryInstance instance = LIBRARY.instances().get(i);
      final double[] drive = LIBRARY.curves().get(i).drive();
      final double nominal = FakeNeuron.NOMINAL.torquePerDrive(instance.temperatureKelvin());
      assertEquals(0, drive[0]);
      assertEquals(end * nominal, drive[23] * instance.torquePerDrive(), 1e-6 * end);
    }
  }

  @Test
  void nominalDeviceIsUntouchedAtItsReference() {
    assertEquals(FakeNeuron.NOMINAL, SMALL.device(0, 300));
    final double residual = SMALL.device(0, 310).imbalance(310) - 0.5;
    assertTrue(Math.abs(residual) <= 6.0 / 64 + 1e-12, "trimmed away from it, left " + residual);
    assertTrue(Math.abs(SMALL.device(5, 300).imbalance(300) - 0.5) <= 6.0 / 64 + 1e-12);
  }

  /** An instance is the same device at all temperatures: its thresholds agree. */
  @Test
  void drawsDoNotKnowTheTemperature() {
    for (int i = 0; i < 24; i++) {
      final double cold = LIBRARY.instances().get(i).features()[1];
      assertEquals(cold, LIBRARY.instances().get(24 + i).features()[1]);
      assertEquals(cold, LIBRARY.instances().get(48 + i).features()[1]);
    }
  }

  @Test
  void sameSeedSameLibrary() {
    final ResponseLibrary again = FakeNeuron.library(SMALL);
    assertArrayEquals(LIBRARY.featureWeights(), again.featureWeights());
    for (int i = 0; i < again.curves().size(); i++) {
      assertTrue(
          java.util.Arrays.deepEquals(
              LIBRARY.curves().get(i).counts(), again.curves().get(i).counts()));
    }
    assertEquals(LIBRARY.digest(), again.digest());
    assertNotEquals(
        LIBRARY.digest(), new Calibrator(calibration(FakeNeuron.NOMINAL, 24, 6)).digest());
    assertNotEquals(
        LIBRARY.digest(),
        new Calibrator(calibration(new FakeNeuron(1, 4, 0.5, 100, 1e-9), 24, 5)).digest());
  }

  /** A temperature more leaves the others' curves as they are. */
  @Test
  void temperaturesDoNotDisturbEachOther() {
    final Calibration one =
        new Calibration(
            FakeNeuron.NOMINAL,
            PROTOCOL,
            TOLERANCES,
            Optional.of(TRIM),
            new CalibrationSettings(2, 24, 0.02, 4000),
            List.of(310.0),
            5);
    final ResponseLibrary alone = FakeNeuron.library(one);
    assertArrayEquals(LIBRARY.curves().get(48).counts()[12], alone.curves().get(0).counts()[12]);
    assertArrayEquals(LIBRARY.curves().get(49).counts()[12], alone.curves().get(1).counts()[12]);
  }

  /** Without memory the measured variation is chance, in 95 of 100 seeds below the floor. */
  @Test
  void carryOverOfADeviceWithoutMemoryIsChance() {
    assertTrue(LIBRARY.carryOver() <= LIBRARY.carryOverFloor(), "measured " + LIBRARY.carryOver());
    assertTrue(LIBRARY.carryOverFloor() < 0.03, "floor " + LIBRARY.carryOverFloor());
  }

  /** Derived here: a shift of 0.2 spacings at even odds, noise 0.3, moves P by about 0.25. */
  @Test
  void carryOverOfADeviceWithMemoryIsSeen() {
    final FakeNeuron forgetful = new FakeNeuron(1, 4, 0.5, 100, 0.04);
    final ResponseLibrary library = FakeNeuron.library(calibration(forgetful, 1, 5));
    assertEquals(0.25, library.carryOver(), 0.1);
    assertTrue(library.carryOver() > 5 * library.carryOverFloor());
    assertTrue(Double.isNaN(library.matchingError()));
  }

  /** The estimate is for plans: right within a factor of five for a sharp staircase. */
  @Test
  void estimateIsOfTheRightSize() {
    final CalibrationEstimate estimate = new Calibrator(SMALL).estimate();
    assertEquals(72, estimate.units());
    final double ratio = estimate.replicaSteps() / LIBRARY.replicaSteps();
    assertTrue(ratio > 0.2 && ratio < 5, "ratio " + ratio);
  }

  @Test
  void refusesBipolarDrives() {
    final DriveProtocol bipolar = new DriveProtocol(0, true, 10, 1e-9, 1e-8);
    final CalibrationSettings settings = new CalibrationSettings(1, 2, 0.02, 10);
    assertThrows(
        IllegalArgumentException.class,
        () ->
            new Calibration(
                FakeNeuron.NOMINAL,
                bipolar,
                Tolerances.NONE,
                Optional.empty(),
                settings,
                List.of(300.0),
                1));
  }
}
