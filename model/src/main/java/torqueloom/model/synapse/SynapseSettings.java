package torqueloom.model.synapse;

import java.util.Optional;
import torqueloom.model.device.Gate;

/**
 * The synapse as a study states it. All values are SI.
 *
 * @param kind what turns an anisotropy into a weight
 * @param tuningRange full span of detuning over the nominal field (1), in (0, 2)
 * @param levels number of levels over the range, &gt;= 2
 * @param writeError one standard deviation of the residual after programming, of the range (1)
 * @param writeVerify whether programming measures the pair and corrects it
 * @param fanIn most synapses on one line, &gt;= 1
 * @param unitDrive strip current density of one full-scale weight for one count (A/m²)
 * @param gain current gain of the input stage (1), empty for automatic
 * @param readWindow time over which the input stage integrates (s)
 * @param lineResistance resistance of one line (ohm)
 * @param gate the synapse's own gate
 * @param junction present for {@link Kind#JUNCTION}
 */
public record SynapseSettings(
    Kind kind,
    double tuningRange,
    int levels,
    double writeError,
    boolean writeVerify,
    int fanIn,
    double unitDrive,
    Optional<Double> gain,
    double readWindow,
    double lineResistance,
    Gate gate,
    Optional<JunctionParameters> junction) {

  /** Kinds of synapse this version computes. */
  public enum Kind {
    /** Weights of any value in [-1, 1], written without error. */
    UNLIMITED,
    /** A pair of tunnel junctions with tunable anisotropy. */
    JUNCTION
  }
}
