package torqueloom.app.command;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.IntSupplier;

/**
 * Ctrl-C: the working thread is interrupted and gets a moment to stop its executor, to let go of its
 * lock and to drop what it has half written. The Java machine then ends with 130 by itself.
 */
final class StopSignal {
  /** Longest wait for the work to stop (s). */
  private static final long PATIENCE_SECONDS = 5;

  private StopSignal() {}

  static int guard(IntSupplier work) {
    final Thread worker = Thread.currentThread();
    final CountDownLatch done = new CountDownLatch(1);
    final Thread hook = new Thread(() -> stop(worker, done), "stop-signal");
    Runtime.getRuntime().addShutdownHook(hook);
    try {
      return work.getAsInt();
    } finally {
      done.countDown();
      remove(hook);
    }
  }

  private static void stop(Thread worker, CountDownLatch done) {
    worker.interrupt();
    try {
      done.await(PATIENCE_SECONDS, TimeUnit.SECONDS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private static void remove(Thread hook) {
    try {
      Runtime.getRuntime().removeShutdownHook(hook);
    } catch (IllegalStateException e) {
      // The machine is stopping already and runs the hook.
    }
  }
}
