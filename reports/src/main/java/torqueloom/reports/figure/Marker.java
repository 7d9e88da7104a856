package torqueloom.reports.figure;

/** Shapes of points. */
public enum Marker {
  /** No point is drawn. */
  NONE,
  /** A filled disk. */
  DISK,
  /** A square standing on its side. */
  SQUARE,
  /** A triangle pointing up. */
  TRIANGLE,
  /** A square standing on its corner. */
  DIAMOND,
  /** An open ring. */
  RING;

  /** The shape of the series with a number, never {@link #NONE}. */
  static Marker of(int index) {
    return values()[1 + Math.floorMod(index, values().length - 1)];
  }
}
