package torqueloom.training.study;

import java.util.Arrays;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ForkJoinPool;
import java.util.stream.IntStream;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

/**
 * Intervals on new chips and new test cases: chips and cases are resampled with replacement,
 * independently of each other, and the statistic is taken anew on each resampled table (the
 * pigeonhole bootstrap of A. B. Owen, Ann. Appl. Stat. 1, 386 (2007), doi:10.1214/07-AOAS122, from
 * memory). It overstates the variance, never understates it much: the noise of the cases, which is
 * in the table already, is added once more, and pulls a yield toward one half. Where that moves all
 * replicates to one side, the interval is widened to hold the estimate. Where every chip passes by a
 * wide margin all replicates agree, and the interval over chips alone is the wider one.
 *
 * <p>Replicate r depends on (seed, r) only, so results do not depend on the number of threads.
 */
public final class PigeonholeBootstrap {
  private final byte[][] correct;
  private final int passes;
  private final long seed;
  private final long needed;

  private PigeonholeBootstrap(byte[][] correct, int passes, double target, long seed) {
    this.correct = correct;
    this.passes = passes;
    this.seed = seed;
    // A chip passes with exactly the target accuracy; the product may be off by rounding.
    this.needed = (long) Math.ceil(target * passes * correct[0].length - 1e-6);
  }

  /**
   * @param yield share of chips that reach the target accuracy (1)
   * @param median median of the chips' accuracies (1)
   */
  public record Result(Interval yield, Interval median) {}

  /** One replicate's statistics. */
  private record Replicate(double yield, double median) {}

  /**
   * Resamples.
   *
   * @param correct how many of the passes each chip got each case right, [chips][cases]; read only
   * @param passes noise passes of each case, 1 to 127
   * @param target accuracy a chip must reach (1)
   * @param confidence C, in (0, 1)
   * @param replicates number of resampled tables, at least 100
   * @param seed study seed
   * @param threads threads to use, at least 1; changes no result
   * @return yield and median accuracy with percentile intervals; the estimates are those of the
   *     table itself
   * @throws IllegalArgumentException if the table is empty or ragged, or a number is out of range
   */
  public static Result run(
      byte[][] correct,
      int passes,
      double target,
      double confidence,
      int replicates,
      long seed,
      int threads) {
    check(correct, passes, target, confidence, replicates);
    final PigeonholeBootstrap bootstrap = new PigeonholeBootstrap(correct, passes, target, seed);
    final Replicate[] results = bootstrap.replicates(replicates, threads);
    final Replicate estimate = bootstrap.statistics(ones(correct.length), ones(correct[0].length));
    final double[] yields = Arrays.stream(results).mapToDouble(Replicate::yield).toArray();
    final double[] medians = Arrays.stream(results).mapToDouble(Replicate::median).toArray();
    return new Result(
        percentiles(estimate.yield(), yields, confidence),
        percentiles(estimate.median(), medians, confidence));
  }

  private static void check(
      byte[][] correct, int passes, double target, double confidence, int replicates) {
    final boolean full = correct.length > 0 && correct[0].length > 0;
    if (!full || Arrays.stream(correct).anyMatch(row -> row.length != correct[0].length)) {
      throw new IllegalArgumentException("the table needs chips, cases and equal rows");
    }
    if (passes < 1 || passes > 127 || replicates < 100) {
      throw new IllegalArgumentException(
          "need 1 to 127 passes and at least 100 replicates, got " + passes + ", " + replicates);
    }
    if (!(target >= 0 && target <= 1) || !(confidence > 0 && confidence < 1)) {
      throw new IllegalArgumentException(
          "need 0 <= target <= 1 and 0 < confidence < 1, got " + target + ", " + confidence);
    }
    for (final byte[] row : correct) {
      for (final byte count : row) {
        if (count < 0 || count > passes) {
          throw new IllegalArgumentException("found " + count + " right of " + passes + " passes");
        }
      }
    }
  }

  private Replicate[] replicates(int replicates, int threads) {
    final ForkJoinPool pool = new ForkJoinPool(threads);
    try {
      return pool.submit(
              () ->
                  IntStream.range(0, replicates)
                      .parallel()
                      .mapToObj(this::replicate)
                      .toArray(Replicate[]::new))
          .get();
    } catch (ExecutionException e) {
      throw new IllegalStateException("a bootstrap replicate failed", e.getCause());
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException("the bootstrap was interrupted", e);
    } finally {
      pool.shutdownNow();
    }
  }

  private Replicate replicate(int index) {
    final long key = Streams.key(seed, Purpose.BOOTSTRAP, index);
    return statistics(
        draws(Streams.subKey(key, 0), correct.length),
        draws(Streams.subKey(key, 1), correct[0].length));
  }

  /** How often each of n is drawn in n draws. */
  private static int[] draws(long key, int n) {
    final int[] times = new int[n];
    for (int i = 0; i < n; i++) {
      times[Streams.below(key, i, n)]++;
    }
    return times;
  }

  private static int[] ones(int n) {
    final int[] ones = new int[n];
    Arrays.fill(ones, 1);
    return ones;
  }

  private Replicate statistics(int[] timesOfChip, int[] timesOfCase) {
    final int chips = correct.length;
    final long[] sums = new long[chips];
    int passing = 0;
    int drawn = 0;
    for (int chip = 0; chip < chips; chip++) {
      if (timesOfChip[chip] > 0) {
        final long sum = weightedSum(correct[chip], timesOfCase);
        passing += sum >= needed ? timesOfChip[chip] : 0;
        for (int i = 0; i < timesOfChip[chip]; i++) {
          sums[drawn++] = sum;
        }
      }
    }
    Arrays.sort(sums);
    final double total = 2.0 * passes * correct[0].length;
    return new Replicate(
        (double) passing / chips, (sums[(chips - 1) / 2] + sums[chips / 2]) / total);
  }

  /** Four sums at once, since the compiler keeps the order of a single one. */
  private static long weightedSum(byte[] counts, int[] weights) {
    int a = 0;
    int b = 0;
    int c = 0;
    int d = 0;
    int i = 0;
    for (; i + 3 < counts.length; i += 4) {
      a += counts[i] * weights[i];
      b += counts[i + 1] * weights[i + 1];
      c += counts[i + 2] * weights[i + 2];
      d += counts[i + 3] * weights[i + 3];
    }
    for (; i < counts.length; i++) {
      a += counts[i] * weights[i];
    }
    return (long) a + b + c + d;
  }

  private static Interval percentiles(double estimate, double[] values, double confidence) {
    final double tail = 0.5 * (1 - confidence);
    return new Interval(
        estimate,
        Math.min(estimate, QuantileInterval.of(values, tail)),
        Math.max(estimate, QuantileInterval.of(values, 1 - tail)));
  }
}
