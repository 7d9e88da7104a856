package torqueloom.reports.feasibility;

import java.util.Optional;
import torqueloom.model.device.EasyPlaneFerromagnet;
import torqueloom.model.response.ResponseLibrary;
import torqueloom.training.study.StudyResult;

/**
 * Memory from slot to slot: whether it matters, where it comes from, and what it does to the
 * numbers of a report, whose chips take every slot as one after a quiet slot.
 */
final class SlotMemory {
  /** Total variation from which on the memory matters (1); common practice, no source. */
  static final double LIMIT = 0.02;

  private SlotMemory() {}

  /** Whether the measured memory exceeds both the limit and what chance gives. */
  static boolean matters(ResponseLibrary library) {
    final double floor = Double.isNaN(library.carryOverFloor()) ? 0 : library.carryOverFloor();
    return library.carryOver() > Math.max(LIMIT, floor);
  }

  /** Where it comes from and what would remove it. */
  static String cure(StudyResult result) {
    return hasTwoRests(result)
        ? "Without a bias field this device has two rest levels, and an odd half turn leaves it at"
            + " the other one, where it stays for about exp(Δ) attempts: a longer slot does not"
            + " help, a bias field or a reset pulse would."
        : "A longer slot removes the dependence if it is ringing that lasts.";
  }

  /** One sentence for the verdict, where it matters. */
  static Optional<String> caution(StudyResult result) {
    if (!matters(result.library())) {
      return Optional.empty();
    }
    return Optional.of(
        "Mind the memory: the nominal device's answer depends on the slot before (total variation "
            + Words.quantity(result.library().carryOver(), "1")
            + "), but chips here take every slot as one after a quiet slot from the first rest"
            + " level. All accuracies and yields, with and without trim, are those of a device that"
            + " is reset before each slot. "
            + cure(result));
  }

  private static boolean hasTwoRests(StudyResult result) {
    return result.plan().device() instanceof EasyPlaneFerromagnet magnet && magnet.biasField() == 0;
  }
}
