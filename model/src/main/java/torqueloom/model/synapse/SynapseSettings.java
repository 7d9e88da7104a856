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

  /** @throws IllegalArgumentException naming the first value out of range */
  public SynapseSettings {
    require(tuningRange > 0 && tuningRange < 2, "tuning-range must lie in (0, 2)", tuningRange);
    require(levels >= 2, "levels must be at least 2", levels);
    require(writeError >= 0 && writeError <= 1, "write-error must lie in [0, 1]", writeError);
    require(fanIn >= 1, "fan-in must be at least 1", fanIn);
    require(unitDrive > 0 && Double.isFinite(unitDrive), "unit-drive must be positive", unitDrive);
    require(gain.isEmpty() || gain.get() > 0, "gain must be positive", gain.orElse(1.0));
    require(readWindow > 0, "read-window must be positive", readWindow);
    require(lineResistance >= 0, "line-resistance must not be negative", lineResistance);
    if (kind == Kind.JUNCTION && junction.isEmpty()) {
      throw new IllegalArgumentException("a synapse of kind junction needs its junction");
    }
  }

  private static void require(boolean holds, String what, double value) {
    if (!holds) {
      throw new IllegalArgumentException(what + ", got " + value);
    }
  }

  /** Kinds of synapse this version computes. */
  public enum Kind {
    /** Weights of any value in [-1, 1], written without error. */
    UNLIMITED,
    /** A pair of tunnel junctions with tunable anisotropy. */
    JUNCTION
  }
}
