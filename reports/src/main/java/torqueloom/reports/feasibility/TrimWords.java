package torqueloom.reports.feasibility;

import torqueloom.model.device.EasyPlaneFerromagnet;
import torqueloom.training.study.StudyResult;
import torqueloom.training.study.TrimComparison;

/** What trim changes, in words. */
final class TrimWords {
  /** Share of the breakdown field from which on a gate is called too near to it (1). */
  private static final double NEAR_BREAKDOWN = 0.7;

  private TrimWords() {}

  /** What the trim changes or would change, and whether it is assumed. */
  static String sentence(StudyResult result) {
    final TrimComparison trim = result.trim();
    if (trim.chips() < 1) {
      return "What trim changes was not computed.";
    }
    if (!trim.assumed()) {
      return stated(trim);
    }
    final String assumed = assumed(trim) + gate(result);
    return new StudyFacts(result).trainedOnDrawnDevices()
        ? assumed
            + " The network is the one that learned on devices without trim; one that "
            + "learned with it can gain more."
        : assumed;
  }

  /** What the assumed range asks of the gate. */
  private static String gate(StudyResult result) {
    if (!(result.plan().device() instanceof EasyPlaneFerromagnet magnet)) {
      return "";
    }
    final double voltage = Math.abs(magnet.gate().voltageFor(result.trim().range()));
    final double share =
        voltage / magnet.gate().dielectricThickness() / magnet.gate().breakdownField();
    return " It would take ±"
        + Words.quantity(voltage, "V")
        + " on the stated gate, "
        + Words.percent(share)
        + " of its breakdown field"
        + (share > NEAR_BREAKDOWN ? ", too near for a product." : ".");
  }

  private static String assumed(TrimComparison trim) {
    return "Trim is not part of this proposal. Assuming that each neuron's gate could move its "
        + "interfacial anisotropy by "
        + reach(trim)
        + ", the same "
        + Words.count(trim.chips())
        + " chips would reach a median accuracy of "
        + Words.percent(trim.medianWith())
        + " instead of "
        + Words.percent(trim.medianWithout())
        + " ("
        + gain(trim)
        + ") and a yield of "
        + Words.share(trim.yieldWith())
        + " instead of "
        + Words.share(trim.yieldWithout())
        + "; the share of neurons with their moment more than 30° out of the film would go from "
        + Words.percent(trim.outOfFilmWithout())
        + " to "
        + Words.percent(trim.outOfFilmWith())
        + ".";
  }

  private static String stated(TrimComparison trim) {
    return "With the proposal's trim ("
        + reach(trim)
        + ") "
        + Words.count(trim.chips())
        + " chips reach a median accuracy of "
        + Words.percent(trim.medianWith())
        + "; the same chips without it reach "
        + Words.percent(trim.medianWithout())
        + " ("
        + gain(trim)
        + ") and a yield of "
        + Words.share(trim.yieldWithout())
        + " instead of "
        + Words.share(trim.yieldWith())
        + "; the share of neurons with their moment more than 30° out of the film is "
        + Words.percent(trim.outOfFilmWith())
        + " with trim and "
        + Words.percent(trim.outOfFilmWithout())
        + " without.";
  }

  private static String reach(TrimComparison trim) {
    return "±"
        + Words.quantity(trim.range(), "J/m^2")
        + " in "
        + Words.count(trim.levels())
        + " levels";
  }

  private static String gain(TrimComparison trim) {
    return "mean paired gain " + Words.gain(trim.difference());
  }
}
