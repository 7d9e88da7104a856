package torqueloom.training.evaluation;

/**
 * Signed weights as pairs of normalized detunings (plus, minus), each in [0, 1]: the weight is the
 * tuning curve at plus less the tuning curve at minus. Levels are equally spaced in detuning.
 */
public final class PairWeights {
  private PairWeights() {}

  /**
   * Weights at the nearest levels.
   *
   * @param plus detunings of the plus elements, any shape flattened
   * @param minus detunings of the minus elements, same shape
   * @param curve normalized weight at each level, [levels]; empty for a straight line without levels
   * @return weights, same shape
   */
  public static float[] atLevels(float[] plus, float[] minus, float[] curve) {
    final float[] weight = new float[plus.length];
    for (int i = 0; i < weight.length; i++) {
      weight[i] = at(plus[i], curve) - at(minus[i], curve);
    }
    return weight;
  }

  /** Normalized weight of one element at the level nearest to its detuning. */
  public static float at(float detuning, float[] curve) {
    final float inside = Math.max(0f, Math.min(1f, detuning));
    if (curve.length == 0) {
      return inside;
    }
    return curve[Math.round(inside * (curve.length - 1))];
  }

  /** The straight tuning curve at its levels; empty for 0 levels (any value). */
  public static float[] straight(int levels) {
    final float[] curve = new float[levels];
    for (int i = 0; i < levels; i++) {
      curve[i] = (float) i / (levels - 1);
    }
    return curve;
  }
}
