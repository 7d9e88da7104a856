package torqueloom.model.response;

import java.util.List;
import java.util.stream.IntStream;

/**
 * Calibrates a response library. One work unit is one instance at one temperature; units are
 * independent and may run in any order and on any number of threads, the library is the same.
 */
public final class Calibrator {
  private final Calibration calibration;

  /** @param calibration what to calibrate */
  public Calibrator(Calibration calibration) {
    this.calibration = calibration;
  }

  /** Digest of everything that the library depends on. */
  public String digest() {
    return CalibrationDigest.of(calibration);
  }

  /** Number of work units: instances times temperatures. */
  public int units() {
    return calibration.settings().instances() * calibration.temperatures().size();
  }

  /** Calibrates on the calling thread. */
  public ResponseLibrary calibrate() {
    return library(IntStream.range(0, units()).mapToObj(this::unit).toList());
  }

  /** One unit; index = temperature index times instances + instance. */
  CalibratedUnit unit(int index) {
    final int instances = calibration.settings().instances();
    return CurveCalibrator.calibrate(
        calibration, index % instances, calibration.temperatures().get(index / instances));
  }

  private ResponseLibrary library(List<CalibratedUnit> units) {
    final double reference = calibration.referenceTemperature();
    final ResponseCurve nominal =
        units.stream()
            .map(CalibratedUnit::curve)
            .filter(c -> c.instance() == 0 && c.temperatureKelvin() == reference)
            .findFirst()
            .orElseThrow();
    return LibraryAssembly.library(calibration, units, CarryOver.measure(calibration, nominal));
  }
}
