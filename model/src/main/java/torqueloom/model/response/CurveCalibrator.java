package torqueloom.model.response;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.device.SlotRequest;
import torqueloom.model.device.SlotSimulator;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

/** Calibrates one instance at one temperature: its response after a quiet slot at every drive. */
final class CurveCalibrator {
  /** State index of a quiet slot before, in the stream keys; a busy slot's states are above 0. */
  static final long QUIET = 0;

  private CurveCalibrator() {}

  static CalibratedUnit calibrate(Calibration calibration, int instance, double temperature)
      throws InterruptedException {
    final DeviceKind device = calibration.device(instance, temperature);
    final double torque = device.torquePerDrive(temperature);
    final double nominalTorque = calibration.device(0, temperature).torquePerDrive(temperature);
    final double[] drives =
        DriveRange.drives(
            calibration.driveEnd(),
            instance == 0 ? 1 : nominalTorque / torque,
            calibration.settings().drives());
    final SlotSimulator simulator = device.simulator(temperature, calibration.protocol());
    final List<CountSample> samples = new ArrayList<>();
    for (int d = 0; d < drives.length; d++) {
      final long key = key(calibration.seed(), instance, temperature, d, QUIET);
      samples.add(
          CountSample.run(
              simulator,
              new SlotRequest(drives[d], Double.NaN, 0, 0, 1, key),
              calibration.settings().halfWidth(),
              calibration.settings().maximumTrials()));
    }
    final LibraryInstance parameters =
        new LibraryInstance(instance, temperature, torque, device.features(temperature));
    final long steps = samples.stream().mapToLong(CountSample::replicaSteps).sum();
    return new CalibratedUnit(
        parameters,
        curve(instance, temperature, calibration.protocol().pulse(), drives, samples),
        steps);
  }

  /** Key of the noise of one drive; the temperature enters by its bits, not by its place. */
  static long key(long seed, int instance, double temperature, int driveIndex, long state) {
    return Streams.key(
        seed,
        Purpose.CALIBRATION_NOISE,
        instance,
        Double.doubleToLongBits(temperature),
        driveIndex,
        state);
  }

  private static ResponseCurve curve(
      int instance, double temperature, double pulse, double[] drives, List<CountSample> samples) {
    final int width = samples.stream().mapToInt(CountSample::largest).max().orElse(0) + 1;
    final int[][] counts = new int[drives.length][];
    final List<SortedMap<Integer, Integer>> halfTurns = new ArrayList<>();
    for (int d = 0; d < drives.length; d++) {
      counts[d] = samples.get(d).counts(width);
      halfTurns.add(samples.get(d).halfTurns());
    }
    return new ResponseCurve(
        instance,
        temperature,
        pulse,
        0,
        Double.NaN,
        drives,
        samples.stream().mapToInt(CountSample::trials).toArray(),
        0,
        counts,
        halfTurns,
        samples.stream().mapToDouble(CountSample::latencySeconds).toArray(),
        samples.stream().mapToDouble(CountSample::jitterSeconds).toArray());
  }
}
