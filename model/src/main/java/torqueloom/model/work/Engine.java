package torqueloom.model.work;

import java.util.List;

/** Runs the units of a stage. */
public interface Engine extends AutoCloseable {
  /**
   * Runs every unit whose result is not stored, stores what it computed, and returns all results in
   * the order of the units.
   *
   * @throws InterruptedException if the run was canceled; what was done is stored
   * @throws java.io.UncheckedIOException if the store cannot be written
   */
  <R> List<R> run(Stage<R> stage) throws InterruptedException;

  /** Makes {@link #run} end soon, from any thread; later calls of it end at once. */
  void cancel();

  /** Gives back what the engine holds; does not close the store. */
  @Override
  void close();
}
