package torqueloom.model.dynamics;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import torqueloom.model.random.Streams;

/** Slots as a whole: batches, early end, carry-over, step size. Keys are fixed. */
class SlotEnsembleTest {
  private static final double THERMAL = 1.294e-4;
  private static final MacrospinParameters PINNED =
      new MacrospinParameters(.1, .0741, -.2e-3, 4e-3, 0, 0, THERMAL);

  private static SlotEnsemble pinned(double noise) {
    final double density = noise * noise / (2e9 * Math.PI / (2 * Math.sqrt(2)));
    return SlotEnsemble.of(
        PINNED,
        SignalChain.ofMoment(2e9, density, -.3, .3),
        List.of(new RestLevel(1, 0, 0, 8e-3)),
        1.4e-9);
  }

  private static SlotProgram pulse(double tesla) {
    return new SlotProgram(new TorqueField(tesla, 0), null, TorqueField.NONE, .5e-9, 9.5e-9);
  }

  @Test
  void aTrialIsTheSameInAnyBatch() {
    final SlotEnsemble ensemble = pinned(.1);
    final SlotTrials whole = ensemble.run(pulse(7e-3), 0, 0, 300, 21);
    final SlotTrials first = ensemble.run(pulse(7e-3), 0, 0, 37, 21);
    final SlotTrials rest = ensemble.run(pulse(7e-3), 0, 37, 263, 21);
    assertArrayEquals(Arrays.copyOf(whole.counts(), 37), first.counts());
    assertArrayEquals(Arrays.copyOfRange(whole.counts(), 37, 300), rest.counts());
    assertArrayEquals(Arrays.copyOfRange(whole.halfTurns(), 37, 300), rest.halfTurns());
    assertArrayEquals(Arrays.copyOfRange(whole.latencySeconds(), 37, 300), rest.latencySeconds());
    assertArrayEquals(Arrays.copyOfRange(whole.endLevels(), 37, 300), rest.endLevels());
  }

  @Test
  void anotherKeyGivesAnotherRun() {
    final SlotEnsemble ensemble = pinned(.1);
    assertTrue(
        !Arrays.equals(
            ensemble.run(pulse(6.6e-3), 0, 0, 128, 1).counts(),
            ensemble.run(pulse(6.6e-3), 0, 0, 128, 2).counts()));
  }

  /**
   * With the same noise, a slot ended early must give the outcome of the full one: its criterion
   * promises a chance below about 1e-4 of anything later. 6 x 1024 trials: at most 2 may differ.
   */
  @Test
  void earlyEndChangesNothing() {
    final SlotEnsemble early = pinned(.1);
    final SlotEnsemble full = early.withoutEarlyEnd();
    int different = 0;
    long earlySteps = 0;
    long fullSteps = 0;
    for (final double mt : new double[] {0, 5.5, 6.7, 10, 13.4, 18}) {
      final SlotTrials a = early.run(pulse(mt * 1e-3), 0, 0, 1024, 5);
      final SlotTrials b = full.run(pulse(mt * 1e-3), 0, 0, 1024, 5);
      for (int i = 0; i < 1024; i++) {
        final boolean same =
            a.counts()[i] == b.counts()[i]
                && a.halfTurns()[i] == b.halfTurns()[i]
                && a.endLevels()[i] == b.endLevels()[i];
        different += same ? 0 : 1;
      }
      earlySteps += a.replicaSteps();
      fullSteps += b.replicaSteps();
    }
    assertTrue(different <= 2, different + " differ");
    assertTrue(earlySteps < .6 * fullSteps, "early end spares steps");
  }

  /** The same for a device with two rests (D = 8 mT, Delta 31), whose other level is a deep well. */
  @Test
  void earlyEndChangesNothingBetweenTwoRests() {
    final SlotEnsemble early =
        SlotEnsemble.of(
            new MacrospinParameters(.1, .0741, 8e-3, 0, 0, 0, THERMAL),
            SignalChain.ofMoment(2e9, 0, -.3, .3),
            List.of(new RestLevel(1, 0, 0, 4e-3), new RestLevel(-1, 0, 0, 4e-3)),
            1.4e-9);
    int different = 0;
    long spared = 0;
    for (final double mt : new double[] {6, 8, 12}) {
      for (int rest = 0; rest < 2; rest++) {
        final SlotTrials a = early.run(pulse(mt * 1e-3), rest, 0, 1024, 5);
        final SlotTrials b = early.withoutEarlyEnd().run(pulse(mt * 1e-3), rest, 0, 1024, 5);
        for (int i = 0; i < 1024; i++) {
          final boolean same =
              a.counts()[i] == b.counts()[i] && a.endLevels()[i] == b.endLevels()[i];
          different += same ? 0 : 1;
        }
        spared += b.replicaSteps() - a.replicaSteps();
      }
    }
    assertTrue(different <= 2, different + " differ");
    assertTrue(spared > 0, "early end spares steps");
  }

  /**
   * Where a slot starts without a ring-down, its first states must be equilibrium: the spread of the
   * plane angle against a quadrature of Boltzmann's factor.
   */
  @ParameterizedTest(name = "D = {0} mT")
  @ValueSource(doubles = {-.2, 3, -2})
  void startsHaveTheHarmonicSpread(double imbalance) {
    final MacrospinParameters spin =
        new MacrospinParameters(.1, .0741, imbalance * 1e-3, 4e-3, 0, 0, THERMAL);
    final RestLevel rest = new RestLevel(1, 0, 0, 8e-3);
    double square = 0;
    final int n = 20_000;
    for (int i = 0; i < n; i++) {
      final double[] m = rest.draw(spin, Streams.normal(3, i), Streams.normal(4, i));
      final double angle = Math.atan2(m[2], m[0]);
      square += angle * angle / n;
    }
    double weight = 0;
    double moment = 0;
    for (int i = -1500; i <= 1500; i++) {
      final double phi = i * 1e-3;
      final double p = Math.exp(-(spin.energy(Math.cos(phi), 0, Math.sin(phi)) + 4e-3) / THERMAL);
      weight += p;
      moment += p * phi * phi;
    }
    // Four standard errors, and the anharmonic part: seven per cent at the softest well allowed.
    assertEquals(moment / weight, square, (4 * Math.sqrt(2.0 / n) + .08) * moment / weight);
  }

  @Test
  void noEarlyEndWithMuchNoiseOrASmallBarrier() {
    final SlotTrials noisy = pinned(.32).run(pulse(0), 0, 0, 128, 5);
    assertEquals(
        pinned(.32).withoutEarlyEnd().run(pulse(0), 0, 0, 128, 5).replicaSteps(),
        noisy.replicaSteps());
    final SlotEnsemble weak =
        SlotEnsemble.of(
            new MacrospinParameters(.1, .07, 1e-3, 0, 0, 0, THERMAL),
            SignalChain.ofMoment(2e9, 0, -.3, .3),
            List.of(new RestLevel(1, 0, 0, .5e-3), new RestLevel(-1, 0, 0, .5e-3)),
            1.4e-9);
    assertEquals(
        weak.withoutEarlyEnd().run(pulse(0), 0, 0, 128, 5).replicaSteps(),
        weak.run(pulse(0), 0, 0, 128, 5).replicaSteps());
  }

  @Test
  void anUnpinnedDeviceKeepsItsLevelAndHopsByTheOddHalfTurn() {
    // D = 4 mT, no bias field: rests at +x and -x; a pulse of one half turn leaves the other level.
    final SlotEnsemble balanced =
        SlotEnsemble.of(
            new MacrospinParameters(.1, .0741, 4e-3, 0, 0, 0, THERMAL),
            SignalChain.ofMoment(2e9, 0, -.3, .3),
            List.of(new RestLevel(1, 0, 0, 2e-3), new RestLevel(-1, 0, 0, 2e-3)),
            1.4e-9);
    final SlotTrials quiet = balanced.run(pulse(0), 1, 0, 128, 9);
    assertEquals(128, Arrays.stream(quiet.endLevels()).sum(), 1);
    final SlotTrials driven = balanced.run(pulse(6e-3), 0, 0, 512, 9);
    for (int i = 0; i < 512; i++) {
      assertEquals(Math.floorMod(driven.halfTurns()[i], 2), driven.endLevels()[i], "trial " + i);
    }
  }

  @Test
  void thePreviousSlotIsSimulatedAndNotCounted() {
    final SlotEnsemble ensemble = pinned(0);
    final SlotProgram after =
        new SlotProgram(
            TorqueField.NONE, new TorqueField(10e-3, 0), TorqueField.NONE, .5e-9, 9.5e-9);
    final SlotTrials result = ensemble.run(after, 0, 0, 128, 4);
    assertEquals(0, Arrays.stream(result.counts()).sum());
    final SlotProgram tight =
        new SlotProgram(
            new TorqueField(5.5e-3, 0), new TorqueField(5.5e-3, 0), TorqueField.NONE, .5e-9, .7e-9);
    final SlotProgram alone =
        new SlotProgram(new TorqueField(5.5e-3, 0), null, TorqueField.NONE, .5e-9, .7e-9);
    assertTrue(
        !Arrays.equals(
            ensemble.run(tight, 0, 0, 128, 4).halfTurns(),
            ensemble.run(alone, 0, 0, 128, 4).halfTurns()),
        "a slot too short carries over");
  }

  @Test
  void reversedDriveCountsAlikeAndTurnsBackward() {
    final SlotTrials forward = pinned(0).run(pulse(10e-3), 0, 0, 512, 6);
    final SlotTrials backward = pinned(0).run(pulse(-10e-3), 0, 0, 512, 6);
    assertEquals(mean(forward.counts()), mean(backward.counts()), .02);
    assertEquals(-mean(forward.halfTurns()), mean(backward.halfTurns()), .2);
    assertTrue(mean(forward.halfTurns()) > 1);
    assertEquals(-forward.meanPoleProjection(), backward.meanPoleProjection(), .02);
  }

  private static double mean(int[] values) {
    return Arrays.stream(values).average().orElseThrow();
  }

  @Test
  void aRestThatIsNotThereIsRefused() {
    assertThrows(IllegalArgumentException.class, () -> pinned(0).run(pulse(0), 1, 0, 1, 1));
  }

  /**
   * Weak error of the automatic step: the chance of a count on the steep flank and the mean count,
   * against a quarter of the step. Five standard errors of the difference (false alarm 6e-7).
   */
  @Tag("slow")
  @ParameterizedTest(name = "{0} mT")
  @ValueSource(doubles = {6.6, 12.5, 13.4, 19})
  void stepErrorIsBelowTheStatistics(double tesla) {
    final int trials = 16_384;
    final double coarse = mean(pinned(0).run(pulse(tesla * 1e-3), 0, 0, trials, 31).counts());
    final double fine =
        mean(pinned(0).withStepFactor(.25).run(pulse(tesla * 1e-3), 0, 0, trials, 32).counts());
    assertEquals(fine, coarse, 5 * .5 * Math.sqrt(2.0 / trials));
  }
}
