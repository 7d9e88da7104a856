package torqueloom.model.work;

import java.util.List;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;

/**
 * Runs units on threads of this process. Results come back in the order of the units, whatever the
 * number of threads. Only the calling thread writes to the store, in batches, so that a canceled
 * run leaves whole lines only.
 *
 * <p>If units fail, no further ones are started, those that run are waited for and stored, and the
 * failure of the first unit in order is thrown, the same one on any number of threads.
 */
public final class UnitExecutor implements Engine {
  private final int threads;
  private final RunStore store;
  private final Progress progress;
  private final Set<StageRun<?>> active = ConcurrentHashMap.newKeySet();
  private volatile boolean canceled;

  /**
   * Makes an executor.
   *
   * @param threads units that run at once, at least 1
   * @param store where results are found and kept, or null to keep none
   * @param progress told how far the work is
   * @throws IllegalArgumentException if threads is below 1
   */
  public UnitExecutor(int threads, RunStore store, Progress progress) {
    if (threads < 1) {
      throw new IllegalArgumentException("threads must be at least 1, got " + threads);
    }
    this.threads = threads;
    this.store = store;
    this.progress = progress;
  }

  @Override
  public <R> List<R> run(Stage<R> stage) throws InterruptedException {
    final StageRun<R> run = new StageRun<>(stage, store, progress);
    active.add(run);
    try {
      if (canceled) {
        run.cancel();
      }
      return run.results(threads);
    } finally {
      active.remove(run);
    }
  }

  @Override
  public void cancel() {
    canceled = true;
    active.forEach(StageRun::cancel);
  }

  /** Cancels what still runs. */
  @Override
  public void close() {
    cancel();
  }
}
