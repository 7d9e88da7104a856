package torqueloom.model.dynamics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import torqueloom.model.constants.PhysicalConstants;
import torqueloom.model.magnet.EquilibriumPlane;

/**
 * Exact nonlinear solutions, invariants, and the driven easy plane. The exact solutions follow from
 * the explicit equation of motion with everything along p; the running frequencies were computed
 * independently with scipy. Our axes (x, y, z) are the literature's (x, z, y) with p along the last.
 */
class ReferenceMacrospinTest {
  private static final double GAMMA = PhysicalConstants.GYROMAGNETIC_RATIO;

  @Test
  void axialSolution() {
    // tanh(atanh u0 + gamma (a B + B_DL) t/(1+a²)); 5.585421733 turns about p.
    final MacrospinParameters spin = new MacrospinParameters(.05, 0, 0, 0, .1, 0, 0);
    final double u0 = -.9;
    final ReferenceMacrospin m =
        new ReferenceMacrospin(spin, new TorqueField(2e-3, 0), Math.sqrt(1 - u0 * u0), u0, 0);
    double turned = 0;
    double[] last = m.moment();
    final int steps = 40_000;
    for (int i = 0; i < steps; i++) {
      m.rungeKutta(2e-9 / steps);
      final double[] now = m.moment();
      // Counter-clockwise seen from the tip of y is from z toward x.
      turned +=
          Math.atan2(last[2] * now[0] - last[0] * now[2], last[2] * now[2] + last[0] * now[0]);
      last = now;
    }
    assertEquals(.756010101, last[1], 1e-8);
    assertEquals(5.585421733, turned / (2 * Math.PI), 1e-8);
  }

  @Test
  void uniaxialRelaxation() {
    // u/sqrt(1-u²) grows as exp(a gamma B_k t/(1+a²)).
    final MacrospinParameters spin = new MacrospinParameters(.05, -.2, 0, 0, 0, 0, 0);
    final ReferenceMacrospin m =
        new ReferenceMacrospin(spin, TorqueField.NONE, Math.sqrt(.99), .1, 0);
    for (int i = 0; i < 20_000; i++) {
      m.rungeKutta(1e-9 / 20_000);
    }
    assertEquals(.503083630, m.moment()[1], 1e-9);
  }

  @Test
  void energyIsKeptWithoutDampingAndLostByTheRateOfMotionWithIt() {
    final MacrospinParameters free = new MacrospinParameters(0, .07, -.002, .004, .001, .002, 0);
    final ReferenceMacrospin m = new ReferenceMacrospin(free, TorqueField.NONE, .3, .5, .7);
    final double start = energy(free, m);
    for (int i = 0; i < 20_000; i++) {
      m.rungeKutta(1e-13);
    }
    assertEquals(start, energy(free, m), 1e-13);
    assertEquals(1, norm(m.moment()), 1e-14);

    final MacrospinParameters damped = new MacrospinParameters(.1, .07, -.002, .004, .001, .002, 0);
    final ReferenceMacrospin d = new ReferenceMacrospin(damped, TorqueField.NONE, .3, .5, .7);
    final double[] rate = d.rate(d.moment(), new double[3]);
    final double before = energy(damped, d);
    final double dt = 1e-16;
    d.rungeKutta(dt);
    final double expected =
        -.1 / GAMMA * (rate[0] * rate[0] + rate[1] * rate[1] + rate[2] * rate[2]);
    assertEquals(expected, (energy(damped, d) - before) / dt, 1e-4 * Math.abs(expected));
  }

  private static double energy(MacrospinParameters spin, ReferenceMacrospin m) {
    final double[] v = m.moment();
    return spin.energy(v[0], v[1], v[2]);
  }

  private static double norm(double[] v) {
    return Math.sqrt(v[0] * v[0] + v[1] * v[1] + v[2] * v[2]);
  }

  @Test
  void orderOfTheSchemes() {
    assertEquals(4, order(true), .15);
    assertEquals(2, order(false), .15);
  }

  /** Exponent of the error against the exact relaxation between two steps. */
  private static double order(boolean rungeKutta) {
    return Math.log(error(rungeKutta, 250) / error(rungeKutta, 500)) / Math.log(2);
  }

  private static double error(boolean rungeKutta, int steps) {
    final MacrospinParameters spin = new MacrospinParameters(.05, -.2, 0, 0, 0, 0, 0);
    final ReferenceMacrospin m =
        new ReferenceMacrospin(spin, TorqueField.NONE, Math.sqrt(.99), .1, 0);
    for (int i = 0; i < steps; i++) {
      if (rungeKutta) {
        m.rungeKutta(1e-9 / steps);
      } else {
        m.heun(1e-9 / steps, new double[3]);
      }
    }
    final double c = .1 / Math.sqrt(.99) * Math.exp(.05 * GAMMA * .2 * 1e-9 / (1 + .05 * .05));
    return Math.abs(m.moment()[1] - c / Math.sqrt(1 + c * c));
  }

  @Test
  void positiveTorqueTurnsFromXTowardZ() {
    final MacrospinParameters spin = new MacrospinParameters(.1, .05, 0, 0, 0, 0, 0);
    final ReferenceMacrospin m = new ReferenceMacrospin(spin, new TorqueField(1e-3, 0), 1, 0, 0);
    for (int i = 0; i < 1000; i++) {
      m.rungeKutta(1e-12);
    }
    assertTrue(m.moment()[2] > .1, "m_z grows");
    assertTrue(m.moment()[1] > 0, "m leans toward p");
  }

  /** A slow ramp loses its equilibrium at the threshold, whatever damping, hard and like field. */
  @ParameterizedTest(name = "alpha {0}, D {1}, Y {2}, B_b {3}, ratio {4}")
  @CsvSource({
    ".1, 4e-3, .07, 0, 0",
    ".02, .33e-3, .05, 0, 0",
    ".1, -.2e-3, .074, 4e-3, 0",
    ".1, 4e-3, .07, 2e-3, 0",
    ".1, 4e-3, .07, 0, .5"
  })
  void thresholdBySlowRamp(double alpha, double d, double y, double bias, double ratio) {
    final double threshold = new EquilibriumPlane(d, bias).threshold();
    final MacrospinParameters spin = new MacrospinParameters(alpha, y, d, bias, 0, 0, 0);
    final ReferenceMacrospin m =
        new ReferenceMacrospin(spin, TorqueField.NONE, Math.cos(1e-3), 0, Math.sin(1e-3));
    final double step = .05 / (GAMMA * y);
    // Slow against the ring-down 2/(alpha gamma Y).
    final double duration = 400 * 2 / (alpha * GAMMA * y) + 40 / (GAMMA * threshold * alpha);
    double lost = 0;
    for (double t = 0; t < duration && lost == 0; t += step) {
      final double drive = threshold * (.8 + .4 * t / duration);
      m.drive(new TorqueField(drive, ratio * drive));
      m.rungeKutta(step);
      if (m.moment()[0] < -.8) {
        lost = drive;
      }
    }
    assertEquals(1, lost / threshold, .03);
  }

  /**
   * Running from rest at i = B_DL/B_DL,c (full turns, GHz): independent integration of the same
   * equation; above the upper limit the moment locks at the pole.
   */
  @ParameterizedTest(name = "alpha {0}, B_a {1}, B_h {2}, i {3}: {4} GHz")
  @CsvSource({
    ".05, 1e-3, .5, 1.2, .25194", ".05, 1e-3, .5, 2, .53952", ".02, .33e-3, .05, 1.2, .27716",
    ".02, .33e-3, .05, 2, .46234", ".01, 1e-3, .1, 1.2, 1.6814", ".01, 1e-3, .1, 5, 0",
    ".02, 5e-3, .1, 1.2, 0", ".005, 1e-3, .1, 1.2, 0"
  })
  void runningFrequencyAndTheUpperLimit(
      double alpha, double easy, double hard, double i, double gigahertz) {
    // Easy x, middle z, hard y: Y = hard + easy, D = easy.
    final MacrospinParameters spin = new MacrospinParameters(alpha, hard + easy, easy, 0, 0, 0, 0);
    final ReferenceMacrospin m =
        new ReferenceMacrospin(spin, new TorqueField(i * easy / 2, 0), 1, 0, 1e-3);
    final double settle = 20 * 2 / (alpha * GAMMA * hard);
    windings(m, hard, settle);
    final double duration = 40e-9;
    final double measured = windings(m, hard, duration) / duration;
    // Whole turns are not awaited: the phase within the last one is worth up to 0.4 per cent.
    assertEquals(gigahertz, measured * 1e-9, gigahertz == 0 ? 1e-6 : .004 * gigahertz);
  }

  /** Full turns in a time, from x toward z; nothing at the pole. */
  private static double windings(ReferenceMacrospin m, double hard, double duration) {
    final int steps = (int) Math.ceil(duration * GAMMA * hard / .1);
    double turned = 0;
    double[] last = m.moment();
    for (int k = 0; k < steps; k++) {
      m.rungeKutta(duration / steps);
      final double[] now = m.moment();
      if (now[1] < .999) {
        turned +=
            Math.atan2(last[0] * now[2] - last[2] * now[0], last[0] * now[0] + last[2] * now[2]);
      }
      last = now;
    }
    return turned / (2 * Math.PI);
  }
}
