package torqueloom.model.dynamics;

import java.util.List;

/**
 * When a replica may end before its slot does, because nothing more can happen that counts.
 *
 * <p>A replica is settled at a rest when all of this holds. Its energy above the rest is below a
 * quarter of the smallest energy that leads to another count or another rest, and at least 14 k_B T
 * short of it, more in slots longer than 10 ns (an escape at attempts of 1 GHz then has a chance
 * below 1e-5 in the slot). The way to a count counts as open as soon as the signal is within five
 * standard deviations of the readout's noise from the threshold, so noise cannot complete it
 * either. The comparator stands where the rest holds it, and filter output and slope are near the
 * rest's. The continuous drive is weak. A rest with a small barrier, or a readout with much noise,
 * therefore never ends a replica early.
 */
final class SettleRule {
  private static final double SHARE = 0.25;
  private static final double MARGIN = 14;

  /** Slot for which the margin gives its chance (s). */
  private static final double MARGIN_SLOT = 10e-9;

  private static final double NOISE_MARGIN = 5;
  private static final double WEAK_DRIVE = 0.1;
  private static final int SCAN = 2000;

  private final MacrospinParameters spin;
  private final SignalChain chain;
  private final List<RestLevel> rests;
  private final double[] ceiling;
  private final boolean ever;

  SettleRule(
      MacrospinParameters spin,
      SignalChain chain,
      List<RestLevel> rests,
      TorqueField background,
      double slot) {
    this.spin = spin;
    this.chain = chain;
    this.rests = rests;
    this.ceiling = new double[rests.size()];
    // Ten times the slot has ten times the escapes: ln(10) k_B T more.
    final double margin = MARGIN + Math.max(0, StrictMath.log(slot / MARGIN_SLOT));
    boolean any = false;
    for (int r = 0; r < ceiling.length; r++) {
      final double limit = Math.min(rests.get(r).barrier(), energyToCount(r));
      final boolean weak = Math.PI * background.largest() <= WEAK_DRIVE * limit;
      ceiling[r] = weak ? Math.min(SHARE * limit, limit - margin * spin.thermalField()) : 0;
      any |= ceiling[r] > 0;
    }
    ever = any && spin.fieldY() == 0 && spin.fieldZ() == 0;
  }

  /** Whether any replica can ever settle. */
  boolean possible() {
    return ever;
  }

  private boolean restsHigh(int r) {
    return chain.signal(rests.get(r).x()) >= 0.5 * (chain.low() + chain.high());
  }

  /** Least energy above the rest at which the signal comes near the threshold that matters (T). */
  private double energyToCount(int r) {
    final double guard = NOISE_MARGIN * chain.filteredNoise();
    final boolean high = restsHigh(r);
    final double level = high ? chain.low() + guard : chain.high() - guard;
    final double rest = chain.signal(rests.get(r).x());
    if (high ? rest <= level : rest >= level) {
      return 0;
    }
    final double top = Math.min(climb(r, level, high, 1), climb(r, level, high, -1));
    return Math.max(0, top - restEnergy(r));
  }

  /**
   * Highest energy met on the way of least energy from a rest to the level, with m_x going one way;
   * infinite when that way ends at a tip of the sphere first.
   */
  private double climb(int r, double level, boolean high, int direction) {
    final double soft = Math.min(spin.excessY(), spin.excessZ());
    double top = restEnergy(r);
    for (int i = 1; i <= SCAN; i++) {
      final double mx = rests.get(r).x() + direction * 2.0 * i / SCAN;
      if (Math.abs(mx) > 1) {
        return Double.POSITIVE_INFINITY;
      }
      top = Math.max(top, 0.5 * soft * (1 - mx * mx) - spin.fieldX() * mx);
      final double signal = chain.signal(mx);
      if (high ? signal <= level : signal >= level) {
        return top;
      }
    }
    return Double.POSITIVE_INFINITY;
  }

  private double restEnergy(int r) {
    final RestLevel rest = rests.get(r);
    return spin.energy(rest.x(), rest.y(), rest.z());
  }

  /** Whether replica i of the tile is settled. */
  boolean settled(Tile tile, int i) {
    final int r = nearest(tile.mx[i], tile.my[i], tile.mz[i]);
    final double energy = spin.energy(tile.mx[i], tile.my[i], tile.mz[i]) - restEnergy(r);
    if (energy >= ceiling[r]) {
      return false;
    }
    final boolean high = restsHigh(r);
    if (high != (tile.high[i] != 0)) {
      return false;
    }
    final double threshold = high ? chain.low() : chain.high();
    final double rest = chain.signal(rests.get(r).x());
    final double distance = Math.abs(rest - threshold);
    return Math.abs(tile.filtered[i] - rest) < 0.5 * distance
        && Math.abs(tile.slope[i]) < 0.25 * distance;
  }

  /** Index of the rest nearest to a direction. */
  int nearest(double mx, double my, double mz) {
    int best = 0;
    double closest = Double.NEGATIVE_INFINITY;
    for (int r = 0; r < rests.size(); r++) {
      final RestLevel rest = rests.get(r);
      final double projection = rest.x() * mx + rest.y() * my + rest.z() * mz;
      if (projection > closest) {
        closest = projection;
        best = r;
      }
    }
    return best;
  }
}
