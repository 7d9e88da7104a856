package torqueloom.model.dynamics;

import java.util.List;
import torqueloom.model.random.Streams;

/**
 * Simulates slots of one macrospin: thermal equilibrium at a rest, optionally the slot before, then
 * pulse and rest, with the readout in the loop. Immutable and safe to share between threads; a
 * trial's outcome depends only on its stream key, whatever batch or thread it runs in.
 *
 * <p>A trial starts in the harmonic approximation of equilibrium at its rest and relaxes with noise
 * for one and a half periods of the readout's bandwidth and, where that approximation is not good
 * enough, as many ring-down times; then comparator and counters are cleared (the level stays, the
 * arming goes) and the slot begins.
 */
public final class SlotEnsemble {
  /** Relaxation before the slot, in ring-down times plus in periods of the readout's bandwidth. */
  private static final double WARM_UP = 1.5;

  /** A ring-down time longer than this is not waited for (s). */
  private static final double LONGEST_RING_DOWN = 5e-9;

  /** Barrier over k_B T from which on the harmonic start needs no ring-down (1). */
  private static final double HARMONIC_BARRIER = 20;

  /**
   * Stiffness over the thermal field from which on it needs none (1): spreads to a quarter radian.
   */
  private static final double HARMONIC_STIFFNESS = 15;

  /** Frames between looks for settled replicas. */
  private static final int LOOK = 16;

  /** Counters per pair of steps: three for the thermal field, one for the readout. */
  private static final int PLACES = 4;

  private final MacrospinParameters spin;
  private final SignalChain chain;
  private final List<RestLevel> rests;
  private final double ringDown;
  private final double stepFactor;
  private final boolean earlyEnd;
  private final EnsembleKernel kernel;

  private SlotEnsemble(
      MacrospinParameters spin,
      SignalChain chain,
      List<RestLevel> rests,
      double ringDown,
      double stepFactor,
      boolean earlyEnd,
      EnsembleKernel kernel) {
    this.spin = spin;
    this.chain = chain;
    this.rests = rests;
    this.ringDown = ringDown;
    this.stepFactor = stepFactor;
    this.earlyEnd = earlyEnd;
    this.kernel = kernel;
  }

  /**
   * An ensemble with the automatic step, early end and the kernel of {@link KernelChoice}.
   *
   * @param spin parameters
   * @param chain readout
   * @param rests rests, lowest energy first, not empty
   * @param ringDown time in which small motion decays at the first rest (s), &gt; 0
   */
  public static SlotEnsemble of(
      MacrospinParameters spin, SignalChain chain, List<RestLevel> rests, double ringDown) {
    if (rests.isEmpty() || !(ringDown > 0)) {
      throw new IllegalArgumentException("an ensemble needs a rest and a ring-down time");
    }
    return new SlotEnsemble(
        spin, chain, List.copyOf(rests), ringDown, 1, true, KernelChoice.current().kernel());
  }

  /** The same with steps multiplied by a factor in (0, 1], for tests of the step's error. */
  public SlotEnsemble withStepFactor(double factor) {
    if (!(factor > 0 && factor <= 1)) {
      throw new IllegalArgumentException("factor must lie in (0, 1], got " + factor);
    }
    return new SlotEnsemble(spin, chain, rests, ringDown, factor, earlyEnd, kernel);
  }

  /** The same with every slot simulated to its end. */
  public SlotEnsemble withoutEarlyEnd() {
    return new SlotEnsemble(spin, chain, rests, ringDown, stepFactor, false, kernel);
  }

  SlotEnsemble withKernel(EnsembleKernel other) {
    return new SlotEnsemble(spin, chain, rests, ringDown, stepFactor, earlyEnd, other);
  }

  /**
   * Simulates slots.
   *
   * @param program torques and times
   * @param restLevel rest the trials start at
   * @param firstTrial number of the first trial
   * @param trials number of trials, &gt; 0
   * @param streamKey key of the random stream; trial k uses its k-th sub-stream
   * @throws IllegalArgumentException if the rest does not exist
   */
  public SlotTrials run(
      SlotProgram program, int restLevel, int firstTrial, int trials, long streamKey) {
    if (restLevel < 0 || restLevel >= rests.size()) {
      throw new IllegalArgumentException(
          "rest level " + restLevel + " does not exist; there are " + rests.size());
    }
    final Run run = new Run(program, trials);
    for (int from = 0; from < trials; from += Tile.CAPACITY) {
      run.tile(restLevel, firstTrial, from, Math.min(Tile.CAPACITY, trials - from), streamKey);
    }
    return run.result();
  }

  /** Integration steps of one trial of a program that does not end early (1). */
  public long steps(SlotProgram program) {
    final Run run = new Run(program, 0);
    long steps = run.warmUp.steps() + segment(program.drive(), program.pulse()).steps();
    if (program.hasPrevious()) {
      steps += segment(program.previous(), program.pulse()).steps();
    }
    final long quiet =
        program.rest() > 0 ? segment(program.background(), program.rest()).steps() : 0;
    return steps + (program.hasPrevious() ? 2 : 1) * quiet;
  }

  private Segment segment(TorqueField torque, double duration) {
    return Segment.of(
        torque,
        duration,
        chain.longestFrame() * stepFactor,
        StepSize.largest(spin, torque) * stepFactor);
  }

  /** One batch: its segments and its growing result. */
  private final class Run {
    private final SlotProgram program;
    private final SettleRule rule;
    private final Segment warmUp;
    private final Tile tile = new Tile();
    private final int[] counts;
    private final int[] halfTurns;
    private final double[] latency;
    private final int[] endLevels;
    private final double[] startAngle = new double[Tile.CAPACITY];
    private double poleSum;
    private long steps;
    private int active;
    private int pair;

    Run(SlotProgram program, int trials) {
      this.program = program;
      this.rule =
          new SettleRule(
              spin, chain, rests, program.background(), program.pulse() + program.rest());
      this.warmUp = segment(program.background(), WARM_UP * relaxation(program));
      this.counts = new int[trials];
      this.halfTurns = new int[trials];
      this.latency = new double[trials];
      this.endLevels = new int[trials];
    }

    /**
     * Time in which a start becomes an equilibrium (s): the filter's, and the moment's ring-down
     * unless the harmonic start is good already. It is where wells are deep and stiff (the spread
     * is then right to a few per cent) and there is no continuous drive.
     */
    private double relaxation(SlotProgram program) {
      final double filter = 1 / chain.bandwidth();
      final boolean harmonic =
          program.background().largest() == 0 && rests.stream().allMatch(this::isHarmonic);
      return harmonic ? filter : filter + Math.min(ringDown, LONGEST_RING_DOWN);
    }

    private boolean isHarmonic(RestLevel rest) {
      final double thermal = spin.thermalField();
      return rest.barrier() >= HARMONIC_BARRIER * thermal
          && rest.smallestStiffness(spin) >= HARMONIC_STIFFNESS * thermal;
    }

    SlotTrials result() {
      return new SlotTrials(counts, halfTurns, latency, endLevels, poleSum / counts.length, steps);
    }

    void tile(int restLevel, int firstTrial, int from, int size, long streamKey) {
      start(restLevel, firstTrial + from, from, size, streamKey);
      advance(warmUp, 0);
      if (program.hasPrevious()) {
        advance(segment(program.previous(), program.pulse()), 0);
        if (program.rest() > 0) {
          advance(segment(program.background(), program.rest()), 0);
        }
      }
      clear();
      advance(segment(program.drive(), program.pulse()), 0);
      for (int i = 0; i < active; i++) {
        poleSum += tile.my[i];
      }
      if (program.rest() > 0) {
        finish(segment(program.background(), program.rest()));
      }
      for (int i = 0; i < active; i++) {
        record(i);
      }
    }

    private void start(int restLevel, int firstNumber, int from, int size, long streamKey) {
      active = size;
      pair = 0;
      final RestLevel rest = rests.get(restLevel);
      final float signal = (float) chain.signal(rest.x());
      final boolean high = signal >= 0.5 * (chain.low() + chain.high());
      for (int i = 0; i < Tile.CAPACITY; i++) {
        // Padding repeats the last replica.
        final int own = Math.min(i, size - 1);
        final long key = Streams.subKey(streamKey, firstNumber + own);
        tile.key0[i] = (int) key;
        tile.key1[i] = (int) (key >>> 32);
        tile.trial[i] = from + own;
        tile.spin[i] = spin;
        final long draw = Streams.subKey(key, -1);
        final double[] m = rest.draw(spin, Streams.normal(draw, 0), Streams.normal(draw, 1));
        tile.direct(i, m[0], m[1], m[2]);
        tile.filtered[i] = signal;
        tile.slope[i] = 0f;
        tile.high[i] = high ? -1 : 0;
      }
      clear();
    }

    /**
     * The slot begins: counters at zero, comparator at its level but unarmed, winding from here.
     */
    private void clear() {
      for (int i = 0; i < Tile.CAPACITY; i++) {
        tile.counts[i] = 0;
        tile.armed[i] = 0;
        tile.firstCount[i] = -1f;
        tile.turns[i] = 0;
        tile.lastX[i] = tile.mx[i];
        tile.lastZ[i] = tile.mz[i];
        startAngle[tile.trial[i] % Tile.CAPACITY] = StrictMath.atan2(tile.mz[i], tile.mx[i]);
      }
    }

    private void advance(Segment segment, double startTime) {
      tile.enter(segment);
      final ReadConstants constants = ReadConstants.of(chain, segment.frame());
      for (int frame = 1; frame <= segment.frames(); frame++) {
        frame(segment, constants, (float) (startTime + frame * segment.frame()));
      }
    }

    private void frame(Segment segment, ReadConstants constants, float time) {
      for (int s = 0; s < segment.stepsPerFrame(); s += 2) {
        kernel.drawGaussians(tile, active, PLACES * pair);
        kernel.step(tile, active, 0);
        kernel.step(tile, active, Tile.GAUSSIANS / 2);
        pair++;
      }
      kernel.drawReadNoise(tile, active, PLACES * pair - 1);
      kernel.read(tile, active, constants, time);
      steps += (long) active * segment.stepsPerFrame();
    }

    /** The rest of the slot; settled replicas leave the tile. */
    private void finish(Segment segment) {
      tile.enter(segment);
      final ReadConstants constants = ReadConstants.of(chain, segment.frame());
      final boolean look = earlyEnd && rule.possible();
      for (int frame = 1; frame <= segment.frames() && active > 0; frame++) {
        frame(segment, constants, (float) (program.pulse() + frame * segment.frame()));
        if (look && frame % LOOK == 0) {
          removeSettled();
        }
      }
    }

    private void removeSettled() {
      for (int i = active - 1; i >= 0; i--) {
        if (rule.settled(tile, i)) {
          record(i);
          active--;
          if (i < active) {
            tile.copy(active, i);
          }
        }
      }
    }

    private void record(int i) {
      final int trial = tile.trial[i];
      counts[trial] = tile.counts[i];
      latency[trial] = tile.firstCount[i] < 0f ? Double.NaN : tile.firstCount[i];
      endLevels[trial] = rule.nearest(tile.mx[i], tile.my[i], tile.mz[i]);
      final double angle = StrictMath.atan2(tile.mz[i], tile.mx[i]);
      final double turned =
          (angle - startAngle[trial % Tile.CAPACITY]) / Math.PI + 2.0 * tile.turns[i];
      halfTurns[trial] = (int) StrictMath.rint(turned);
    }
  }
}
