package torqueloom.model.device;

/**
 * What a batch of simulated slots gave; arrays have one entry a trial and are not shared.
 *
 * @param counts comparator counts between pulse start and slot end (1)
 * @param halfTurns signed winding in units of π (1), a diagnostic beside the counts
 * @param latencySeconds time from pulse start to the first count (s), NaN without a count
 * @param endLevels index of the rest level nearest to the state at slot end
 * @param meanPoleProjection mean of m·p at the pulse's end (1), NaN for kinds without a pole
 * @param replicaSteps integration steps spent (1)
 */
public record SlotOutcomes(
    int[] counts,
    int[] halfTurns,
    double[] latencySeconds,
    int[] endLevels,
    double meanPoleProjection,
    long replicaSteps) {}
