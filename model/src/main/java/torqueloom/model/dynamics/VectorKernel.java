package torqueloom.model.dynamics;

import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.IntVector;
import jdk.incubator.vector.VectorOperators;
import jdk.incubator.vector.VectorSpecies;

/**
 * The kernel with the Vector API: the same operations in the same order as {@link ScalarKernel}, so
 * the same bits. Loaded only where the module {@code jdk.incubator.vector} is present.
 *
 * <p>Bodies are flat: a helper that took or gave a vector would be left as a call by the compiler
 * once the method is large, and every vector would then be boxed. Random numbers and steps are
 * separate loops over the tile, which stays in the first-level cache.
 */
final class VectorKernel implements EnsembleKernel {
  private static final VectorSpecies<Float> F = FloatVector.SPECIES_PREFERRED;
  private static final VectorSpecies<Integer> I = IntVector.SPECIES_PREFERRED;
  private static final int N = Tile.CAPACITY;

  /** 1.5 * 2^23: an integer of few bits added to its bits is that number added to its value. */
  private static final float MAGIC = 12582912f;

  private static final int MAGIC_BITS = 0x4B400000;

  /** Lanes of a vector. */
  static int lanes() {
    return F.length();
  }

  @Override
  public String name() {
    return "vector";
  }

  @Override
  public void drawGaussians(Tile tile, int active, int counter) {
    for (int pair = 0; pair < Tile.GAUSSIANS / 2; pair++) {
      drawPair(
          tile.key0,
          tile.key1,
          tile.gaussian,
          active,
          (counter + pair) * GaussianHash.GOLDEN,
          2 * pair * N);
    }
  }

  private static void drawPair(
      int[] key0, int[] key1, float[] gaussian, int active, int spread, int first) {
    final int second = first + N;
    for (int i = 0; i < active; i += F.length()) {
      IntVector x = IntVector.fromArray(I, key0, i).add(spread);
      x = x.lanewise(VectorOperators.XOR, x.lanewise(VectorOperators.LSHR, 16));
      x = x.mul(GaussianHash.MIX_1);
      x = x.lanewise(VectorOperators.XOR, x.lanewise(VectorOperators.LSHR, 15));
      x = x.lanewise(VectorOperators.XOR, IntVector.fromArray(I, key1, i));
      x = x.mul(GaussianHash.MIX_2);
      x = x.lanewise(VectorOperators.XOR, x.lanewise(VectorOperators.LSHR, 15));
      x = x.mul(GaussianHash.MIX_3);
      x = x.lanewise(VectorOperators.XOR, x.lanewise(VectorOperators.LSHR, 16));

      final FloatVector u =
          x.lanewise(VectorOperators.LSHR, 9)
              .lanewise(VectorOperators.OR, GaussianHash.ONE_BITS)
              .reinterpretAsFloats()
              .sub(GaussianHash.CELL);
      final IntVector ubits = u.reinterpretAsInts();
      final IntVector exponent =
          ubits.sub(GaussianHash.ROOT_HALF_BITS).lanewise(VectorOperators.ASHR, 23);
      final FloatVector power = exponent.add(MAGIC_BITS).reinterpretAsFloats().sub(MAGIC);
      final FloatVector f =
          ubits.sub(exponent.lanewise(VectorOperators.LSHL, 23)).reinterpretAsFloats().sub(1f);
      FloatVector p = FloatVector.broadcast(F, GaussianHash.L6);
      p = p.fma(f, FloatVector.broadcast(F, GaussianHash.L5));
      p = p.fma(f, FloatVector.broadcast(F, GaussianHash.L4));
      p = p.fma(f, FloatVector.broadcast(F, GaussianHash.L3));
      p = p.fma(f, FloatVector.broadcast(F, GaussianHash.L2));
      p = p.fma(f, FloatVector.broadcast(F, GaussianHash.L1));
      p = p.fma(f, FloatVector.broadcast(F, GaussianHash.L0));
      final FloatVector r =
          power
              .fma(FloatVector.broadcast(F, GaussianHash.MINUS_TWO_LN2), p.mul(f))
              .lanewise(VectorOperators.SQRT);

      IntVector angle =
          x.lanewise(VectorOperators.XOR, x.lanewise(VectorOperators.LSHR, 15))
              .mul(GaussianHash.MIX_4);
      angle = angle.lanewise(VectorOperators.XOR, angle.lanewise(VectorOperators.LSHR, 15));
      final FloatVector w =
          angle
              .lanewise(VectorOperators.LSHR, 9)
              .lanewise(VectorOperators.OR, GaussianHash.ONE_BITS)
              .reinterpretAsFloats()
              .sub(1.5f);
      final FloatVector w2 = w.mul(w);
      FloatVector c = FloatVector.broadcast(F, GaussianHash.C4);
      c = c.fma(w2, FloatVector.broadcast(F, GaussianHash.C3));
      c = c.fma(w2, FloatVector.broadcast(F, GaussianHash.C2));
      c = c.fma(w2, FloatVector.broadcast(F, GaussianHash.C1));
      c = c.fma(w2, FloatVector.broadcast(F, GaussianHash.C0));
      final FloatVector cosine =
          c.reinterpretAsInts()
              .lanewise(VectorOperators.XOR, angle.lanewise(VectorOperators.LSHL, 31))
              .reinterpretAsFloats();
      FloatVector s = FloatVector.broadcast(F, GaussianHash.S3);
      s = s.fma(w2, FloatVector.broadcast(F, GaussianHash.S2));
      s = s.fma(w2, FloatVector.broadcast(F, GaussianHash.S1));
      s = s.fma(w2, FloatVector.broadcast(F, GaussianHash.S0));
      r.mul(cosine).intoArray(gaussian, first + i);
      r.mul(s.mul(w)).intoArray(gaussian, second + i);
    }
  }

  /** The cosine of a pair alone; the sine falls into the tile's spare row. */
  @Override
  public void drawReadNoise(Tile tile, int active, int counter) {
    drawPair(tile.key0, tile.key1, tile.readNoise, active, counter * GaussianHash.GOLDEN, 0);
  }

  @Override
  public void step(Tile tile, int active, int offset) {
    final float[] g = tile.gaussian;
    final float[] mx = tile.mx;
    final float[] my = tile.my;
    final float[] mz = tile.mz;
    final int gx = offset * N;
    final int gy = gx + N;
    final int gz = gy + N;
    for (int i = 0; i < active; i += F.length()) {
      final FloatVector a = FloatVector.fromArray(F, tile.alpha, i);
      final FloatVector ay = FloatVector.fromArray(F, tile.minusY, i);
      final FloatVector az = FloatVector.fromArray(F, tile.minusZ, i);
      final FloatVector t = FloatVector.fromArray(F, tile.torque, i);
      final FloatVector s = FloatVector.fromArray(F, tile.sigma, i);
      final FloatVector hx =
          s.fma(FloatVector.fromArray(F, g, gx + i), FloatVector.fromArray(F, tile.fieldX, i));
      final FloatVector hy =
          s.fma(FloatVector.fromArray(F, g, gy + i), FloatVector.fromArray(F, tile.fieldY, i));
      final FloatVector hz =
          s.fma(FloatVector.fromArray(F, g, gz + i), FloatVector.fromArray(F, tile.fieldZ, i));
      final FloatVector x = FloatVector.fromArray(F, mx, i);
      final FloatVector y = FloatVector.fromArray(F, my, i);
      final FloatVector z = FloatVector.fromArray(F, mz, i);
      final FloatVector ahx = a.mul(hx);

      final FloatVector by = ay.fma(y, hy);
      final FloatVector bz = az.fma(z, hz);
      final FloatVector qy = a.fma(by, t);
      final FloatVector qz = a.mul(bz);
      final FloatVector nx = x.neg();
      final FloatVector ny = y.neg();
      final FloatVector nz = z.neg();
      final FloatVector ex = hx.add(y.fma(qz, nz.mul(qy)));
      final FloatVector ey = by.add(z.fma(ahx, nx.mul(qz)));
      final FloatVector ez = bz.add(x.fma(qy, ny.mul(ahx)));
      final FloatVector dx = ey.fma(z, ez.mul(ny));
      final FloatVector dy = ez.fma(x, ex.mul(nz));
      final FloatVector dz = ex.fma(y, ey.mul(nx));

      final FloatVector px = x.add(dx);
      final FloatVector py = y.add(dy);
      final FloatVector pz = z.add(dz);
      final FloatVector cy = ay.fma(py, hy);
      final FloatVector cz = az.fma(pz, hz);
      final FloatVector ry = a.fma(cy, t);
      final FloatVector rz = a.mul(cz);
      final FloatVector ox = px.neg();
      final FloatVector oy = py.neg();
      final FloatVector oz = pz.neg();
      final FloatVector fx = hx.add(py.fma(rz, oz.mul(ry)));
      final FloatVector fy = cy.add(pz.fma(ahx, ox.mul(rz)));
      final FloatVector fz = cz.add(px.fma(ry, oy.mul(ahx)));

      final FloatVector half = FloatVector.broadcast(F, 0.5f);
      final FloatVector one = FloatVector.broadcast(F, 1f);
      final FloatVector ux = half.fma(dx.add(fy.fma(pz, fz.mul(oy))), x);
      final FloatVector uy = half.fma(dy.add(fz.fma(px, fx.mul(oz))), y);
      final FloatVector uz = half.fma(dz.add(fx.fma(py, fy.mul(ox))), z);
      final FloatVector e = one.sub(uz.fma(uz, uy.fma(uy, ux.mul(ux))));
      final FloatVector unit = e.fma(e.fma(FloatVector.broadcast(F, 0.375f), half), one);
      ux.mul(unit).intoArray(mx, i);
      uy.mul(unit).intoArray(my, i);
      uz.mul(unit).intoArray(mz, i);
    }
  }

  @Override
  public void read(Tile tile, int active, ReadConstants c, float time) {
    final FilterStep f = c.filter();
    for (int i = 0; i < active; i += F.length()) {
      final FloatVector x = FloatVector.fromArray(F, tile.mx, i);
      final FloatVector signal =
          x.fma(
              x.fma(FloatVector.broadcast(F, c.quadratic()), FloatVector.broadcast(F, c.linear())),
              FloatVector.broadcast(F, c.constant()));
      final FloatVector input =
          FloatVector.broadcast(F, f.noise())
              .fma(FloatVector.fromArray(F, tile.readNoise, i), signal);
      final FloatVector q = FloatVector.fromArray(F, tile.filtered, i);
      final FloatVector v = FloatVector.fromArray(F, tile.slope, i);
      final FloatVector gap = input.sub(q);
      final FloatVector cross = FloatVector.broadcast(F, f.cross());
      final FloatVector next =
          FloatVector.broadcast(F, f.inputToSignal()).fma(gap, cross.fma(v, q));
      next.intoArray(tile.filtered, i);
      cross.fma(gap, v.mul(f.slope())).intoArray(tile.slope, i);

      // All bits or none by the sign bit: masks are slow on 17, integers are not.
      final IntVector below =
          next.sub(c.low()).reinterpretAsInts().lanewise(VectorOperators.ASHR, 31);
      final IntVector above =
          FloatVector.broadcast(F, c.high())
              .sub(next)
              .reinterpretAsInts()
              .lanewise(VectorOperators.ASHR, 31);
      final IntVector high = IntVector.fromArray(I, tile.high, i);
      final IntVector armed = IntVector.fromArray(I, tile.armed, i).or(below.and(high));
      final IntVector counted = armed.and(above);
      final IntVector date = FloatVector.fromArray(F, tile.firstCount, i).reinterpretAsInts();
      final IntVector first = counted.and(date.lanewise(VectorOperators.ASHR, 31));
      date.and(first.not())
          .or(first.and(Float.floatToRawIntBits(time)))
          .reinterpretAsFloats()
          .intoArray(tile.firstCount, i);
      IntVector.fromArray(I, tile.counts, i).sub(counted).intoArray(tile.counts, i);
      final IntVector notAbove = above.not();
      armed.and(notAbove).intoArray(tile.armed, i);
      high.and(below.not()).or(above).intoArray(tile.high, i);

      final FloatVector z = FloatVector.fromArray(F, tile.mz, i);
      final FloatVector x0 = FloatVector.fromArray(F, tile.lastX, i);
      final FloatVector z0 = FloatVector.fromArray(F, tile.lastZ, i);
      final IntVector turned =
          x0.mul(z).sub(x.mul(z0)).reinterpretAsInts().lanewise(VectorOperators.ASHR, 31);
      final IntVector was = z0.reinterpretAsInts().lanewise(VectorOperators.ASHR, 31);
      final IntVector is = z.reinterpretAsInts().lanewise(VectorOperators.ASHR, 31);
      final IntVector down = is.and(was.or(turned).not());
      final IntVector up = was.and(turned).and(is.not());
      IntVector.fromArray(I, tile.turns, i).add(up).sub(down).intoArray(tile.turns, i);
      x.intoArray(tile.lastX, i);
      z.intoArray(tile.lastZ, i);
    }
  }
}
