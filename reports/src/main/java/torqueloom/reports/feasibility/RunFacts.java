package torqueloom.reports.feasibility;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
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

  /** Copies both. */
  public RunFacts {
    provenance = Collections.unmodifiableMap(new LinkedHashMap<>(provenance));
    stages = List.copyOf(stages);
  }
}
