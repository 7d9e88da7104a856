package torqueloom.model.dynamics;

/**
 * Torques and times of a slot.
 *
 * @param drive torque during the pulse, background included
 * @param previous torque of the pulse one slot earlier, background included; null after a quiet slot
 * @param background torque between the pulses
 * @param pulse length of the pulse (s), &gt; 0
 * @param rest time from the pulse's end to the slot's end (s), &gt;= 0
 */
public record SlotProgram(
    TorqueField drive, TorqueField previous, TorqueField background, double pulse, double rest) {

  /** @throws IllegalArgumentException if a time is out of range */
  public SlotProgram {
    if (!(pulse > 0 && rest >= 0 && Double.isFinite(pulse + rest))) {
      throw new IllegalArgumentException(
          "pulse must be positive and rest not negative, got " + pulse + " and " + rest + " s");
    }
  }

  boolean hasPrevious() {
    return previous != null;
  }
}
