package torqueloom.model.random;

/**
 * What a random number is drawn for. The code enters the stream key; it is written down here and
 * never reused, so that adding a purpose moves no other draw.
 */
public enum Purpose {
  /** Parameters of a chip's neurons: indices (parameter, chip, layer, row, column). */
  CHIP_NEURON(1),
  /** Mismatch of a chip's synapse pairs: indices (chip, layer), row below, column as counter. */
  CHIP_SYNAPSE(2),
  /** Residual of write-verify: indices (chip, layer), row below, column as counter. */
  WRITE_ERROR(3),
  /** Parameters of the response library's instances: indices (parameter, instance). */
  LIBRARY_INSTANCE(4),
  /**
   * Thermal field and readout noise of a calibration trial: indices (instance, temperature, drive,
   * state).
   */
  CALIBRATION_NOISE(5),
  /** Counts drawn by a neuron on a chip: indices (chip, temperature, pass, layer, sample). */
  CHIP_COUNTS(6),
  /** Counts drawn while training: indices (epoch, iteration, layer). */
  TRAINING_COUNTS(7),
  /** Device instances and write errors drawn while training: indices (epoch, iteration, layer). */
  TRAINING_VARIATION(8),
  /** First weights of a network: indices (layer). */
  WEIGHT_START(9),
  /** Split of the task's rows: indices (class). */
  DATA_SPLIT(10),
  /** Order of the rows in an epoch: indices (epoch). */
  EPOCH_ORDER(11),
  /** Generated task data: indices as the generator says. */
  TASK_DATA(12),
  /** Resampling of chips and test cases: indices (replicate). */
  BOOTSTRAP(13),
  /**
   * Counts of the ideal network: indices (pass) while testing, (-1, epoch) while validating, (epoch,
   * iteration) in inference through the deep-learning library.
   */
  IDEAL_COUNTS(14),
  /** Full-dynamics replay. */
  REPLAY(15),
  /** Noise of a simulated trim measurement. */
  TRIM_NOISE(16),
  /** Seed handed to library code that keeps a generator of its own. */
  LIBRARY_GENERATOR(17),
  /** Stuck devices: indices (chip, layer, row, column). */
  FAULT(18),
  /** Monte Carlo of derived device quantities over the tolerances: indices (parameter, draw). */
  TOLERANCE_SURVEY(19),
  /** Short simulations behind a device's warnings: indices (drive). */
  DEVICE_CHECK(20);

  private final long code;

  Purpose(long code) {
    this.code = code;
  }

  /** The fixed number of this purpose. */
  public long code() {
    return code;
  }
}
