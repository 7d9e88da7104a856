package torqueloom.model.dynamics;

/**
 * Exact update of the Butterworth low pass over one frame with its input held.
 *
 * <p>State q (output) and v = q'/w with w = 2 pi f: q' = w v, v' = w (s - q - sqrt2 v). Over a time T,
 * with h = w T/sqrt2, the matrix exponential is exp(-h)[cos h I + sin h sqrt2 N] with
 * N = [[1/sqrt2, 1], [-1, -1/sqrt2]] (derived here: N² = -I/2).
 *
 * @param inputToSignal 1 - A_11 (1)
 * @param cross A_12 (1)
 * @param slope A_22 (1)
 * @param noise standard deviation of the held noise (1)
 */
record FilterStep(float inputToSignal, float cross, float slope, float noise) {
  static FilterStep of(SignalChain chain, double frame) {
    final double h = 2 * Math.PI * chain.bandwidth() * frame / Math.sqrt(2);
    final double decay = StrictMath.exp(-h);
    final double c = StrictMath.cos(h);
    final double s = StrictMath.sin(h);
    return new FilterStep(
        (float) (1 - decay * (c + s)),
        (float) (decay * Math.sqrt(2) * s),
        (float) (decay * (c - s)),
        (float) Math.sqrt(chain.noiseDensity() / (2 * frame)));
  }
}
