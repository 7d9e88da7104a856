package torqueloom.model.synapse;

/**
 * Conductance of one element against its normalized detuning, scaled to run from 0 to 1. Immutable
 * and cheap: it stands in hot loops.
 */
public interface TuningCurve {
  /**
   * @param detuning u (1), in [0, 1]; 0 and 1 are the ends of the tuning range
   * @return value (1), 0 at u = 0 and 1 at u = 1, ascending
   */
  double value(double detuning);

  /** Derivative of {@link #value} (1). */
  double slope(double detuning);
}
