package torqueloom.model.work;

/** Told how far a run is; called from one thread at a time. */
@FunctionalInterface
public interface Progress {
  /** Says nothing. */
  Progress NONE = (stage, done, total, note) -> {};

  /**
   * Reports.
   *
   * @param stage name of the stage
   * @param done units done, stored ones included
   * @param total units of the stage
   * @param note a few words, may be empty
   */
  void report(String stage, long done, long total, String note);
}
