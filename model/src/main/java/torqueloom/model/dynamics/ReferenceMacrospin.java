package torqueloom.model.dynamics;

import torqueloom.model.constants.PhysicalConstants;
import torqueloom.model.random.Streams;

/**
 * One macrospin in double precision: the reference for the ensemble kernels, and the integrator for
 * noise-free trajectories. Not for large ensembles.
 *
 * <p>Explicit Landau-Lifshitz-Gilbert equation with p = y:
 * (1 + a²) dm/dt = gamma { -m x B - a m x (m x B) - B_DL [m x (m x p) - a m x p] - B_FL [m x p +
 * a m x (m x p)] }. J. C. Slonczewski, J. Magn. Magn. Mater. 159, L1 (1996), for the torque, from
 * memory. Mutable, used by one thread.
 */
public final class ReferenceMacrospin {
  private final MacrospinParameters spin;
  private TorqueField torque;
  private final double[] moment = new double[3];
  private double time;

  /**
   * @param spin parameters
   * @param torque spin torque
   * @param direction first direction, normalized here
   */
  public ReferenceMacrospin(MacrospinParameters spin, TorqueField torque, double... direction) {
    this.spin = spin;
    this.torque = torque;
    final double length =
        Math.sqrt(
            direction[0] * direction[0]
                + direction[1] * direction[1]
                + direction[2] * direction[2]);
    for (int i = 0; i < 3; i++) {
      moment[i] = direction[i] / length;
    }
  }

  /** The unit moment, a copy. */
  public double[] moment() {
    return moment.clone();
  }

  /** Time since the start (s). */
  public double time() {
    return time;
  }

  /** Changes the torque from now on. */
  public void drive(TorqueField next) {
    torque = next;
  }

  /** Rate of change of a direction under an extra field (1/s). */
  double[] rate(double[] m, double[] extra) {
    final double bx = spin.fieldX() + extra[0];
    final double by = spin.fieldY() + extra[1] - spin.excessY() * m[1];
    final double bz = spin.fieldZ() + extra[2] - spin.excessZ() * m[2];
    final double[] mxb = cross(m, new double[] {bx, by, bz});
    final double[] mxmxb = cross(m, mxb);
    final double[] mxp = cross(m, new double[] {0, 1, 0});
    final double[] mxmxp = cross(m, mxp);
    final double a = spin.damping();
    final double dl = torque.dampingLike();
    final double fl = torque.fieldLike();
    final double scale = PhysicalConstants.GYROMAGNETIC_RATIO / (1 + a * a);
    final double[] rate = new double[3];
    for (int i = 0; i < 3; i++) {
      rate[i] =
          scale
              * (-mxb[i]
                  - a * mxmxb[i]
                  - dl * (mxmxp[i] - a * mxp[i])
                  - fl * (mxp[i] + a * mxmxp[i]));
    }
    return rate;
  }

  private static double[] cross(double[] a, double[] b) {
    return new double[] {
      a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]
    };
  }

  /** One Runge-Kutta step of fourth order without noise; the length is restored afterwards. */
  public void rungeKutta(double step) {
    final double[] still = new double[3];
    final double[] k1 = rate(moment, still);
    final double[] k2 = rate(moved(moment, k1, step / 2), still);
    final double[] k3 = rate(moved(moment, k2, step / 2), still);
    final double[] k4 = rate(moved(moment, k3, step), still);
    for (int i = 0; i < 3; i++) {
      moment[i] += step / 6 * (k1[i] + 2 * k2[i] + 2 * k3[i] + k4[i]);
    }
    finish(step);
  }

  /** One Heun step under a field held over the step (T), e.g. the thermal one. */
  public void heun(double step, double[] extra) {
    final double[] first = rate(moment, extra);
    final double[] second = rate(moved(moment, first, step), extra);
    for (int i = 0; i < 3; i++) {
      moment[i] += step / 2 * (first[i] + second[i]);
    }
    finish(step);
  }

  /**
   * One Heun step with the thermal field.
   *
   * @param key stream of normal numbers
   * @param counter uses counter, +1 and +2
   */
  public void stochasticHeun(double step, long key, long counter) {
    final double sigma = ThermalNoise.deviation(spin.damping(), spin.thermalField(), step);
    heun(
        step,
        new double[] {
          sigma * Streams.normal(key, counter),
          sigma * Streams.normal(key, counter + 1),
          sigma * Streams.normal(key, counter + 2)
        });
  }

  private static double[] moved(double[] m, double[] rate, double step) {
    return new double[] {m[0] + step * rate[0], m[1] + step * rate[1], m[2] + step * rate[2]};
  }

  private void finish(double step) {
    final double length =
        Math.sqrt(moment[0] * moment[0] + moment[1] * moment[1] + moment[2] * moment[2]);
    for (int i = 0; i < 3; i++) {
      moment[i] /= length;
    }
    time += step;
  }
}
