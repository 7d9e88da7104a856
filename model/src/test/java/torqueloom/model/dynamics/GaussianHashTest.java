package torqueloom.model.dynamics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import torqueloom.model.random.Streams;

/**
 * Moments, distribution and independence of the kernel's Gaussian numbers. Fixed keys; every
 * statistic is compared at five standard errors (false alarm below 6e-7 each, about 20 of them).
 */
class GaussianHashTest {
  private static final int STREAMS = 256;
  private static final int LENGTH = 4096;
  private static final double SIGMAS = 5;

  @Test
  void polynomialsMatchTheLibrary() {
    for (int k = 0; k < 1 << 23; k += 97) {
      final int bits = k << 9;
      final double u = (k + .5) * 0x1p-23;
      final double r = Math.sqrt(-2 * Math.log(u));
      assertEquals(r, GaussianHash.radius(bits), 3e-6 * Math.max(r, .01));
      final double w = k * 0x1p-23 - .5;
      final float f = GaussianHash.halfTurns(bits);
      assertEquals(w, f, 0);
      assertEquals(Math.sin(Math.PI * w), GaussianHash.sine(f), 3e-6);
      assertEquals(Math.cos(Math.PI * w), GaussianHash.cosine(f, bits), 1e-6);
      assertEquals(-Math.cos(Math.PI * w), GaussianHash.cosine(f, bits | 1), 1e-6);
    }
  }

  /** Numbers [stream][place], two a place: cosine and sine. */
  private static float[][][] draw(long key) {
    final float[][][] numbers = new float[2][STREAMS][LENGTH];
    for (int s = 0; s < STREAMS; s++) {
      final long own = Streams.subKey(key, s);
      for (int c = 0; c < LENGTH; c++) {
        final int bits = GaussianHash.bits((int) own, (int) (own >>> 32), c * GaussianHash.GOLDEN);
        final int angle = GaussianHash.angleBits(bits);
        final float w = GaussianHash.halfTurns(angle);
        numbers[0][s][c] = GaussianHash.radius(bits) * GaussianHash.cosine(w, angle);
        numbers[1][s][c] = GaussianHash.radius(bits) * GaussianHash.sine(w);
      }
    }
    return numbers;
  }

  @Test
  void momentsAreNormal() {
    final double n = (double) STREAMS * LENGTH;
    for (final float[][] kind : draw(11)) {
      final double[] moment = new double[7];
      for (final float[] stream : kind) {
        for (final float g : stream) {
          double power = 1;
          for (int k = 1; k <= 6; k++) {
            power *= g;
            moment[k] += power / n;
          }
        }
      }
      final double[] expected = {1, 0, 1, 0, 3, 0, 15};
      // Variances of g^k: 1, 2, 15, 96, 945, 10170.
      final double[] variance = {0, 1, 2, 15, 96, 945, 10170};
      for (int k = 1; k <= 6; k++) {
        assertEquals(expected[k], moment[k], SIGMAS * Math.sqrt(variance[k] / n), "moment " + k);
      }
    }
  }

  @Test
  void equallyLikelyCellsAreEquallyFilled() {
    // Chi-square of 64 cells by the normal distribution function; mean 63, deviation sqrt(126).
    for (final float[][] kind : draw(12)) {
      final int[] cells = new int[64];
      for (final float[] stream : kind) {
        for (final float g : stream) {
          cells[Math.min(63, (int) (64 * normalBelow(g)))]++;
        }
      }
      final double expected = STREAMS * LENGTH / 64.0;
      double chi = 0;
      for (final int cell : cells) {
        chi += (cell - expected) * (cell - expected) / expected;
      }
      assertTrue(chi < 63 + 6 * Math.sqrt(126), "chi-square " + chi);
    }
  }

  private static double normalBelow(double g) {
    return .5 * org.apache.commons.math3.special.Erf.erfc(-g / Math.sqrt(2));
  }

  @Test
  void placesStreamsAndPartnersAreUncorrelated() {
    final float[][][] g = draw(13);
    final double n = (double) STREAMS * LENGTH;
    double partner = 0;
    double partnerSquares = 0;
    double neighbor = 0;
    double far = 0;
    double stream = 0;
    double streamSquares = 0;
    for (int s = 0; s < STREAMS; s++) {
      final int other = (s + 1) % STREAMS;
      for (int c = 0; c < LENGTH; c++) {
        final double a = g[0][s][c];
        final double b = g[1][s][c];
        final double o = g[0][other][c];
        partner += a * b;
        partnerSquares += (a * a - 1) * (b * b - 1);
        neighbor += a * g[0][s][(c + 1) % LENGTH];
        far += a * g[1][s][(c + 64) % LENGTH];
        stream += a * o;
        streamSquares += (a * a - 1) * (o * o - 1);
      }
    }
    for (final double sum : new double[] {partner, neighbor, far, stream}) {
      assertEquals(0, sum / n, SIGMAS / Math.sqrt(n));
    }
    for (final double sum : new double[] {partnerSquares, streamSquares}) {
      assertEquals(0, sum / n, SIGMAS * 2 / Math.sqrt(n));
    }
  }

  @Test
  void sumsAlongAStreamDiffuseLikeARandomWalk() {
    // Variance of a stream's sum is its length; its estimate from 256 streams is good to
    // sqrt(2/256).
    for (final float[][] kind : draw(14)) {
      double square = 0;
      for (final float[] stream : kind) {
        double sum = 0;
        for (final float v : stream) {
          sum += v;
        }
        square += sum * sum / LENGTH / STREAMS;
      }
      assertEquals(1, square, SIGMAS * Math.sqrt(2.0 / STREAMS));
    }
  }

  @Test
  void streamsWithNeighboringFirstHalvesShareNothing() {
    // Keys whose first halves differ by one golden step would be the same stream shifted by one.
    double sum = 0;
    final int n = 1 << 18;
    for (int c = 0; c < n; c++) {
      sum += normal(5, 77, c + 1) * normal(5 + GaussianHash.GOLDEN, 78, c);
    }
    assertEquals(0, sum / n, SIGMAS / Math.sqrt(n));
  }

  private static double normal(int key0, int key1, int counter) {
    final int bits = GaussianHash.bits(key0, key1, counter * GaussianHash.GOLDEN);
    final int angle = GaussianHash.angleBits(bits);
    return GaussianHash.radius(bits) * GaussianHash.cosine(GaussianHash.halfTurns(angle), angle);
  }
}
