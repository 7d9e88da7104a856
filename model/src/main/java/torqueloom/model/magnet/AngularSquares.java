package torqueloom.model.magnet;

/** Squared cosines at the midpoints of a quarter turn, for the angular rule of the ellipse. */
final class AngularSquares {
  private static volatile double[] last = new double[0];

  private AngularSquares() {}

  /** cos² at (j + 1/2) pi/(2 n), j = 0..n-1; do not change the array. */
  static double[] cosines(int n) {
    double[] squares = last;
    if (squares.length != n) {
      squares = new double[n];
      for (int j = 0; j < n; j++) {
        final double cosine = StrictMath.cos((j + 0.5) * Math.PI / (2 * n));
        squares[j] = cosine * cosine;
      }
      last = squares;
    }
    return squares;
  }
}
