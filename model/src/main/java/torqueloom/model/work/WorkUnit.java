package torqueloom.model.work;

/**
 * One piece of a long computation: a pure function of what it was built from, so that it may run
 * anywhere, at any time, in any order, and again after a crash, with the same result.
 *
 * @param <R> what it computes, immutable
 */
public interface WorkUnit<R> {
  /**
   * Names the unit within its stage, such as {@code chip=12/temperature=300/block=0}; the same in
   * every run.
   */
  String key();

  /**
   * Computes the result. A unit that takes longer than about a second looks at {@link
   * Thread#interrupted} from time to time.
   *
   * @throws InterruptedException if the run was canceled
   */
  R compute() throws InterruptedException;

  /** A unit from its key and a computation. */
  static <R> WorkUnit<R> of(String key, Computation<R> computation) {
    return new WorkUnit<>() {
      @Override
      public String key() {
        return key;
      }

      @Override
      public R compute() throws InterruptedException {
        return computation.run();
      }

      @Override
      public String toString() {
        return "unit " + key;
      }
    };
  }

  /**
   * A computation without a name.
   *
   * @param <R> what it computes
   */
  @FunctionalInterface
  interface Computation<R> {
    /** Computes the result; see {@link WorkUnit#compute}. */
    R run() throws InterruptedException;
  }
}
