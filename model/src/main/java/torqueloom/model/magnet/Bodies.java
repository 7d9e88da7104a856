package torqueloom.model.magnet;

/** Shared small helpers of the demagnetizing factors. */
final class Bodies {
  private Bodies() {}

  static void requireEdges(double x, double y, double z) {
    if (!(positive(x) && positive(y) && positive(z))) {
      throw new IllegalArgumentException(
          "edges must be positive and finite, got " + x + ", " + y + ", " + z);
    }
  }

  private static boolean positive(double edge) {
    return edge > 0 && Double.isFinite(edge);
  }

  /** Inverse hyperbolic sine for x >= 0, without cancellation near zero. */
  static double asinh(double x) {
    return StrictMath.log1p(x + x * x / (1 + Math.sqrt(1 + x * x)));
  }
}
