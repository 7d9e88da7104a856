package torqueloom.model.magnet;

/**
 * Equilibria of a moment in the plane of the current direction x and the film normal z, with a bias
 * field along x. Per moment M_s V the energy is (D/2) sin²phi - B_b cos phi, phi from +x toward +z.
 *
 * <p>Derived from this energy: with D &gt; 0 the rests are phi = 0 and, for |B_b| &lt; D, also phi = pi; with
 * D &lt; 0 and |D| &gt; |B_b| the rest tilts to cos phi = B_b/|D|, on either side of x.
 *
 * @param imbalance D = B_z - B_x (T), finite
 * @param biasField B_b along x (T), finite, of either sign
 */
public record EquilibriumPlane(double imbalance, double biasField) {
  /** @throws IllegalArgumentException if a field is not finite */
  public EquilibriumPlane {
    if (!Double.isFinite(imbalance) || !Double.isFinite(biasField)) {
      throw new IllegalArgumentException(
          "fields must be finite, got " + imbalance + " and " + biasField + " T");
    }
  }

  /**
   * Angles of the minima, lowest energy first (rad); of two equal ones the first has the larger m_x,
   * then the larger m_z.
   */
  public double[] restAngles() {
    final double d = imbalance;
    final double b = biasField;
    if (d < 0 && -d > Math.abs(b)) {
      final double tilt = StrictMath.acos(b / -d);
      return new double[] {tilt, -tilt};
    }
    if (d > Math.abs(b)) {
      return b >= 0 ? new double[] {0, Math.PI} : new double[] {Math.PI, 0};
    }
    return new double[] {b >= 0 ? 0 : Math.PI};
  }

  /** Angle of the first rest (rad). */
  public double restAngle() {
    return restAngles()[0];
  }

  /** Energy per moment at an angle (T). */
  public double energy(double angle) {
    final double sine = StrictMath.sin(angle);
    return 0.5 * imbalance * sine * sine - biasField * StrictMath.cos(angle);
  }

  /**
   * Damping-like torque field above which no equilibrium is left when the drive rises slowly:
   * B_DL,c = max over phi of (D/2) sin 2 phi + B_b sin phi (T), &gt;= 0.
   */
  public double threshold() {
    final double d = imbalance;
    final double b = Math.abs(biasField);
    if (d == 0) {
      return b;
    }
    // Stationary where 2 D c² + B_b c - D = 0 with c = cos phi; the roots' product is -1/2.
    final double root = Math.sqrt(b * b + 8 * d * d);
    final double large = -(b + root) / (4 * d);
    final double small = -0.5 / large;
    return Math.max(restoringTorque(large, b), restoringTorque(small, b));
  }

  /** Largest |D sin phi cos phi + B_b sin phi| at a cosine, 0 outside [-1, 1]. */
  private double restoringTorque(double cosine, double b) {
    final double sine2 = 1 - cosine * cosine;
    return sine2 < 0 ? 0 : Math.sqrt(sine2) * Math.abs(imbalance * cosine + b);
  }

  /**
   * Smallest energy per moment needed to leave the first rest (T), &gt;= 0: for D &gt;= 0,
   * (D/2)(1 + B_b/D)² if B_b &lt; D, else 2 B_b; for D &lt; 0 and |D| &lt;= B_b, 2 B_b; for D &lt; 0 and
   * |D| &gt; B_b, (|D|/2)(1 - B_b/|D|)².
   */
  public double barrier() {
    final double d = imbalance;
    final double b = Math.abs(biasField);
    if (d > b) {
      return 0.5 * d * (1 + b / d) * (1 + b / d);
    }
    if (d < -b) {
      return -0.5 * d * (1 + b / d) * (1 + b / d);
    }
    return 2 * b;
  }

  /** Stiffness in the plane at an angle: B1 = D cos 2 phi + B_b cos phi (T). */
  public double planeStiffness(double angle) {
    return imbalance * StrictMath.cos(2 * angle) + biasField * StrictMath.cos(angle);
  }

  /**
   * Stiffness toward y at an angle: B2 = B_y - B_x m_x² - B_z m_z² + B_b m_x (T).
   *
   * @param angle phi (rad)
   * @param excessY B_y - B_x (T)
   */
  public double poleStiffness(double angle, double excessY) {
    final double mz = StrictMath.sin(angle);
    return excessY - imbalance * mz * mz + biasField * StrictMath.cos(angle);
  }

  /**
   * Damping number beta_c = B1/(alpha² B_hard) (1): far above one the moment coasts through many
   * turns after a pulse, of order one it gives one clean turn.
   */
  public static double dampingNumber(double planeStiffness, double damping, double hardField) {
    return planeStiffness / (damping * damping * hardField);
  }

  /**
   * Upper limit of the drive over the threshold, i_max = alpha (B_hard + B_easy/2)/B_DL,c (1): above
   * it a lasting drive locks the moment at the pole p.
   */
  public static double maximumDriveRatio(
      double damping, double hardField, double easyField, double threshold) {
    return damping * (hardField + 0.5 * easyField) / threshold;
  }
}
