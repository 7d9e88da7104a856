package torqueloom.model.dynamics;

/** The kernel in plain Java: the reference for every bit. */
final class ScalarKernel implements EnsembleKernel {
  private static final int N = Tile.CAPACITY;

  @Override
  public String name() {
    return "scalar";
  }

  @Override
  public void drawGaussians(Tile tile, int active, int counter) {
    for (int pair = 0; pair < Tile.GAUSSIANS / 2; pair++) {
      final int spread = (counter + pair) * GaussianHash.GOLDEN;
      final int first = 2 * pair * N;
      final int second = first + N;
      for (int i = 0; i < active; i++) {
        final int bits = GaussianHash.bits(tile.key0[i], tile.key1[i], spread);
        final int angle = GaussianHash.angleBits(bits);
        final float r = GaussianHash.radius(bits);
        final float w = GaussianHash.halfTurns(angle);
        tile.gaussian[first + i] = r * GaussianHash.cosine(w, angle);
        tile.gaussian[second + i] = r * GaussianHash.sine(w);
      }
    }
  }

  @Override
  public void drawReadNoise(Tile tile, int active, int counter) {
    final int spread = counter * GaussianHash.GOLDEN;
    for (int i = 0; i < active; i++) {
      final int bits = GaussianHash.bits(tile.key0[i], tile.key1[i], spread);
      final int angle = GaussianHash.angleBits(bits);
      final float w = GaussianHash.halfTurns(angle);
      tile.readNoise[i] = GaussianHash.radius(bits) * GaussianHash.cosine(w, angle);
    }
  }

  /**
   * With B the field (torque's field-like part included), H = alpha B + torque y and G = B + m x H,
   * the explicit equation is dm = G x m. Predictor and corrector use the same noise (Heun, so the
   * noise is Stratonovich's); the length is restored by 1 + e/2 + 3 e²/8 with e = 1 - |m|².
   */
  @Override
  public void step(Tile tile, int active, int offset) {
    final float[] g = tile.gaussian;
    final int gx = offset * N;
    final int gy = gx + N;
    final int gz = gy + N;
    for (int i = 0; i < active; i++) {
      final float a = tile.alpha[i];
      final float ay = tile.minusY[i];
      final float az = tile.minusZ[i];
      final float t = tile.torque[i];
      final float s = tile.sigma[i];
      final float hx = Math.fma(s, g[gx + i], tile.fieldX[i]);
      final float hy = Math.fma(s, g[gy + i], tile.fieldY[i]);
      final float hz = Math.fma(s, g[gz + i], tile.fieldZ[i]);
      final float x = tile.mx[i];
      final float y = tile.my[i];
      final float z = tile.mz[i];
      final float ahx = a * hx;

      final float by = Math.fma(ay, y, hy);
      final float bz = Math.fma(az, z, hz);
      final float qy = Math.fma(a, by, t);
      final float qz = a * bz;
      final float nx = -x;
      final float ny = -y;
      final float nz = -z;
      final float ex = hx + Math.fma(y, qz, nz * qy);
      final float ey = by + Math.fma(z, ahx, nx * qz);
      final float ez = bz + Math.fma(x, qy, ny * ahx);
      final float dx = Math.fma(ey, z, ez * ny);
      final float dy = Math.fma(ez, x, ex * nz);
      final float dz = Math.fma(ex, y, ey * nx);

      final float px = x + dx;
      final float py = y + dy;
      final float pz = z + dz;
      final float cy = Math.fma(ay, py, hy);
      final float cz = Math.fma(az, pz, hz);
      final float ry = Math.fma(a, cy, t);
      final float rz = a * cz;
      final float ox = -px;
      final float oy = -py;
      final float oz = -pz;
      final float fx = hx + Math.fma(py, rz, oz * ry);
      final float fy = cy + Math.fma(pz, ahx, ox * rz);
      final float fz = cz + Math.fma(px, ry, oy * ahx);

      final float ux = Math.fma(0.5f, dx + Math.fma(fy, pz, fz * oy), x);
      final float uy = Math.fma(0.5f, dy + Math.fma(fz, px, fx * oz), y);
      final float uz = Math.fma(0.5f, dz + Math.fma(fx, py, fy * ox), z);
      final float e = 1f - Math.fma(uz, uz, Math.fma(uy, uy, ux * ux));
      final float unit = Math.fma(e, Math.fma(e, 0.375f, 0.5f), 1f);
      tile.mx[i] = ux * unit;
      tile.my[i] = uy * unit;
      tile.mz[i] = uz * unit;
    }
  }

  @Override
  public void read(Tile tile, int active, ReadConstants c, float time) {
    final FilterStep f = c.filter();
    for (int i = 0; i < active; i++) {
      final float x = tile.mx[i];
      final float signal = Math.fma(x, Math.fma(x, c.quadratic(), c.linear()), c.constant());
      final float input = Math.fma(f.noise(), tile.readNoise[i], signal);
      final float q = tile.filtered[i];
      final float v = tile.slope[i];
      final float gap = input - q;
      final float next = Math.fma(f.inputToSignal(), gap, Math.fma(f.cross(), v, q));
      tile.filtered[i] = next;
      tile.slope[i] = Math.fma(f.cross(), gap, f.slope() * v);
      compare(tile, i, sign(next - c.low()), sign(c.high() - next), time);
      wind(tile, i, x, tile.mz[i]);
    }
  }

  /** All bits where the sign bit is set, else none. */
  private static int sign(float value) {
    return Float.floatToRawIntBits(value) >> 31;
  }

  /** Falling from high arms the counter, a level that was low all along does not; a rise counts. */
  private static void compare(Tile tile, int i, int below, int above, float time) {
    final int armed = tile.armed[i] | (below & tile.high[i]);
    final int counted = armed & above;
    final int first = counted & sign(tile.firstCount[i]);
    final int date = Float.floatToRawIntBits(tile.firstCount[i]);
    tile.firstCount[i] =
        Float.intBitsToFloat((date & ~first) | (Float.floatToRawIntBits(time) & first));
    tile.counts[i] -= counted;
    tile.armed[i] = armed & ~above;
    tile.high[i] = (tile.high[i] & ~below) | above;
  }

  /**
   * Signed passages through the half line -x of the x-z plane, from +z to -z counted as +1: the
   * chord meets z = 0 at (x0 z - x z0)/(z - z0).
   */
  private static void wind(Tile tile, int i, float x, float z) {
    final float x0 = tile.lastX[i];
    final float z0 = tile.lastZ[i];
    final int was = sign(z0);
    final int is = sign(z);
    final int turned = sign(x0 * z - x * z0);
    final int down = ~was & is & ~turned;
    final int up = was & ~is & turned;
    tile.turns[i] += up - down;
    tile.lastX[i] = x;
    tile.lastZ[i] = z;
  }
}
