package torqueloom.model.device;

/**
 * Simulates slots of one device instance at one temperature under one protocol. Kinds meet here, at
 * "protocol and replicas in, counts and latency out": nothing in the interface supposes a moment
 * vector, so two sublattices, a phase, a telegraph state or a table of measurements fit as well.
 *
 * <p>Implementations are immutable and safe to share between threads; a result depends only on the
 * request.
 */
@FunctionalInterface
public interface SlotSimulator {
  /**
   * @param request drive, state, number of trials and random stream
   * @return counts, half turns and latencies, one entry a trial
   */
  SlotOutcomes simulate(SlotRequest request);

  /** What integrates, in plain words, for the provenance; bits of a result do not depend on it. */
  default String kernel() {
    return "not stated";
  }
}
