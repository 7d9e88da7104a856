package torqueloom.demo;

/**
 * Geometry of a rolling bearing with a fixed outer ring, and the defect frequencies that follow from
 * rolling without slip. All frequencies are orders: multiples of the shaft's rate of turn (1).
 *
 * <p>Source: R. B. Randall and J. Antoni, "Rolling element bearing diagnostics - a tutorial", Mech.
 * Syst. Signal Process. 25, 485 (2011), doi:10.1016/j.ymssp.2010.07.017 (from memory). Domain:
 * point contacts without slip; real bearings deviate by one or two per cent.
 *
 * @param balls number of rolling elements n (1), &gt; 0
 * @param ballDiameter d (m), in (0, pitchDiameter)
 * @param pitchDiameter D (m), &gt; 0
 * @param contactAngle phi (rad), in [0, pi/2)
 */
public record BearingGeometry(
    int balls, double ballDiameter, double pitchDiameter, double contactAngle) {

  /** A common deep-groove ball bearing of 25 mm bore (type 6205). */
  public static final BearingGeometry DEEP_GROOVE_6205 =
      new BearingGeometry(9, 7.94e-3, 39.04e-3, 0);

  /**
   * @throws IllegalArgumentException naming the first value out of range
   */
  public BearingGeometry {
    require(balls > 0, "balls must be positive, got " + balls);
    require(
        pitchDiameter > 0 && pitchDiameter < Double.POSITIVE_INFINITY,
        "pitchDiameter must be positive and finite, got " + pitchDiameter + " m");
    require(
        ballDiameter > 0 && ballDiameter < pitchDiameter,
        "ballDiameter must lie between 0 and the pitch diameter, got " + ballDiameter + " m");
    require(
        contactAngle >= 0 && contactAngle < Math.PI / 2,
        "contactAngle must lie in [0, pi/2), got " + contactAngle + " rad");
  }

  private static void require(boolean holds, String message) {
    if (!holds) {
      throw new IllegalArgumentException(message);
    }
  }

  private double ratio() {
    return ballDiameter / pitchDiameter * StrictMath.cos(contactAngle);
  }

  /** Ball pass frequency of the outer race, n/2 (1 - d/D cos phi). */
  public double outerRaceOrder() {
    return 0.5 * balls * (1 - ratio());
  }

  /** Ball pass frequency of the inner race, n/2 (1 + d/D cos phi). */
  public double innerRaceOrder() {
    return 0.5 * balls * (1 + ratio());
  }

  /**
   * Spin frequency of a rolling element, D/(2d) (1 - (d/D cos phi)^2). A defect on it strikes both
   * races in turn, so it is heard at twice this order.
   */
  public double ballSpinOrder() {
    return 0.5 * pitchDiameter / ballDiameter * (1 - ratio() * ratio());
  }

  /** Fundamental train frequency: turns of the cage, 1/2 (1 - d/D cos phi). */
  public double cageOrder() {
    return 0.5 * (1 - ratio());
  }
}
