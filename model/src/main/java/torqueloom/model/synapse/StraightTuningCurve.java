package torqueloom.model.synapse;

/**
 * The straight line: value = detuning. How far a junction's own curve departs from it is part of the
 * {@link SynapseSummary}.
 */
public final class StraightTuningCurve implements TuningCurve {
  /** The only instance. */
  public static final StraightTuningCurve INSTANCE = new StraightTuningCurve();

  private StraightTuningCurve() {}

  @Override
  public double value(double detuning) {
    return detuning;
  }

  @Override
  public double slope(double detuning) {
    return 1;
  }
}
