package torqueloom.model.magnet;

/** Sixteen-point Gauss-Legendre rule on [-1, 1], its nodes found by Newton's method at start. */
final class GaussLegendre {
  static final int POINTS = 16;
  private static final double[] NODE = new double[POINTS];
  private static final double[] WEIGHT = new double[POINTS];

  static {
    for (int i = 0; i < POINTS; i++) {
      double x = StrictMath.cos(Math.PI * (i + 0.75) / (POINTS + 0.5));
      for (int newton = 0; newton < 8; newton++) {
        x -= legendre(x)[0] / legendre(x)[1];
      }
      final double slope = legendre(x)[1];
      NODE[i] = x;
      WEIGHT[i] = 2 / ((1 - x * x) * slope * slope);
    }
  }

  private GaussLegendre() {}

  static double node(int i) {
    return NODE[i];
  }

  static double weight(int i) {
    return WEIGHT[i];
  }

  /** Legendre polynomial of degree {@link #POINTS} and its derivative at x. */
  private static double[] legendre(double x) {
    double before = 1;
    double value = x;
    for (int n = 2; n <= POINTS; n++) {
      final double next = ((2 * n - 1) * x * value - (n - 1) * before) / n;
      before = value;
      value = next;
    }
    return new double[] {value, POINTS * (x * value - before) / (x * x - 1)};
  }
}
