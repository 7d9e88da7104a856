package torqueloom.model.dynamics;

import torqueloom.model.constants.PhysicalConstants;

/**
 * Working memory of up to {@link #CAPACITY} replicas, one array a quantity, small enough for the
 * first-level cache. Entries beyond the active ones are padding: a kernel may compute them and
 * nobody reads them. Mutable, used by one thread.
 */
final class Tile {
  /** Replicas in a tile, a multiple of every vector length. */
  static final int CAPACITY = 128;

  /** Gaussian numbers of two steps. */
  static final int GAUSSIANS = 6;

  final float[] mx = new float[CAPACITY];
  final float[] my = new float[CAPACITY];
  final float[] mz = new float[CAPACITY];
  final int[] key0 = new int[CAPACITY];
  final int[] key1 = new int[CAPACITY];

  /** Gaussians g of the two steps at hand: g[j * CAPACITY + replica]. */
  final float[] gaussian = new float[GAUSSIANS * CAPACITY];

  /** Gaussian of the readout noise; the second half takes a kernel's unused partners. */
  final float[] readNoise = new float[2 * CAPACITY];

  // Parameters, fields multiplied by gamma dt/(1 + alpha²) of the segment at hand.
  final float[] alpha = new float[CAPACITY];

  /** Minus the axis fields, so that no kernel needs a negation. */
  final float[] minusY = new float[CAPACITY];

  final float[] minusZ = new float[CAPACITY];
  final float[] fieldX = new float[CAPACITY];

  /** Field along y with the part of the torque that acts like a field. */
  final float[] fieldY = new float[CAPACITY];

  final float[] fieldZ = new float[CAPACITY];

  /** Thermal field. */
  final float[] sigma = new float[CAPACITY];

  /** gamma dt B_DL. */
  final float[] torque = new float[CAPACITY];

  // Readout: filter output and slope; comparator level and arming as all bits or none; counts.
  final float[] filtered = new float[CAPACITY];
  final float[] slope = new float[CAPACITY];
  final int[] high = new int[CAPACITY];
  final int[] armed = new int[CAPACITY];
  final int[] counts = new int[CAPACITY];

  /** Slot time of the first count (s), negative before it. */
  final float[] firstCount = new float[CAPACITY];

  // Winding: direction at the last frame and signed full turns through the half line -x.
  final float[] lastX = new float[CAPACITY];
  final float[] lastZ = new float[CAPACITY];
  final int[] turns = new int[CAPACITY];

  /** Trial of the batch a replica belongs to. */
  final int[] trial = new int[CAPACITY];

  /** Parameters in double, per replica. */
  final MacrospinParameters[] spin = new MacrospinParameters[CAPACITY];

  /** Sets the moment of a replica. */
  void direct(int i, double x, double y, double z) {
    final double length = Math.sqrt(x * x + y * y + z * z);
    mx[i] = (float) (x / length);
    my[i] = (float) (y / length);
    mz[i] = (float) (z / length);
    lastX[i] = mx[i];
    lastZ[i] = mz[i];
  }

  /** Scales the parameters of all replicas (padding included) to a segment's step and torque. */
  void enter(Segment segment) {
    for (int i = 0; i < CAPACITY; i++) {
      scale(i, segment.torque(), segment.step());
    }
  }

  private void scale(int i, TorqueField drive, double step) {
    final MacrospinParameters p = spin[i];
    if (i > 0 && p == spin[i - 1]) {
      copyParameters(i - 1, i);
      return;
    }
    final double a = p.damping();
    final double perTesla = PhysicalConstants.GYROMAGNETIC_RATIO * step;
    final double scale = perTesla / (1 + a * a);
    alpha[i] = (float) a;
    minusY[i] = (float) (-scale * p.excessY());
    minusZ[i] = (float) (-scale * p.excessZ());
    fieldX[i] = (float) (scale * p.fieldX());
    fieldY[i] = (float) (scale * (p.fieldY() + drive.fieldLike() - a * drive.dampingLike()));
    fieldZ[i] = (float) (scale * p.fieldZ());
    sigma[i] = (float) (scale * ThermalNoise.deviation(a, p.thermalField(), step));
    torque[i] = (float) (perTesla * drive.dampingLike());
  }

  private void copyParameters(int from, int to) {
    alpha[to] = alpha[from];
    minusY[to] = minusY[from];
    minusZ[to] = minusZ[from];
    fieldX[to] = fieldX[from];
    fieldY[to] = fieldY[from];
    fieldZ[to] = fieldZ[from];
    sigma[to] = sigma[from];
    torque[to] = torque[from];
  }

  /** Copies a replica, parameters and all, over another. */
  void copy(int from, int to) {
    copyParameters(from, to);
    mx[to] = mx[from];
    my[to] = my[from];
    mz[to] = mz[from];
    key0[to] = key0[from];
    key1[to] = key1[from];
    filtered[to] = filtered[from];
    slope[to] = slope[from];
    high[to] = high[from];
    armed[to] = armed[from];
    counts[to] = counts[from];
    firstCount[to] = firstCount[from];
    lastX[to] = lastX[from];
    lastZ[to] = lastZ[from];
    turns[to] = turns[from];
    trial[to] = trial[from];
    spin[to] = spin[from];
  }
}
