package torqueloom.demo;

import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

/**
 * Vibration at shaft rate, as complex amplitudes against a mark on the shaft: horizontal and vertical
 * at both bearings, and along the shaft. Unbalance in the rotor's middle shakes both bearings in
 * phase, opposite unbalances at its ends in opposite phase, and the rocking of the latter also shakes
 * the housing along the shaft (terms of ISO 21940-2, from memory). Every machine keeps some residual
 * unbalance of both kinds. Where on the shaft the heavy spot sits is arbitrary, so no phase alone
 * tells anything; their differences do.
 *
 * <p>Only these five amplitudes enter the features, so the records of the other four channels are
 * not synthesized: over a record of n samples of white noise sigma, the measured complex amplitude
 * is the true one plus a normal number of standard deviation sigma sqrt(2/n) in each part.
 */
final class ShaftMotion {
  /** Channels: first bearing horizontal and vertical, second bearing likewise, axial. */
  static final int CHANNELS = 5;

  /** Amplitude of residual unbalance at middle speed (m/s^2). */
  private static final double RESIDUAL = 0.11;

  /** Amplitude of a middle-sized unbalance at middle speed (m/s^2). */
  private static final double UNBALANCE = 1.0;

  /** Spread of the phase from channel to channel by uneven supports (rad). */
  private static final double PHASE_SPREAD = 0.25;

  private final double[] real = new double[CHANNELS];
  private final double[] imaginary = new double[CHANNELS];

  private ShaftMotion() {}

  static ShaftMotion draw(long seed, int row, MachineState state, Operation operation) {
    final long key = Streams.key(seed, Purpose.TASK_DATA, row, 2);
    final ShaftMotion motion = new ShaftMotion();
    final double force = operation.speedSquared();
    motion.add(Streams.subKey(key, 0), RESIDUAL * force * size(key, 0), 1, 0.3);
    motion.add(Streams.subKey(key, 1), RESIDUAL * force * size(key, 1), -1, 0.5);
    final double amplitude = UNBALANCE * force * operation.severity();
    if (state == MachineState.STATIC_UNBALANCE) {
      motion.add(Streams.subKey(key, 2), amplitude, 1, 0.3);
    } else if (state == MachineState.COUPLE_UNBALANCE) {
      motion.add(Streams.subKey(key, 2), amplitude, -1, 0.5);
    }
    motion.addNoise(Streams.subKey(key, 3), operation.noise());
    return motion;
  }

  private static double size(long key, int counter) {
    return StrictMath.exp(0.5 * Streams.truncatedNormal(key, counter, 4));
  }

  /** Adds one unbalance; sign is that of the second bearing against the first. */
  private void add(long key, double amplitude, int sign, double axialShare) {
    final double heavySpot = 2 * Math.PI * Streams.uniform(key, 0);
    for (int channel = 0; channel < CHANNELS; channel++) {
      final double stiffness = StrictMath.exp(0.2 * Streams.truncatedNormal(key, 1 + channel, 4));
      final double axial = StrictMath.exp(0.5 * Streams.truncatedNormal(key, 20, 4)) * axialShare;
      final double size = amplitude * stiffness * (channel == 4 ? axial : 1);
      // The vertical sensor sees the heavy spot a quarter turn after the horizontal one.
      final double phase =
          heavySpot
              - (channel % 2 == 1 ? Math.PI / 2 : 0)
              + (channel >= 2 && sign < 0 ? Math.PI : 0)
              + PHASE_SPREAD * Streams.truncatedNormal(key, 10 + channel, 4);
      real[channel] += size * StrictMath.cos(phase);
      imaginary[channel] += size * StrictMath.sin(phase);
    }
  }

  private void addNoise(long key, double noise) {
    final double deviation = noise * Math.sqrt(2.0 / BearingRecord.LENGTH);
    for (int channel = 0; channel < CHANNELS; channel++) {
      real[channel] += deviation * Streams.normal(key, 2L * channel);
      imaginary[channel] += deviation * Streams.normal(key, 2L * channel + 1);
    }
  }

  double amplitude(int channel) {
    return Math.sqrt(real[channel] * real[channel] + imaginary[channel] * imaginary[channel]);
  }

  double phase(int channel) {
    return StrictMath.atan2(imaginary[channel], real[channel]);
  }

  double cosine(int channel) {
    return real[channel] / amplitude(channel);
  }

  double sine(int channel) {
    return imaginary[channel] / amplitude(channel);
  }
}
