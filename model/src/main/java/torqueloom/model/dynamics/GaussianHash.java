package torqueloom.model.dynamics;

/**
 * Gaussian pairs from a counter: a 32-bit hash of (64-bit key, counter), then the method of G. E. P.
 * Box and M. E. Muller, Ann. Math. Stat. 29, 610 (1958), with polynomials of our own.
 *
 * <p>The hash mixes the first half of the key with the counter, xors the second half in and mixes
 * twice more, so that two streams whose first halves lie near each other share nothing. Shifts and
 * multipliers follow the integer hashes found by C. Wellons' search (from memory). The angle is a
 * further round of the radius' hash. Radius: 23 bits, so the numbers end at 5.77 standard deviations.
 *
 * <p>Polynomials: least-maximum fits by the Lawson iteration, computed here; relative error of the
 * logarithm 2e-6, absolute error of the sine 2.4e-6 and of the cosine 5e-8.
 */
final class GaussianHash {
  /** 2^32 over the golden ratio, odd: spreads consecutive counters. */
  static final int GOLDEN = 0x9E3779B9;

  static final int MIX_1 = 0x21F0AAAD;
  static final int MIX_2 = 0x735A2D97;
  static final int MIX_3 = 0x846CA68B;
  static final int MIX_4 = 0x2C1B3C6D;

  /** Bits of 1.0f. */
  static final int ONE_BITS = 0x3F800000;

  /** 1 - 2^-24: takes 1 + k 2^-23 to the middle of the k-th of 2^23 cells of (0, 1). */
  static final float CELL = 0.99999994f;

  /** Bits of sqrt(1/2) in float: mantissas are taken from [sqrt(1/2), sqrt 2). */
  static final int ROOT_HALF_BITS = 0x3F3504F3;

  /** -2 ln 2. */
  static final float MINUS_TWO_LN2 = -1.3862944f;

  // -2 ln(1 + f) = f (L0 + L1 f + ...), f in [sqrt(1/2) - 1, sqrt 2 - 1].
  static final float L0 = -2.0000017f;
  static final float L1 = 1.000028f;
  static final float L2 = -0.66632056f;
  static final float L3 = 0.49793583f;
  static final float L4 = -0.40909514f;
  static final float L5 = 0.3756547f;
  static final float L6 = -0.24421966f;
  // sin(pi w) = w (S0 + S1 w² + ...), |w| <= 1/2.
  static final float S0 = 3.1415904f;
  static final float S1 = -5.1674075f;
  static final float S2 = 2.544021f;
  static final float S3 = -0.5594899f;
  // cos(pi w) = C0 + C1 w² + ..., |w| <= 1/2.
  static final float C0 = 0.99999994f;
  static final float C1 = -4.934793f;
  static final float C2 = 4.058412f;
  static final float C3 = -1.3318802f;
  static final float C4 = 0.2196968f;

  private GaussianHash() {}

  /** 32 bits of a stream; {@code counter} is multiplied by {@link #GOLDEN} already. */
  static int bits(int key0, int key1, int spreadCounter) {
    int x = key0 + spreadCounter;
    x ^= x >>> 16;
    x *= MIX_1;
    x ^= x >>> 15;
    x ^= key1;
    x *= MIX_2;
    x ^= x >>> 15;
    x *= MIX_3;
    x ^= x >>> 16;
    return x;
  }

  /** The angle's bits from the radius' bits. */
  static int angleBits(int radiusBits) {
    final int x = (radiusBits ^ (radiusBits >>> 15)) * MIX_4;
    return x ^ (x >>> 15);
  }

  /** sqrt(-2 ln u) with u the middle of the cell that the upper 23 bits name. */
  static float radius(int bits) {
    final float u = Float.intBitsToFloat((bits >>> 9) | ONE_BITS) - CELL;
    final int shifted = Float.floatToRawIntBits(u) - ROOT_HALF_BITS;
    final int exponent = shifted >> 23;
    final float mantissa = Float.intBitsToFloat(Float.floatToRawIntBits(u) - (exponent << 23));
    final float f = mantissa - 1f;
    float p = Math.fma(L6, f, L5);
    p = Math.fma(p, f, L4);
    p = Math.fma(p, f, L3);
    p = Math.fma(p, f, L2);
    p = Math.fma(p, f, L1);
    p = Math.fma(p, f, L0);
    return (float) Math.sqrt(Math.fma((float) exponent, MINUS_TWO_LN2, p * f));
  }

  /** Half turns w in [-1/2, 1/2) from the upper 23 bits; the lowest bit is the cosine's sign. */
  static float halfTurns(int angleBits) {
    return Float.intBitsToFloat((angleBits >>> 9) | ONE_BITS) - 1.5f;
  }

  static float sine(float w) {
    final float w2 = w * w;
    float p = Math.fma(S3, w2, S2);
    p = Math.fma(p, w2, S1);
    p = Math.fma(p, w2, S0);
    return p * w;
  }

  /** Cosine with the sign of the angle's lowest bit. */
  static float cosine(float w, int angleBits) {
    final float w2 = w * w;
    float p = Math.fma(C4, w2, C3);
    p = Math.fma(p, w2, C2);
    p = Math.fma(p, w2, C1);
    p = Math.fma(p, w2, C0);
    return Float.intBitsToFloat(Float.floatToRawIntBits(p) ^ (angleBits << 31));
  }
}
