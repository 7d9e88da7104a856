package torqueloom.model.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Counts of the pinned film against two independent integrators (noiseless readout of 2 GHz,
 * thresholds -0.3/+0.3, pulse 0.5 ns, slot 10 ns, 300 K): none below 5.5 mT, half at 6.7, one from
 * 8 to 12, half at 13.5, two from 15 to 18.5 mT. They print two to three digits, so a point "half
 * at b" is sought within 0.3 mT and a plateau is asked to hold nine tenths at its middle and more
 * than four fifths at its ends. 1024 trials: standard error at most 0.016. Keys are fixed.
 */
class WorkingPointTest {
  private static final int TRIALS = 1024;
  private static final DriveProtocol PROTOCOL = new DriveProtocol(0, false, 7.8e11, .5e-9, 10e-9);

  /** Shares of 0, 1, 2, 3 and more counts at a torque field. */
  private static double[] shares(EasyPlaneFerromagnet device, double tesla) {
    final SlotOutcomes outcomes =
        device
            .simulator(300, PROTOCOL)
            .simulate(
                new SlotRequest(tesla / device.torquePerDrive(300), Double.NaN, 0, 0, TRIALS, 41));
    final double[] shares = new double[4];
    for (final int count : outcomes.counts()) {
      shares[Math.min(3, count)] += 1.0 / TRIALS;
    }
    return shares;
  }

  @ParameterizedTest(name = "{0} mT: {1} counts in at least {2}")
  @CsvSource({
    "4.5, 0, .99",
    "5.5, 0, .90",
    "8, 1, .95",
    "10, 1, .99",
    "11.5, 1, .90",
    "15, 2, .90",
    "16.5, 2, .97",
    "18.5, 2, .80"
  })
  void plateaus(double millitesla, int count, double share) {
    final double[] shares = shares(Ferromagnets.noiselessReadout(1.379e-3), millitesla * 1e-3);
    assertTrue(shares[count] >= share, Arrays.toString(shares));
  }

  @Test
  void halfwayPoints() {
    final EasyPlaneFerromagnet device = Ferromagnets.noiselessReadout(1.379e-3);
    assertTrue(shares(device, 6.4e-3)[0] > .5 && shares(device, 7.0e-3)[0] < .5);
    assertTrue(shares(device, 13.0e-3)[1] > .5 && shares(device, 13.8e-3)[1] < .5);
  }

  /**
   * Six millitesla of imbalance move the steps: up by some 3 mT where the film normal gets harder,
   * down by 1 mT where it gets easier and the moment rests tilted out of the film (here toward +z,
   * the first of the two rests; from the other one 0.29 and 0.72 count instead). Shares of slots
   * with at least one and at least two counts, computed independently with numpy (700 to 2000
   * trials, two-pole filter): 5 standard errors of both samples together, at most 0.11.
   */
  @ParameterizedTest(name = "K_i shifted by {0} uJ/m², {1} mT, at least {2}")
  @CsvSource({"-9.6, 6.5, 1, 0", "-9.6, 10, 1, .78", "9.6, 5.5, 1, .87", "9.6, 13.5, 2, .94"})
  void imbalanceMovesTheSteps(double shift, double drive, int least, double share) {
    final EasyPlaneFerromagnet device = Ferromagnets.noiselessReadout(1.379e-3 + shift * 1e-6);
    assertEquals(6e-3, Math.abs(device.imbalance(300)), .2e-3);
    final double[] shares = shares(device, drive * 1e-3);
    assertEquals(share, Arrays.stream(shares).skip(least).sum(), .11);
  }

  /**
   * A read voltage of 6 mV leaves so little signal that noise is a third of the half swing; quiet
   * slots then count at Rice's rate, raised by the moment's own thermal motion.
   */
  @Test
  void readoutNoiseIsSimulated() {
    final EasyPlaneFerromagnet weak = Ferromagnets.withReadVoltage(.006);
    final double rice = weak.summarize(300, PROTOCOL).number("falseCountsPerSlot").orElseThrow();
    final int trials = 8192;
    final SlotOutcomes outcomes =
        weak.simulator(300, PROTOCOL).simulate(new SlotRequest(0, Double.NaN, 0, 0, trials, 43));
    final double share = Arrays.stream(outcomes.counts()).sum() / (double) trials;
    assertTrue(share > .8 * rice && share < 4 * rice, share + " against " + rice);
  }

  /**
   * Through the film's own resistance (cosine squared) each half turn is a spike: a full turn,
   * which a junction counts once, counts at least twice (a swing past 54 degrees on the way back is
   * a spike as well). Quiet slots count nothing.
   */
  @Test
  void anisotropicMagnetoresistanceCountsHalfTurns() {
    final EasyPlaneFerromagnet device = Ferromagnets.anisotropicReadout();
    final SlotSimulator simulator = device.simulator(300, PROTOCOL);
    final SlotOutcomes driven =
        simulator.simulate(
            new SlotRequest(12e-3 / device.torquePerDrive(300), Double.NaN, 0, 0, 512, 44));
    int turned = 0;
    for (int i = 0; i < 512; i++) {
      if (driven.halfTurns()[i] == 2) {
        turned++;
        assertTrue(driven.counts()[i] >= 2, "trial " + i);
      }
    }
    assertTrue(turned > 500, turned + " of 512 made one full turn");
    final SlotOutcomes quiet = simulator.simulate(new SlotRequest(0, Double.NaN, 0, 0, 512, 45));
    assertEquals(0, Arrays.stream(quiet.counts()).sum());
  }
}
