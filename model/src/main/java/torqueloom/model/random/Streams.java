package torqueloom.model.random;

/**
 * Counter-based random numbers: a 64-bit key names a stream, a 64-bit counter a place in it.
 *
 * <p>Keys chain a 64-bit finalizer over seed, purpose and indices; a value is two rounds of the
 * finalizer over key and counter. The finalizer is variant 13 of D. Stafford's search over the
 * structure of MurmurHash3 (constants from memory), as also used by G. L. Steele, D. Lea, C. H.
 * Flood, "Fast splittable pseudorandom number generators", OOPSLA 2014,
 * doi:10.1145/2660193.2660195. Not for cryptography.
 */
public final class Streams {
  /** 2^64 divided by the golden ratio, odd: spreads consecutive counters (Steele et al. 2014). */
  private static final long GOLDEN = 0x9E3779B97F4A7C15L;

  private static final double TAIL_4 = NormalQuantile.lowerTail(-4);

  private Streams() {}

  /**
   * Key of one stream.
   *
   * @param seed study seed
   * @param purpose what the numbers are for
   * @param indices place of the stream, e.g. (chip, layer, row); their number matters
   * @return a 64-bit key
   */
  public static long key(long seed, Purpose purpose, long... indices) {
    long key = mix(seed + GOLDEN);
    key = mix(key ^ mix(purpose.code() * GOLDEN + indices.length));
    for (final long index : indices) {
      key = subKey(key, index);
    }
    return key;
  }

  /** Key of the stream {@code index} below {@code key}; a cheaper way to walk many siblings. */
  public static long subKey(long key, long index) {
    return mix((key + GOLDEN) ^ mix(index * GOLDEN + 0x632BE59BD9B4E019L));
  }

  /** 64 random bits at {@code counter} of the stream. */
  public static long bits(long key, long counter) {
    return mix(key ^ mix(counter * GOLDEN + key));
  }

  /**
   * A uniform double in the open interval (0, 1): the middle of one of 2^52 equal cells. With one
   * bit more the middle of the last cell would round up to 1.
   */
  public static double uniform(long key, long counter) {
    return cellMiddle(bits(key, counter));
  }

  /** Middle of the cell that the upper 52 of 64 bits name; exact in a double. */
  static double cellMiddle(long bits) {
    return ((bits >>> 12) + 0.5) * 0x1.0p-52;
  }

  /**
   * A uniform integer in [0, bound).
   *
   * @throws IllegalArgumentException if bound is not positive
   */
  public static int below(long key, long counter, int bound) {
    if (bound <= 0) {
      throw new IllegalArgumentException("bound must be positive, got " + bound);
    }
    return (int) Math.multiplyHigh(bits(key, counter) >>> 1, 2L * bound);
  }

  /**
   * A standard normal number, by the inverse of the normal distribution (Acklam's rational
   * approximation, from memory, relative error below 1.2e-9; the tails end at about 8.2 sigma).
   */
  public static double normal(long key, long counter) {
    return NormalQuantile.of(uniform(key, counter));
  }

  /**
   * A standard normal number truncated at plus and minus {@code limit} standard deviations.
   *
   * @param limit sigma (1), &gt; 0
   */
  public static double truncatedNormal(long key, long counter, double limit) {
    final double tail = limit == 4 ? TAIL_4 : NormalQuantile.lowerTail(-limit);
    return NormalQuantile.of(tail + (1 - 2 * tail) * uniform(key, counter));
  }

  /** A Fisher-Yates shuffle of 0..n-1 drawn from the stream. */
  public static int[] permutation(long key, int n) {
    final int[] order = new int[n];
    for (int i = 0; i < n; i++) {
      order[i] = i;
    }
    for (int i = n - 1; i > 0; i--) {
      final int j = below(key, i, i + 1);
      final int swap = order[i];
      order[i] = order[j];
      order[j] = swap;
    }
    return order;
  }

  static long mix(long value) {
    long z = value;
    z = (z ^ (z >>> 30)) * 0xBF58476D1CE4E5B9L;
    z = (z ^ (z >>> 27)) * 0x94D049BB133111EBL;
    return z ^ (z >>> 31);
  }
}
