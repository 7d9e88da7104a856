package torqueloom.training.study;

import java.util.List;
import java.util.Optional;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.random.Purpose;
import torqueloom.model.response.Calibration;
import torqueloom.model.response.CalibrationSettings;
import torqueloom.model.response.Calibrator;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.model.tolerance.Trim;
import torqueloom.model.work.Engine;
import torqueloom.training.chip.ChipOutcome;

/**
 * Paired comparisons at the temperature nearest to the device's reference: the same chips with zero
 * tolerances, and the same chips with the trim that the study lacks or without the one it has.
 */
final class Comparisons {
  /** Most chips that are compared. */
  private static final int MOST_CHIPS = 200;

  /** Devices surveyed for the share that has its easy axis out of the film. */
  private static final int SURVEYED = 2000;

  /** Levels of a trim that is assumed to show what it would buy. */
  private static final int ASSUMED_LEVELS = 64;

  /** Range of an assumed trim over the standard deviation of the shifts wanted. */
  private static final double ASSUMED_SIGMAS = 2.5;

  private final StudyPlan plan;
  private final ChipStage stage;
  private final Responses responses;
  private final Engine engine;

  Comparisons(StudyPlan plan, ChipStage stage, Responses responses, Engine engine) {
    this.plan = plan;
    this.stage = stage;
    this.responses = responses;
    this.engine = engine;
  }

  private int chips() {
    return Math.min(MOST_CHIPS, plan.evaluation().chips());
  }

  /**
   * What the tolerances cost.
   *
   * @param stated the study's chips, [chip][temperature]
   */
  ToleranceEffect toleranceEffect(List<List<ChipOutcome>> stated) throws InterruptedException {
    final List<List<ChipOutcome>> zero =
        stage.run(
            new ChipStage.Draw(
                "chips-zero-tolerance",
                responses,
                Tolerances.NONE,
                Optional.empty(),
                false,
                List.of(responses.reference()),
                chips()));
    final double[] atZero = ChipStage.accuracies(zero, 0);
    final double[] atStated =
        ChipStage.accuracies(stated.subList(0, chips()), responses.reference());
    return new ToleranceEffect(
        chips(),
        QuantileInterval.of(atZero, 0.5),
        QuantileInterval.of(atStated, 0.5),
        PairedDifference.median(minus(atZero, atStated), plan.targets().confidence()));
  }

  /**
   * What trim buys.
   *
   * @param stated the study's chips, [chip][temperature]
   */
  TrimComparison trim(List<List<ChipOutcome>> stated) throws InterruptedException {
    final Trim trim = plan.trim().orElseGet(this::assumedTrim);
    final boolean assumed = plan.trim().isEmpty();
    final double[] own = ChipStage.accuracies(stated.subList(0, chips()), responses.reference());
    final double[] other = other(assumed ? Optional.of(trim) : Optional.empty());
    final double[] with = assumed ? other : own;
    final double[] without = assumed ? own : other;
    return new TrimComparison(
        assumed,
        trim.range(),
        trim.levels(),
        chips(),
        QuantileInterval.of(with, 0.5),
        QuantileInterval.of(without, 0.5),
        PairedDifference.mean(minus(with, without), plan.targets().confidence()),
        share(with),
        share(without),
        outOfFilm(Optional.of(trim)),
        outOfFilm(Optional.empty()));
  }

  private double[] other(Optional<Trim> trim) throws InterruptedException {
    final double temperature = temperature();
    final Calibrator calibrator =
        new Calibrator(
            new Calibration(
                plan.device(),
                plan.protocol(),
                plan.tolerances(),
                trim,
                coarse(plan.calibration()),
                List.of(temperature),
                plan.seed()));
    final Responses counterpart =
        Responses.of(
            calibrator.calibrate(engine),
            plan.synapse().unitDrive(),
            plan.device().referenceTemperature());
    return ChipStage.accuracies(
        stage.run(
            new ChipStage.Draw(
                trim.isPresent() ? "chips-with-trim" : "chips-without-trim",
                counterpart,
                plan.tolerances(),
                trim,
                true,
                List.of(0),
                chips())),
        0);
  }

  /**
   * The counterpart library serves one picture, not the verdict: twice the half-width, so at most a
   * quarter of the trials. Its counting error is still small beside the spread between devices.
   */
  private static CalibrationSettings coarse(CalibrationSettings settings) {
    return new CalibrationSettings(
        settings.instances(),
        settings.drives(),
        Math.min(2 * settings.halfWidth(), 0.25),
        Math.max(1, settings.maximumTrials() / 4));
  }

  private double temperature() {
    return responses.library().temperatures().get(responses.reference());
  }

  private Interval share(double[] accuracies) {
    return ProportionInterval.anytime(
        ChipStage.passing(accuracies, plan.targets().accuracy()),
        accuracies.length,
        plan.targets().confidence());
  }

  /** A trim wide enough for 99 of 100 devices. */
  private Trim assumedTrim() {
    double squares = 0;
    for (int i = 0; i < SURVEYED; i++) {
      final double shift = surveyed(i).balancingShift(temperature(), target());
      squares += shift * shift;
    }
    final double deviation = Math.sqrt(squares / SURVEYED);
    return new Trim(
        Math.max(ASSUMED_SIGMAS * deviation, 1e-9), ASSUMED_LEVELS, temperature(), true);
  }

  /** Share of devices whose imbalance turns the moment out of the film (1). */
  private double outOfFilm(Optional<Trim> trim) {
    int out = 0;
    for (int i = 0; i < SURVEYED; i++) {
      final DeviceKind device = surveyed(i);
      final DeviceKind working =
          trim.map(t -> t.apply(device, temperature(), target())).orElse(device);
      if (working.restsOutOfFilm(temperature())) {
        out++;
      }
    }
    return (double) out / SURVEYED;
  }

  private DeviceKind surveyed(int number) {
    return plan.tolerances()
        .draw(plan.device(), plan.seed(), Purpose.TOLERANCE_SURVEY, number, 0, 0);
  }

  private double target() {
    return plan.device().imbalance(plan.device().referenceTemperature());
  }

  private static double[] minus(double[] a, double[] b) {
    final double[] difference = new double[a.length];
    for (int i = 0; i < a.length; i++) {
      difference[i] = a[i] - b[i];
    }
    return difference;
  }
}
