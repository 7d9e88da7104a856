package torqueloom.model.response;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;
import torqueloom.model.device.SlotRequest;
import torqueloom.model.device.SlotSimulator;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

/**
 * How much a slot's counts depend on the slot before: the total variation
 *
 * <pre>  (1/2) sum over n of |P(n | quiet) - P(n | busy)|</pre>
 *
 * of the nominal device, largest over a few pairs of drives. Slots before: just below threshold
 * (such pulses ring too), the first drive at which a count is near certain, and the largest drive.
 * Drives judged: where one count, and where two counts, are about as likely as not, since a shift
 * shows most on a steep slope.
 *
 * @param totalVariation largest measured (1); it is above 0 by chance alone
 * @param floor 95 % of measurements without any carry-over would stay below this (1)
 * @param drive at which the largest was seen (drive unit)
 * @param previousDrive of the slot before (drive unit)
 * @param trials slots in each estimate
 * @param replicaSteps integration steps spent (1)
 */
public record CarryOver(
    double totalVariation,
    double floor,
    double drive,
    double previousDrive,
    int trials,
    long replicaSteps) {

  /** Nothing to measure: no drive of the range gives counts. */
  static final CarryOver NONE = new CarryOver(0, 0, Double.NaN, Double.NaN, 0, 0);

  private static final int REPLICATES = 200;

  /** State index of the fresh quiet slots, in the stream keys. */
  private static final long FRESH_QUIET = -1;

  /**
   * @param calibration what was calibrated
   * @param quiet the nominal device's curve after a quiet slot
   */
  static CarryOver measure(Calibration calibration, ResponseCurve quiet)
      throws InterruptedException {
    final int last = lastDrive(quiet, calibration.protocol().maximumDrive());
    final Set<Integer> judged = judgedDrives(quiet, last);
    final Set<Integer> before = previousDrives(quiet, last);
    if (judged.isEmpty() || before.isEmpty()) {
      return NONE;
    }
    return new Measurement(calibration, quiet).run(judged, before);
  }

  private static int lastDrive(ResponseCurve curve, double maximumDrive) {
    int last = 0;
    for (int d = 0; d < curve.drive().length; d++) {
      if (curve.drive()[d] <= maximumDrive * (1 + 1e-9)) {
        last = d;
      }
    }
    return last;
  }

  /** Drives nearest to even odds of at least one and at least two counts, where those occur. */
  private static Set<Integer> judgedDrives(ResponseCurve curve, int last) {
    final Set<Integer> drives = new LinkedHashSet<>();
    for (int n = 1; n <= 2; n++) {
      int best = -1;
      for (int d = 1; d <= last; d++) {
        final double p = atLeast(curve, d, n);
        if (p > 0.1 && (best < 0 || Math.abs(p - 0.5) < Math.abs(atLeast(curve, best, n) - 0.5))) {
          best = d;
        }
      }
      if (best >= 0) {
        drives.add(best);
      }
    }
    return drives;
  }

  private static Set<Integer> previousDrives(ResponseCurve curve, int last) {
    final Set<Integer> drives = new LinkedHashSet<>();
    int d = 1;
    while (d <= last && atLeast(curve, d, 1) < 0.1) {
      d++;
    }
    if (d > 1) {
      drives.add(d - 1);
    }
    while (d <= last && atLeast(curve, d, 1) < 0.9) {
      d++;
    }
    drives.add(Math.min(d, last));
    drives.add(last);
    return drives;
  }

  private static double atLeast(ResponseCurve curve, int d, int n) {
    double below = 0;
    for (int k = 0; k < n; k++) {
      below += curve.probability(d, k);
    }
    return 1 - below;
  }

  static double totalVariation(int[] a, int[] b) {
    final double sumA = Arrays.stream(a).sum();
    final double sumB = Arrays.stream(b).sum();
    double variation = 0;
    for (int n = 0; n < Math.max(a.length, b.length); n++) {
      variation += Math.abs((n < a.length ? a[n] / sumA : 0) - (n < b.length ? b[n] / sumB : 0));
    }
    return variation / 2;
  }

  /** The simulated part; one quiet sample a judged drive serves all its pairs. */
  private static final class Measurement {
    private final Calibration calibration;
    private final ResponseCurve curve;
    private final SlotSimulator simulator;
    private final int trials;
    private long replicaSteps;

    Measurement(Calibration calibration, ResponseCurve curve) {
      this.calibration = calibration;
      this.curve = curve;
      this.simulator =
          calibration
              .device(0, curve.temperatureKelvin())
              .simulator(curve.temperatureKelvin(), calibration.protocol());
      this.trials = Math.multiplyExact(2, calibration.settings().maximumTrials());
    }

    CarryOver run(Set<Integer> judged, Set<Integer> before) throws InterruptedException {
      double worst = -1;
      int worstDrive = 0;
      int worstBefore = 0;
      final Map<int[], Integer> quietSamples = new LinkedHashMap<>();
      for (final int d : judged) {
        final int[] quiet = sample(d, Double.NaN, FRESH_QUIET);
        quietSamples.put(quiet, before.size());
        for (final int b : before) {
          final double variation =
              totalVariation(quiet, sample(d, curve.drive()[b], CurveCalibrator.QUIET + 1 + b));
          if (variation > worst) {
            worst = variation;
            worstDrive = d;
            worstBefore = b;
          }
        }
      }
      return new CarryOver(
          worst,
          floor(quietSamples),
          curve.drive()[worstDrive],
          curve.drive()[worstBefore],
          trials,
          replicaSteps);
    }

    private int[] sample(int driveIndex, double previousDrive, long state)
        throws InterruptedException {
      final long key =
          CurveCalibrator.key(calibration.seed(), 0, curve.temperatureKelvin(), driveIndex, state);
      final CountSample sample =
          CountSample.run(
              simulator,
              new SlotRequest(curve.drive()[driveIndex], previousDrive, 0, 0, 1, key),
              0,
              trials);
      replicaSteps += sample.replicaSteps();
      return sample.counts(0);
    }

    /** 95 % point of the largest variation when quiet and busy slots follow the same law. */
    private double floor(Map<int[], Integer> quietSamples) {
      final double[] largest = new double[REPLICATES];
      for (int r = 0; r < REPLICATES; r++) {
        final long key = Streams.key(calibration.seed(), Purpose.BOOTSTRAP, -1, r);
        long stream = 0;
        for (final Map.Entry<int[], Integer> entry : quietSamples.entrySet()) {
          final int[] quiet = redraw(entry.getKey(), Streams.subKey(key, stream++));
          for (int pair = 0; pair < entry.getValue(); pair++) {
            final int[] busy = redraw(entry.getKey(), Streams.subKey(key, stream++));
            largest[r] = Math.max(largest[r], totalVariation(quiet, busy));
          }
        }
      }
      Arrays.sort(largest);
      return largest[(int) Math.ceil(0.95 * REPLICATES) - 1];
    }

    private int[] redraw(int[] law, long key) {
      final int[] counts = new int[law.length];
      for (int i = 0; i < trials; i++) {
        int place = Streams.below(key, i, trials);
        int n = 0;
        while (place >= law[n]) {
          place -= law[n++];
        }
        counts[n]++;
      }
      return counts;
    }
  }
}
