package torqueloom.model.response;

import torqueloom.model.device.SlotOutcomes;
import torqueloom.model.device.SlotRequest;

/**
 * What a calibration is expected to cost, for plans; never part of a result.
 *
 * @param units work units
 * @param trials slots
 * @param replicaSteps integration steps (1), 0 for kinds that do not integrate
 */
public record CalibrationEstimate(int units, double trials, double replicaSteps) {
  /** Trials at even odds that give a half-width h are about 0.96/h². */
  private static final double EVEN_ODDS = 0.9604;

  /**
   * Mean share of those over the drives of a response that thermal and readout noise smear, measured
   * on the easy-plane ferromagnet; a sharp staircase needs less.
   */
  private static final double SHARE = 0.57;

  private static final int PILOT = 32;

  /** Estimates by a few pilot slots at half the largest drive of the nominal device. */
  static CalibrationEstimate of(Calibration calibration) {
    final CalibrationSettings settings = calibration.settings();
    final int units = settings.instances() * calibration.temperatures().size();
    final double wanted = SHARE * EVEN_ODDS / (settings.halfWidth() * settings.halfWidth());
    final double trials =
        (double) units
            * settings.drives()
            * Math.min(settings.maximumTrials(), Math.max(CountSample.BATCH, wanted));
    final double temperature = calibration.referenceTemperature();
    final SlotOutcomes pilot =
        calibration
            .device(0, temperature)
            .simulator(temperature, calibration.protocol())
            .simulate(
                new SlotRequest(
                    calibration.protocol().maximumDrive() / 2,
                    Double.NaN,
                    0,
                    0,
                    PILOT,
                    CurveCalibrator.key(calibration.seed(), 0, temperature, 0, Long.MIN_VALUE)));
    return new CalibrationEstimate(units, trials, trials * pilot.replicaSteps() / PILOT);
  }
}
