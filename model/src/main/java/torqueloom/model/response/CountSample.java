package torqueloom.model.response;

import java.util.Arrays;
import java.util.SortedMap;
import java.util.TreeMap;
import torqueloom.model.device.SlotOutcomes;
import torqueloom.model.device.SlotRequest;
import torqueloom.model.device.SlotSimulator;

/** Counts, half turns and latencies of the trials at one drive in one state, gathered by batch. */
final class CountSample {
  /** Trials in a batch; the stopping rule looks only at these borders. */
  static final int BATCH = 128;

  private int[] counts = new int[2];
  private final SortedMap<Integer, Integer> halfTurns = new TreeMap<>();
  private int trials;
  private int timed;
  private double latencyMean;
  private double latencySquares;
  private long replicaSteps;

  /**
   * Runs trials until every P(n), those of counts not seen included, has a 95 % Wilson interval of at
   * most a half-width, or the trials are used up. Trial k is the same whatever the batch; batching
   * enters only through where it stops. The rule reads only widths, not whether a count is likely, but
   * as any rule that looks at the data it costs a little coverage.
   *
   * @param prototype drive, state and stream key; its trial numbers are not used
   * @param halfWidth (1); 0 runs all trials
   * @param maximumTrials &gt; 0
   * @throws InterruptedException if the thread was interrupted
   */
  static CountSample run(
      SlotSimulator simulator, SlotRequest prototype, double halfWidth, int maximumTrials)
      throws InterruptedException {
    final CountSample sample = new CountSample();
    while (sample.trials < maximumTrials && !(sample.widest() <= halfWidth)) {
      if (Thread.interrupted()) {
        throw new InterruptedException("calibration was canceled");
      }
      final int size = Math.min(BATCH, maximumTrials - sample.trials);
      sample.add(
          simulator.simulate(
              new SlotRequest(
                  prototype.drive(),
                  prototype.previousDrive(),
                  prototype.restLevel(),
                  sample.trials,
                  size,
                  prototype.streamKey())));
    }
    return sample;
  }

  private void add(SlotOutcomes outcomes) {
    for (int i = 0; i < outcomes.counts().length; i++) {
      final int n = outcomes.counts()[i];
      if (n >= counts.length) {
        counts = Arrays.copyOf(counts, n + 1);
      }
      counts[n]++;
      halfTurns.merge(outcomes.halfTurns()[i], 1, Integer::sum);
      trials++;
      final double latency = outcomes.latencySeconds()[i];
      if (!Double.isNaN(latency)) {
        addLatency(latency);
      }
    }
    replicaSteps += outcomes.replicaSteps();
  }

  /** Welford's running mean and sum of squares (Technometrics 4, 419 (1962), from memory). */
  private void addLatency(double latency) {
    timed++;
    final double before = latency - latencyMean;
    latencyMean += before / timed;
    latencySquares += before * (latency - latencyMean);
  }

  private double widest() {
    if (trials == 0) {
      return Double.POSITIVE_INFINITY;
    }
    double widest = WilsonInterval.of(0, trials).halfWidth();
    for (final int successes : counts) {
      widest = Math.max(widest, WilsonInterval.of(successes, trials).halfWidth());
    }
    return widest;
  }

  int trials() {
    return trials;
  }

  long replicaSteps() {
    return replicaSteps;
  }

  SortedMap<Integer, Integer> halfTurns() {
    return halfTurns;
  }

  /** Trials that gave n counts, n from 0, at least {@code length} entries. */
  int[] counts(int length) {
    return Arrays.copyOf(counts, Math.max(length, largest() + 1));
  }

  /** Largest count seen. */
  int largest() {
    int largest = 0;
    for (int n = 0; n < counts.length; n++) {
      if (counts[n] > 0) {
        largest = n;
      }
    }
    return largest;
  }

  double latencySeconds() {
    return timed == 0 ? Double.NaN : latencyMean;
  }

  double jitterSeconds() {
    return timed < 2 ? Double.NaN : Math.sqrt(latencySquares / (timed - 1));
  }
}
