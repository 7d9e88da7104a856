package torqueloom.model.response;

import java.util.List;
import java.util.stream.IntStream;
import torqueloom.model.work.Engine;
import torqueloom.model.work.Stage;
import torqueloom.model.work.WorkUnit;

/**
 * Calibrates a response library. One work unit is one instance at one temperature; units are
 * independent and may run in any order and on any number of threads, the library is the same.
 */
public final class Calibrator {
  /** Name of the stage of the curves in progress and store. */
  public static final String STAGE = "calibrate";

  /** Name of the stage of the carry-over measurement. */
  public static final String CARRY_OVER_STAGE = "carry-over";

  private final Calibration calibration;
  private final String digest;

  /** @param calibration what to calibrate */
  public Calibrator(Calibration calibration) {
    this.calibration = calibration;
    this.digest = CalibrationDigest.of(calibration);
  }

  /** Digest of everything that the library depends on. */
  public String digest() {
    return digest;
  }

  /** Number of work units: instances times temperatures. */
  public int units() {
    return calibration.settings().instances() * calibration.temperatures().size();
  }

  /** What it is expected to cost; takes a moment of pilot simulation. */
  public CalibrationEstimate estimate() {
    return CalibrationEstimate.of(calibration);
  }

  /**
   * Calibrates.
   *
   * @param engine runs the units, reuses those it has stored under the same digest
   * @throws InterruptedException if the run was canceled
   */
  public ResponseLibrary calibrate(Engine engine) throws InterruptedException {
    final List<WorkUnit<CalibratedUnit>> work =
        IntStream.range(0, units()).mapToObj(this::unit).toList();
    final UnitCodec codec = new UnitCodec(calibration.nominal().driveUnit());
    final List<CalibratedUnit> units = engine.run(new Stage<>(STAGE, digest, work, codec));
    final ResponseCurve nominal = nominalCurve(units);
    final WorkUnit<CarryOver> measurement =
        WorkUnit.of("nominal", () -> CarryOver.measure(calibration, nominal));
    final CarryOver carryOver =
        engine
            .run(
                new Stage<>(
                    CARRY_OVER_STAGE, digest, List.of(measurement), new UnitCodec.CarryOverCodec()))
            .get(0);
    return LibraryAssembly.library(calibration, digest, units, carryOver);
  }

  private WorkUnit<CalibratedUnit> unit(int index) {
    final int instance = index % calibration.settings().instances();
    final double temperature =
        calibration.temperatures().get(index / calibration.settings().instances());
    return WorkUnit.of(
        "temperature=" + temperature + "/instance=" + instance,
        () -> CurveCalibrator.calibrate(calibration, instance, temperature));
  }

  private ResponseCurve nominalCurve(List<CalibratedUnit> units) {
    final double reference = calibration.referenceTemperature();
    return units.stream()
        .map(CalibratedUnit::curve)
        .filter(c -> c.instance() == 0 && c.temperatureKelvin() == reference)
        .findFirst()
        .orElseThrow();
  }
}
