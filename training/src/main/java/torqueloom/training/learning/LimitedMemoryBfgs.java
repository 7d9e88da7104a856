package torqueloom.training.learning;

/**
 * Minimizes a smooth convex function by the limited-memory method of D. C. Liu and J. Nocedal, Math.
 * Program. 45, 503 (1989), doi:10.1007/BF01589116 (from memory), with a line search that halves or
 * doubles its bracket until the weak Wolfe conditions hold. Deterministic: one thread, one order.
 */
final class LimitedMemoryBfgs {
  /** Steps remembered. */
  private static final int MEMORY = 20;

  /** Least decrease a step must give, as a share of what the slope promises (1). */
  private static final double DECREASE = 1e-4;

  /** Share of the slope that may be left at the end of a step (1). */
  private static final double CURVATURE = 0.9;

  private static final int MOST_TRIALS = 60;

  private final Objective objective;
  private final double[][] steps;
  private final double[][] changes;
  private int remembered;

  private double[] point;
  private double[] gradient;
  private double value;

  private LimitedMemoryBfgs(Objective objective, double[] start) {
    this.objective = objective;
    point = start.clone();
    gradient = new double[start.length];
    value = objective.valueAndGradient(point, gradient);
    steps = new double[MEMORY][];
    changes = new double[MEMORY][];
  }

  /** A function with its gradient. */
  interface Objective {
    /** Returns the value at a point and overwrites the gradient. */
    double valueAndGradient(double[] point, double[] gradient);
  }

  /**
   * Where the search ended.
   *
   * @param point the point
   * @param value the function there
   * @param converged whether the largest derivative is within the tolerance
   * @param iterations steps taken
   */
  record Minimum(double[] point, double value, boolean converged, int iterations) {}

  /**
   * Searches from a start until no derivative exceeds the tolerance, the line search can improve no
   * more, or the iterations are used up.
   */
  static Minimum minimize(Objective objective, double[] start, double tolerance, int iterations) {
    final LimitedMemoryBfgs search = new LimitedMemoryBfgs(objective, start);
    int done = 0;
    while (done < iterations && largest(search.gradient) > tolerance && search.step()) {
      done++;
    }
    return new Minimum(search.point, search.value, largest(search.gradient) <= tolerance, done);
  }

  private static double largest(double[] vector) {
    double largest = 0;
    for (final double component : vector) {
      largest = Math.max(largest, Math.abs(component));
    }
    return largest;
  }

  private boolean step() {
    final double[] direction = direction();
    double slope = dot(direction, gradient);
    if (!(slope < 0)) {
      return false;
    }
    // Without memory the direction is the gradient itself, of arbitrary length.
    double length = remembered == 0 ? 1 / Math.max(1, largest(direction)) : 1;
    double tooShort = 0;
    double tooLong = Double.POSITIVE_INFINITY;
    for (int trial = 0; trial < MOST_TRIALS; trial++) {
      final double[] there = moved(direction, length);
      final double[] slopeThere = new double[there.length];
      final double valueThere = objective.valueAndGradient(there, slopeThere);
      if (!(valueThere <= value + DECREASE * length * slope)) {
        tooLong = length;
      } else if (dot(direction, slopeThere) < CURVATURE * slope) {
        tooShort = length;
      } else {
        accept(there, slopeThere, valueThere);
        return true;
      }
      length = Double.isInfinite(tooLong) ? 2 * length : 0.5 * (tooShort + tooLong);
    }
    return false;
  }

  private double[] moved(double[] direction, double length) {
    final double[] there = point.clone();
    for (int i = 0; i < there.length; i++) {
      there[i] += length * direction[i];
    }
    return there;
  }

  private void accept(double[] there, double[] slopeThere, double valueThere) {
    final double[] step = new double[there.length];
    final double[] change = new double[there.length];
    for (int i = 0; i < there.length; i++) {
      step[i] = there[i] - point[i];
      change[i] = slopeThere[i] - gradient[i];
    }
    steps[remembered % MEMORY] = step;
    changes[remembered % MEMORY] = change;
    remembered++;
    point = there;
    gradient = slopeThere;
    value = valueThere;
  }

  /** Two-loop recursion: minus the approximate inverse Hessian times the gradient. */
  private double[] direction() {
    final double[] result = gradient.clone();
    final int oldest = Math.max(0, remembered - MEMORY);
    final double[] shares = new double[MEMORY];
    for (int i = remembered - 1; i >= oldest; i--) {
      final int slot = i % MEMORY;
      shares[slot] = dot(steps[slot], result) / dot(steps[slot], changes[slot]);
      add(result, -shares[slot], changes[slot]);
    }
    if (remembered > 0) {
      final int newest = (remembered - 1) % MEMORY;
      final double[] change = changes[newest];
      scale(result, dot(steps[newest], change) / dot(change, change));
    }
    for (int i = oldest; i < remembered; i++) {
      final int slot = i % MEMORY;
      final double share = dot(changes[slot], result) / dot(steps[slot], changes[slot]);
      add(result, shares[slot] - share, steps[slot]);
    }
    scale(result, -1);
    return result;
  }

  private static double dot(double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += a[i] * b[i];
    }
    return sum;
  }

  private static void add(double[] a, double factor, double[] b) {
    for (int i = 0; i < a.length; i++) {
      a[i] += factor * b[i];
    }
  }

  private static void scale(double[] a, double factor) {
    for (int i = 0; i < a.length; i++) {
      a[i] *= factor;
    }
  }
}
