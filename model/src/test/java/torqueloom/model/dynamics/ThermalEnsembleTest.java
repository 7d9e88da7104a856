package torqueloom.model.dynamics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import torqueloom.model.constants.PhysicalConstants;
import torqueloom.model.magnet.SpinTorque;

/**
 * The stochastic ensemble against exact statistics: W. F. Brown, Phys. Rev. 130, 1677 (1963), and
 * Boltzmann averages by quadrature; lifetimes are the slowest eigenvalue of the Fokker-Planck
 * equation. All numbers computed independently with scipy. Keys are fixed. Tolerances are four
 * standard errors of the estimate (false alarm 6e-5 a comparison) plus, where named, the weak error
 * of the step.
 */
class ThermalEnsembleTest {
  private static final double GAMMA = PhysicalConstants.GYROMAGNETIC_RATIO;

  /** M_s = 8e5 A/m, 50 x 40 x 1.5 nm³, 300 K. */
  private static double exampleThermalField() {
    return SpinTorque.thermalField(300, 8e5, 50e-9 * 40e-9 * 1.5e-9);
  }

  private static EnsembleKernel kernel() {
    return KernelChoice.current().kernel();
  }

  @Test
  void deviationOfTheThermalField() {
    assertEquals(19.79996e-3, ThermalNoise.deviation(.02, exampleThermalField(), 1e-12), 1e-8);
  }

  @Test
  void freeSpinForgetsItsDirection() {
    // <m> decays with M_s V (1 + a²)/(2 a gamma k T) = 82.2992 ns.
    final MacrospinParameters spin =
        new MacrospinParameters(.02, 0, 0, 0, 0, 0, exampleThermalField());
    final int replicas = 32_768;
    final Ensembles free =
        new Ensembles(spin, TorqueField.NONE, replicas, 5e-11, 1, kernel(), .48, .6, .64);
    final double time = free.advance(60e-9);
    free.run(60e-9);
    final double expected = Math.exp(-time / 82.2992e-9);
    // One component of a nearly isotropic vector spreads by at most 1/sqrt(3) ... 0.6.
    final double error = .6 / Math.sqrt(replicas);
    assertEquals(.48 * expected, free.mean(0), 4 * error);
    assertEquals(.6 * expected, free.mean(1), 4 * error);
    assertEquals(.64 * expected, free.mean(2), 4 * error);
  }

  @ParameterizedTest(name = "xi = {0}")
  @CsvSource({".5, .1639534", "2, .5373147", "5, .8000908"})
  void langevinFunction(double xi, double expected) {
    final double thermal = 5e-3;
    final double field = xi * thermal;
    final MacrospinParameters spin = new MacrospinParameters(.5, 0, 0, field, 0, 0, thermal);
    final int replicas = 8192;
    final double step = Math.min(Ensembles.step(spin), 1e-11);
    final Ensembles ensemble =
        new Ensembles(spin, TorqueField.NONE, replicas, step, 2, kernel(), 1, 0, 0);
    double mean = 0;
    // Relaxation 1/(gamma alpha (thermal + field)) about 2 ns; samples half as far apart.
    ensemble.run(10e-9);
    final int samples = 12;
    for (int i = 0; i < samples; i++) {
      mean += ensemble.run(3e-9).mean(0) / samples;
    }
    // Taken as half the samples independent; deviation of m_x at most 0.58.
    assertEquals(expected, mean, 4 * .58 / Math.sqrt(replicas * samples / 2.0));
  }

  @ParameterizedTest(name = "Delta = {0}")
  @CsvSource({"4, .7046266, .8144315", "6, .8077087, .8888334", "8, .8620689, .9242587"})
  void uniaxialAverages(double delta, double square, double absolute) {
    final double bk = .1;
    final MacrospinParameters spin = new MacrospinParameters(.2, 0, -bk, 0, 0, 0, bk / (2 * delta));
    final Sampler sampler = new Sampler(spin, 2048, 3, 0, 0, 1);
    final double[] sums = new double[2];
    sampler.sample(
        2e-9,
        .6e-9,
        10,
        m -> {
          sums[0] += m[2] * m[2];
          sums[1] += Math.abs(m[2]);
        });
    // Samples one relaxation time apart: taken as half independent; deviations below 0.3 and 0.2.
    final double independent = sampler.taken() / 2.0;
    assertEquals(square, sums[0] / sampler.taken(), 4 * .3 / Math.sqrt(independent));
    assertEquals(absolute, sums[1] / sampler.taken(), 4 * .2 / Math.sqrt(independent));
  }

  @Test
  void uniaxialHistogram() {
    final double[] expected = {
      .002704, .003053, .003890, .005596, .009087, .016658, .034469, .080510, .212273, .631760
    };
    final double bk = .1;
    final MacrospinParameters spin = new MacrospinParameters(.2, 0, -bk, 0, 0, 0, bk / 12);
    final Sampler sampler = new Sampler(spin, 4096, 4, 0, 0, 1);
    final int[] cells = new int[10];
    sampler.sample(3e-9, .6e-9, 10, m -> cells[Math.min(9, (int) (10 * Math.abs(m[2])))]++);
    compareHistogram(expected, cells, sampler.taken());
  }

  private static void compareHistogram(double[] expected, int[] cells, int taken) {
    for (int i = 0; i < cells.length; i++) {
      final double p = expected[i];
      final double error = Math.sqrt(p * (1 - p) / (taken / 2.0));
      assertEquals(p, (double) cells[i] / taken, 4 * error, "cell " + i);
    }
  }

  @ParameterizedTest(name = "Delta = {0}")
  @CsvSource({
    "4, .837220, .011528, 1.112249",
    "6, .897226, .007644, 1.075264",
    "8, .925993, .005718, 1.049499"
  })
  void biaxialAverages(double delta, double easySquare, double hardSquare, double energy) {
    // Easy x, middle z, hard y; hard over easy field 10.
    final double easy = 10e-3;
    final MacrospinParameters spin =
        new MacrospinParameters(.1, 11 * easy, easy, 0, 0, 0, easy / (2 * delta));
    final Sampler sampler = new Sampler(spin, 2048, 5, 1, 0, 0);
    final double[] sums = new double[3];
    sampler.sample(
        4e-9,
        1e-9,
        12,
        m -> {
          sums[0] += m[0] * m[0];
          sums[1] += m[1] * m[1];
          sums[2] += spin.energy(m[0], m[1], m[2]) / spin.thermalField();
        });
    final double independent = sampler.taken() / 3.0;
    assertEquals(easySquare, sums[0] / sampler.taken(), 4 * .25 / Math.sqrt(independent));
    assertEquals(
        hardSquare, sums[1] / sampler.taken(), 4 * 1.5 * hardSquare / Math.sqrt(independent));
    assertEquals(energy, sums[2] / sampler.taken(), 4 * 1.1 / Math.sqrt(independent));
  }

  @Test
  void biaxialHistogramOfTheAngle() {
    // Angle between the moment's projection on the easy plane and the easy axis, 15-degree cells;
    // the four quadrants are folded into one, so the printed quarter shares count four times.
    final double[] quarter = {.150321, .073170, .020402, .004454, .001143, .000511};
    final double[] expected = new double[6];
    for (int i = 0; i < 6; i++) {
      expected[i] = 4 * quarter[i];
    }
    final double easy = 10e-3;
    final MacrospinParameters spin =
        new MacrospinParameters(.1, 11 * easy, easy, 0, 0, 0, easy / 12);
    final Sampler sampler = new Sampler(spin, 4096, 6, 1, 0, 0);
    final int[] cells = new int[6];
    sampler.sample(
        4e-9,
        1.5e-9,
        8,
        m -> {
          final double angle = Math.toDegrees(Math.atan2(Math.abs(m[2]), Math.abs(m[0])));
          cells[Math.min(5, (int) (angle / 15))]++;
        });
    compareHistogram(expected, cells, sampler.taken());
  }

  /** Exact lifetime 2/lambda_1 = 35.3424 ns; Brown's asymptote would be 27.754 ns. */
  @Test
  void uniaxialLifetime() {
    assertLifetime(uniaxial(4), 8192, 35.3424e-9, 5e-9, 25e-9, 2);
  }

  /** The same, and the next barrier, to a few per cent. */
  @Tag("slow")
  @ParameterizedTest(name = "Delta = {0}")
  @CsvSource({"4, 35.3424e-9, 30e-9", "5, 84.7203e-9, 60e-9"})
  void uniaxialLifetimeClosely(double delta, double lifetime, double last) {
    assertLifetime(uniaxial(delta), 65_536, lifetime, 5e-9, last, 2);
  }

  /** Biaxial, two-dimensional Fokker-Planck equation: B_a = 20 mT, B_h = 0.2 T, Delta = 4. */
  @Tag("slow")
  @ParameterizedTest(name = "alpha = {0}")
  @CsvSource({".02, 59.14e-9", ".05, 31.48e-9", ".2, 22.142e-9"})
  void biaxialLifetime(double damping, double lifetime) {
    final double easy = 20e-3;
    final MacrospinParameters spin =
        new MacrospinParameters(damping, .2 + easy, easy, 0, 0, 0, easy / 8);
    assertLifetime(spin, 32_768, lifetime, 8e-9, 30e-9, 0);
  }

  private static MacrospinParameters uniaxial(double delta) {
    return new MacrospinParameters(.1, 0, -.1, 0, 0, 0, .1 / (2 * delta));
  }

  /** Decay of the mean along the easy axis between two times: exp(-2 (t2 - t1)/lifetime). */
  private static void assertLifetime(
      MacrospinParameters spin,
      int replicas,
      double lifetime,
      double first,
      double last,
      int axis) {
    final double[] start = new double[3];
    start[axis] = 1;
    final Ensembles ensemble =
        new Ensembles(
            spin,
            TorqueField.NONE,
            replicas,
            Ensembles.step(spin),
            7,
            kernel(),
            start[0],
            start[1],
            start[2]);
    final double before = ensemble.run(first).mean(axis);
    final double after = ensemble.run(last - first).mean(axis);
    final double measured = 2 * ensemble.advance(last - first) / Math.log(before / after);
    final double spread =
        Math.sqrt(1 / (before * before) + 1 / (after * after)) / Math.sqrt(replicas);
    final double error = lifetime * spread / Math.log(before / after);
    assertEquals(lifetime, measured, 4 * error + .01 * lifetime);
  }

  /** Draws directions of a relaxed ensemble at intervals. */
  private static final class Sampler {
    private final Ensembles ensemble;
    private int taken;

    Sampler(MacrospinParameters spin, int replicas, long key, double x, double y, double z) {
      ensemble =
          new Ensembles(
              spin, TorqueField.NONE, replicas, Ensembles.step(spin), key, kernel(), x, y, z);
    }

    void sample(
        double relax, double interval, int times, java.util.function.Consumer<double[]> use) {
      ensemble.run(relax);
      for (int i = 0; i < times; i++) {
        ensemble.run(interval);
        ensemble.forEach(
            m -> {
              taken++;
              use.accept(m);
            });
      }
    }

    int taken() {
      return taken;
    }
  }

  @Test
  void deterministicKernelFollowsTheReference() {
    // Without noise the float kernel must track the double Runge-Kutta trajectory through a pulse.
    final MacrospinParameters spin = new MacrospinParameters(.1, .074, -.2e-3, 4e-3, 0, 0, 0);
    final TorqueField torque = new TorqueField(8e-3, .8e-3);
    final double step = 2.5e-12;
    final Ensembles ensemble = new Ensembles(spin, torque, 128, step, 8, kernel(), .6, .1, -.4);
    final ReferenceMacrospin exact = new ReferenceMacrospin(spin, torque, .6, .1, -.4);
    for (int i = 0; i < 40; i++) {
      ensemble.run(2 * step);
      for (int k = 0; k < 20; k++) {
        exact.rungeKutta(step / 10);
      }
      final double[] m = exact.moment();
      for (int c = 0; c < 3; c++) {
        assertEquals(m[c], ensemble.mean(c), 2e-5 + 4 * Math.pow(GAMMA * .086 * step, 3) * i);
      }
    }
  }
}
