package torqueloom.demo;

import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

/**
 * One record of acceleration on the first bearing's housing (m/s^2): shaft harmonics, background
 * noise, stray knocks, and for a bearing defect the train of its impacts, each of which rings the
 * housing. The train follows Randall and Antoni (2011), doi:10.1016/j.ymssp.2010.07.017 (from
 * memory): intervals jitter by slip; a defect on a moving part is heard loudest while it passes the
 * load zone, so its impacts are modulated at the rate at which that part goes round.
 */
final class BearingRecord {
  /** Samples of a record. */
  static final int LENGTH = 4096;

  /** Samples per second (Hz); the record lasts 0.8 s. */
  static final double RATE = 5120;

  /** Ringing of the housing dies away within this time (s). */
  private static final double RING_TIME = 1.2e-3;

  /** Spread of the interval between impacts through slip (1). */
  private static final double SLIP = 0.012;

  /** First acceleration of a middle-sized defect's ringing (m/s^2). */
  private static final double IMPACT = 2.1;

  private final BearingGeometry bearing;
  private final long key;
  private final Operation operation;
  private final double[] samples = new double[LENGTH];

  private BearingRecord(BearingGeometry bearing, long key, Operation operation) {
    this.bearing = bearing;
    this.key = key;
    this.operation = operation;
  }

  /**
   * Synthesizes the record of one row.
   *
   * @param shaftAmplitude amplitude at shaft rate (m/s^2)
   * @param shaftPhase its phase (rad)
   */
  static double[] synthesize(
      BearingGeometry bearing,
      long seed,
      int row,
      MachineState state,
      Operation operation,
      double shaftAmplitude,
      double shaftPhase) {
    final long key = Streams.key(seed, Purpose.TASK_DATA, row, 1);
    final BearingRecord record = new BearingRecord(bearing, key, operation);
    record.addNoise();
    record.addHarmonics(shaftAmplitude, shaftPhase);
    record.addKnocks();
    record.addDefect(state);
    return record.samples;
  }

  private void addNoise() {
    final long noise = Streams.subKey(key, 0);
    for (int i = 0; i < LENGTH; i++) {
      samples[i] = operation.noise() * Streams.normal(noise, i);
    }
  }

  private void addHarmonics(double amplitude, double phase) {
    final long draws = Streams.subKey(key, 1);
    addTone(1, amplitude, phase);
    for (int order = 2; order <= 4; order++) {
      final double share = 0.25 * StrictMath.exp(0.5 * Streams.normal(draws, 2L * order)) / order;
      addTone(
          order,
          share * operation.speedSquared(),
          2 * Math.PI * Streams.uniform(draws, 2L * order + 1));
    }
  }

  /** Adds a cosine by repeated rotation; over 4096 steps rounding stays below 1e-12. */
  private void addTone(int order, double amplitude, double phase) {
    final double step = 2 * Math.PI * order * operation.shaftRate() / RATE;
    final double cosine = StrictMath.cos(step);
    final double sine = StrictMath.sin(step);
    double x = amplitude * StrictMath.cos(phase);
    double y = amplitude * StrictMath.sin(phase);
    for (int i = 0; i < LENGTH; i++) {
      samples[i] += x;
      final double turned = x * cosine - y * sine;
      y = x * sine + y * cosine;
      x = turned;
    }
  }

  /** A few knocks without period, as a workshop has them; they raise kurtosis in every state. */
  private void addKnocks() {
    final long draws = Streams.subKey(key, 2);
    final int knocks = (int) (4 * Streams.uniform(draws, 0));
    for (int i = 1; i <= knocks; i++) {
      final double size = 2.5 * StrictMath.exp(0.5 * Streams.normal(draws, 2L * i));
      ring(LENGTH * Streams.uniform(draws, 2L * i + 1), size);
    }
  }

  private void addDefect(MachineState state) {
    final double size =
        IMPACT * operation.severity() * Math.sqrt(operation.load() * operation.speedSquared());
    switch (state) {
      case OUTER_RACE -> addTrain(bearing.outerRaceOrder(), 0, size);
      case INNER_RACE -> addTrain(bearing.innerRaceOrder(), 1, 1.5 * size);
      case ROLLING_ELEMENT ->
          addTrain(2 * bearing.ballSpinOrder(), bearing.cageOrder(), 1.7 * size);
      default -> {
        // No part of the bearing strikes.
      }
    }
  }

  /**
   * Adds impacts at an order, modulated at the order at which the defect goes round (0: stands
   * still in the middle of the load zone).
   */
  private void addTrain(double order, double roundOrder, double size) {
    final long draws = Streams.subKey(key, 3);
    final double interval = RATE / (order * operation.shaftRate());
    final double firstAngle = 2 * Math.PI * Streams.uniform(draws, 0);
    double time = (Streams.uniform(draws, 1) - 1) * interval;
    for (int i = 2; time < LENGTH; i += 2) {
      final double turns = roundOrder * operation.shaftRate() * time / RATE;
      final double angle = roundOrder == 0 ? 0 : firstAngle + 2 * Math.PI * turns;
      final double loudness = 1 + 0.15 * Streams.normal(draws, i);
      ring(time, size * loudness * loadZone(StrictMath.cos(angle)));
      time += interval * (1 + SLIP * Streams.truncatedNormal(draws, i + 1L, 4));
    }
  }

  /**
   * Share of the greatest load at an angle from the middle of the load zone: (1 - (1 - cos)/(2
   * eps))^1.5 with load factor eps = 1/2 (R. Stribeck's distribution for zero clearance; from
   * memory). A tenth of the impact remains outside the zone.
   */
  private static double loadZone(double cosine) {
    return cosine <= 0 ? 0.1 : 0.1 + 0.9 * cosine * Math.sqrt(cosine);
  }

  /** A decaying tone at the housing's resonance, from a time in samples onward. */
  private void ring(double start, double size) {
    final double decay = StrictMath.exp(-1 / (RING_TIME * RATE));
    final double step = 2 * Math.PI * operation.resonance() / RATE;
    final double cosine = decay * StrictMath.cos(step);
    final double sine = decay * StrictMath.sin(step);
    final int first = Math.max(0, (int) Math.ceil(start));
    final double late = first - start;
    final double left = size * StrictMath.exp(-late / (RING_TIME * RATE));
    double x = left * StrictMath.cos(step * late);
    double y = left * StrictMath.sin(step * late);
    final int end = Math.min(LENGTH, first + (int) (8 * RING_TIME * RATE));
    for (int i = first; i < end; i++) {
      samples[i] += y;
      final double turned = x * cosine - y * sine;
      y = x * sine + y * cosine;
      x = turned;
    }
  }
}
