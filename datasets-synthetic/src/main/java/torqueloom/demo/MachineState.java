package torqueloom.demo;

/** What the demo's classifier must tell apart. */
public enum MachineState {
  /** Nothing but the residual unbalance and noise that every machine has. */
  HEALTHY("healthy", 2500),
  /** A pit in the outer race of the first bearing. */
  OUTER_RACE("outer-race", 1900),
  /** A pit in its inner race. */
  INNER_RACE("inner-race", 1900),
  /** A pit in one of its balls. */
  ROLLING_ELEMENT("rolling-element", 1700),
  /** Unbalance in the rotor's middle: both bearings shake in phase. */
  STATIC_UNBALANCE("static-unbalance", 1250),
  /** Opposite unbalances at the rotor's ends: the bearings shake in opposite phase. */
  COUPLE_UNBALANCE("couple-unbalance", 1250);

  private final String label;
  private final int rows;

  MachineState(String label, int rows) {
    this.label = label;
    this.rows = rows;
  }

  /** Class name in the data file. */
  public String label() {
    return label;
  }

  /** Rows of this class in the data file. */
  public int rows() {
    return rows;
  }
}
