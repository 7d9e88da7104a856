package torqueloom.demo;

import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

/**
 * The conditions under which one record is taken, drawn independently of the machine's state, and
 * the size of its defect.
 *
 * @param shaftRate turns of the shaft per second (Hz)
 * @param load radial load in units of its middle value (1)
 * @param noise background vibration, one standard deviation (m/s^2)
 * @param severity size of the defect in units of its middle value (1); unused when healthy
 * @param resonance resonance frequency of the housing (Hz)
 */
record Operation(double shaftRate, double load, double noise, double severity, double resonance) {

  static Operation draw(long seed, int row, MachineState state) {
    final long key = Streams.key(seed, Purpose.TASK_DATA, row, 0);
    return new Operation(
        20 + 15 * Streams.uniform(key, 0),
        StrictMath.exp(0.25 * Streams.truncatedNormal(key, 1, 4)),
        0.6 * StrictMath.exp(0.25 * Streams.truncatedNormal(key, 2, 4)),
        severity(state, key),
        1650 + 120 * Streams.truncatedNormal(key, 4, 4));
  }

  private static double severity(MachineState state, long key) {
    final double spread = state == MachineState.ROLLING_ELEMENT ? 0.3 : 0.33;
    return StrictMath.exp(spread * Streams.truncatedNormal(key, 3, 4));
  }

  /** Forces of unbalance grow with the square of the speed; 1 at 27.5 Hz. */
  double speedSquared() {
    final double ratio = shaftRate / 27.5;
    return ratio * ratio;
  }
}
