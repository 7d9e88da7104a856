package torqueloom.model.dynamics;

/**
 * What a batch of slots gave, one entry a trial; arrays are not shared.
 *
 * @param counts comparator counts between pulse start and slot end (1)
 * @param halfTurns signed winding about y in units of pi, from x toward z (1)
 * @param latencySeconds time from pulse start to the completion of the first count (s), or NaN
 * @param endLevels index of the rest nearest to the moment at the end
 * @param meanPoleProjection mean m_y at the pulse's end (1)
 * @param replicaSteps integration steps spent (1)
 */
public record SlotTrials(
    int[] counts,
    int[] halfTurns,
    double[] latencySeconds,
    int[] endLevels,
    double meanPoleProjection,
    long replicaSteps) {}
