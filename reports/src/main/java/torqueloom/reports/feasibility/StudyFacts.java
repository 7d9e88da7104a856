package torqueloom.reports.feasibility;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import torqueloom.model.response.LibraryInstance;
import torqueloom.model.response.ResponseCurve;
import torqueloom.training.study.StudyResult;
import torqueloom.training.study.Targets;
import torqueloom.training.study.TemperatureOutcome;
import torqueloom.training.study.Verdict;

/**
 * Short cuts into a result.
 *
 * @param result the result
 */
record StudyFacts(StudyResult result) {
  /** Probability of one count above which a plateau is called clean (1). */
  static final double CLEAN = 0.9;

  Targets targets() {
    return result.plan().targets();
  }

  /** Reference temperature (K). */
  double reference() {
    return result.device().temperatureKelvin();
  }

  List<TemperatureAnswer> answers() {
    return result.chips().stream().map(c -> TemperatureAnswer.of(c, targets())).toList();
  }

  /**
   * What would decide an open study: the rule puts these sentences before the one it gives for each
   * temperature. Empty where nothing is open.
   */
  List<String> advice() {
    final List<String> reasons = result.verdict().reasons();
    return result.verdict().kind() == Verdict.Kind.UNDECIDED
        ? reasons.subList(0, Math.max(0, reasons.size() - result.chips().size()))
        : List.of();
  }

  /** Whether the network learned on devices drawn from stated tolerances. */
  boolean trainedOnDrawnDevices() {
    return result.plan().training().variationAware()
        && !result.plan().tolerances().spreads().isEmpty();
  }

  /** The temperatures with an answer. */
  List<String> temperatures(Verdict.Kind kind) {
    return answers().stream()
        .filter(a -> a.kind() == kind)
        .map(a -> Words.kelvin(a.outcome().temperatureKelvin()))
        .toList();
  }

  /** The temperature with the lowest yield; empty without chips. */
  Optional<TemperatureOutcome> worst() {
    return result.chips().stream().min(Comparator.comparingDouble(c -> c.yield().estimate()));
  }

  /** The outcome nearest to the reference temperature; empty without chips. */
  Optional<TemperatureOutcome> atReference() {
    return result.chips().stream()
        .min(Comparator.comparingDouble(c -> Math.abs(c.temperatureKelvin() - reference())));
  }

  /** Curves of the nominal device after a quiet slot from the first rest level, by temperature. */
  List<ResponseCurve> nominalCurves() {
    return curves().filter(c -> c.instance() == 0).sorted(byTemperature()).toList();
  }

  /** Curves of all other instances nearest to the reference temperature. */
  List<ResponseCurve> spreadCurves() {
    final double at = nominal().map(ResponseCurve::temperatureKelvin).orElse(reference());
    return curves().filter(c -> c.instance() != 0 && c.temperatureKelvin() == at).toList();
  }

  /** Curve of the nominal device nearest to the reference temperature. */
  Optional<ResponseCurve> nominal() {
    return nominalCurves().stream()
        .min(Comparator.comparingDouble(c -> Math.abs(c.temperatureKelvin() - reference())));
  }

  /** Spin-torque field per drive of the nominal device (T per drive unit), NaN when unknown. */
  double torquePerDrive() {
    return result.library().instances().stream()
        .filter(i -> i.instance() == 0)
        .min(Comparator.comparingDouble(i -> Math.abs(i.temperatureKelvin() - reference())))
        .map(LibraryInstance::torquePerDrive)
        .orElse(Double.NaN);
  }

  private java.util.stream.Stream<ResponseCurve> curves() {
    return result.library().curves().stream()
        .filter(c -> c.restLevel() == 0 && Double.isNaN(c.previousDrive()));
  }

  private static Comparator<ResponseCurve> byTemperature() {
    return Comparator.comparingDouble(ResponseCurve::temperatureKelvin);
  }
}
