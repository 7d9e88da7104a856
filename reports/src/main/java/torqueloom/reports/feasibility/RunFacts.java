package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import torqueloom.model.provenance.Provenance;
import torqueloom.reports.render.StageTime;

/**
 * Where and how a result was computed: what stands in the report's provenance and never in its
 * results.
 *
 * @param provenance name and value of each fact (platform, Java, kernels), in printing order
 * @param stages times of the stages, in order
 */
public record RunFacts(Map<String, String> provenance, List<StageTime> stages) {
  /** Nothing known. */
  public static final RunFacts NONE = new RunFacts(Map.of(), List.of());

  /**
   * Facts of a run.
   *
   * @param provenance how it was made
   * @param seconds seconds by stage, in order
   */
  public static RunFacts of(Provenance provenance, Map<String, Double> seconds) {
    final Map<String, String> facts = new LinkedHashMap<>();
    facts.put("Java", provenance.javaVersion() + ", " + provenance.javaVirtualMachine());
    facts.put("System", provenance.operatingSystem() + ", " + provenance.architecture());
    facts.put(
        "Processor", provenance.processor() + ", " + provenance.processorCount() + " for Java");
    facts.put("Native settings", pairs(provenance.environment()));
    facts.put("Libraries", pairs(provenance.dependencies()));
    facts.values().removeIf(String::isEmpty);
    final List<StageTime> stages = new ArrayList<>();
    seconds.forEach((name, value) -> stages.add(new StageTime(name, value)));
    return new RunFacts(facts, stages);
  }

  private static String pairs(Map<String, String> values) {
    return values.entrySet().stream()
        .map(entry -> entry.getKey() + " " + entry.getValue())
        .collect(Collectors.joining(", "));
  }

  /** Copies both. */
  public RunFacts {
    provenance = Collections.unmodifiableMap(new LinkedHashMap<>(provenance));
    stages = List.copyOf(stages);
  }
}
