package torqueloom.reports.render;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import torqueloom.model.energy.InferenceCost;
import torqueloom.training.study.Interval;
import torqueloom.training.study.StudyResult;
import torqueloom.training.study.TemperatureOutcome;
import torqueloom.training.study.TrimComparison;

/**
 * A result as the tree of keys and values that stands in {@code results.json}, in its documented
 * order. Nothing about time, machine, threads, paths or kernel enters it.
 */
public final class ResultsTree {
  /** Version of the layout. */
  public static final int SCHEMA = 1;

  private ResultsTree() {}

  /** The whole tree; values are texts, numbers, lists, arrays of numbers, and maps in order. */
  public static Map<String, Object> of(StudyResult result) {
    final Map<String, Object> out = new LinkedHashMap<>();
    out.put("schema", SCHEMA);
    out.put(
        "study",
        map(
            "name",
            result.plan().name(),
            "seed",
            result.plan().seed(),
            "digest",
            result.plan().digest()));
    out.put("version", result.version());
    out.put("verdict", result.verdict().kind().text());
    out.put("ideal", map("accuracy", result.ideal()));
    out.put("baseline", map("accuracy", result.baseline(), "strength", result.baselineStrength()));
    final List<Object> chips = new ArrayList<>();
    result.chips().forEach(outcome -> chips.add(chips(outcome)));
    out.put("chips", chips);
    out.put("energyPerInferenceJoules", result.cost().totalJoules());
    out.put("latencySeconds", result.cost().latencySeconds());
    further(result, out);
    return out;
  }

  private static void further(StudyResult result, Map<String, Object> out) {
    out.put(
        "targets",
        map(
            "accuracy",
            result.plan().targets().accuracy(),
            "yield",
            result.plan().targets().yield(),
            "confidence",
            result.plan().targets().confidence()));
    out.put("reasons", result.verdict().reasons());
    out.put(
        "task",
        map(
            "trainingRows",
            result.rows()[0],
            "validationRows",
            result.rows()[1],
            "testRows",
            result.rows()[2],
            "features",
            result.features(),
            "classes",
            result.classes()));
    out.put(
        "toleranceEffect",
        map(
            "chips",
            result.toleranceEffect().chips(),
            "medianAtZero",
            result.toleranceEffect().medianAtZero(),
            "medianAtStated",
            result.toleranceEffect().medianAtStated(),
            "loss",
            interval(result.toleranceEffect().loss())));
    out.put("trim", trim(result.trim()));
    out.put(
        "response",
        map(
            "libraryDigest",
            result.library().digest(),
            "carryOver",
            result.library().carryOver(),
            "carryOverFloor",
            result.library().carryOverFloor(),
            "matchingError",
            result.library().matchingError()));
    out.put("cost", cost(result.cost()));
  }

  private static Map<String, Object> chips(TemperatureOutcome outcome) {
    return map(
        "temperatureKelvin", outcome.temperatureKelvin(),
        "count", outcome.accuracies().length,
        "accuracies", outcome.accuracies(),
        "median", outcome.median().estimate(),
        "low", outcome.median().low(),
        "high", outcome.median().high(),
        "yield", interval(outcome.yield()),
        "yieldOnNewCases", interval(outcome.yieldOnNewCases()),
        "yieldWilson", interval(outcome.wilson()),
        "standardDeviation", outcome.standardDeviation(),
        "quantile05", outcome.quantile05(),
        "quantile95", outcome.quantile95(),
        "withinChipDeviation", outcome.withinChipDeviation(),
        "clippedShare", outcome.meanClippedShare());
  }

  private static Map<String, Object> trim(TrimComparison trim) {
    return map(
        "assumed", trim.assumed(),
        "rangeJoulesPerSquareMeter", trim.range(),
        "levels", trim.levels(),
        "chips", trim.chips(),
        "medianWith", trim.medianWith(),
        "medianWithout", trim.medianWithout(),
        "difference", interval(trim.difference()),
        "yieldWith", interval(trim.yieldWith()),
        "yieldWithout", interval(trim.yieldWithout()),
        "outOfFilmWith", trim.outOfFilmWith(),
        "outOfFilmWithout", trim.outOfFilmWithout());
  }

  private static Map<String, Object> cost(InferenceCost cost) {
    return map(
        "driveJoules", cost.driveJoules(),
        "readJoules", cost.readJoules(),
        "synapseJoules", cost.synapseJoules(),
        "gateJoules", cost.gateJoules(),
        "electronicsJoules", cost.electronicsJoules(),
        "staticJoules", cost.staticJoules(),
        "countsPerInference", cost.countsPerInference(),
        "multiplyAccumulates", cost.multiplyAccumulates(),
        "supplyPowerWatts", cost.supplyPowerWatts());
  }

  private static Map<String, Object> interval(Interval interval) {
    return map("estimate", interval.estimate(), "low", interval.low(), "high", interval.high());
  }

  private static Map<String, Object> map(Object... pairs) {
    final Map<String, Object> out = new LinkedHashMap<>();
    for (int i = 0; i < pairs.length; i += 2) {
      out.put((String) pairs[i], pairs[i + 1]);
    }
    return out;
  }
}
