package torqueloom.model.response;

/**
 * Which library instance answers for a neuron, and how its drives are read.
 *
 * @param instance instance of the library, 0 for the nominal device
 * @param driveFactor torque of the neuron over torque of the nominal device at the same drive (1),
 *     &gt; 0: a drive of the neuron is multiplied by it before the instance's table is read, whose
 *     axis is the drive of the nominal device, see {@link CountTables}
 */
public record NeuronChoice(int instance, double driveFactor) {

  /** @throws IllegalArgumentException if the instance is negative or the factor not positive */
  public NeuronChoice {
    if (instance < 0 || !(driveFactor > 0 && Double.isFinite(driveFactor))) {
      throw new IllegalArgumentException(
          "instance must not be negative and driveFactor positive, got "
              + instance
              + ", "
              + driveFactor);
    }
  }
}
