package torqueloom.model.work;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;

/** One run of one stage: workers compute and encode, the calling thread collects and stores. */
final class StageRun<R> {
  /**
   * Results wait at most so long for the disk, so that a crash loses little and forces stay few.
   */
  private static final long STORE_EVERY_NANOS = TimeUnit.MILLISECONDS.toNanos(500);

  private static final int LARGEST_BATCH = 256;
  private static final long POLL_MILLIS = 50;

  /** A canceled worker that does not look at its interrupt is left behind after this time. */
  private static final long GRACE_NANOS = TimeUnit.SECONDS.toNanos(2);

  private final Stage<R> stage;
  private final RunStore store;
  private final Progress progress;

  private final List<Optional<R>> results = new ArrayList<>();
  private final List<Integer> open = new ArrayList<>();
  private final AtomicInteger next = new AtomicInteger();
  private final BlockingQueue<Outcome<R>> outcomes = new LinkedBlockingQueue<>();
  private final List<Thread> workers = new ArrayList<>();
  private final List<StoredUnit> batch = new ArrayList<>();

  private volatile boolean stopped;
  private volatile boolean canceled;
  private int done;
  private long lastStored;
  private Outcome<R> failure;

  /** What a worker has to say; without result and failure: that it has ended. */
  private record Outcome<R>(int index, R result, String payload, Throwable failure) {
    boolean isEnd() {
      return index < 0;
    }
  }

  StageRun(Stage<R> stage, RunStore store, Progress progress) {
    this.stage = stage;
    this.store = store;
    this.progress = progress;
  }

  /** Stops starting units and interrupts those that run; from any thread. */
  void cancel() {
    canceled = true;
    stopped = true;
    synchronized (workers) {
      workers.forEach(Thread::interrupt);
    }
  }

  List<R> results(int threads) throws InterruptedException {
    reuseStored();
    progress.report(stage.name(), done, results.size(), done > 0 ? done + " stored before" : "");
    if (!open.isEmpty()) {
      start(Math.min(threads, open.size()));
      collectUntilEnd();
    }
    if (done < results.size()) {
      throwFailure();
    }
    return results.stream().map(Optional::orElseThrow).toList();
  }

  private void reuseStored() {
    for (int i = 0; i < stage.units().size(); i++) {
      final Optional<R> stored = stored(stage.units().get(i).key());
      results.add(stored);
      if (stored.isPresent()) {
        done++;
      } else {
        open.add(i);
      }
    }
  }

  private Optional<R> stored(String key) {
    if (store == null) {
      return Optional.empty();
    }
    try {
      return store.find(stage.name(), stage.digest(), key).map(stage.codec()::decode);
    } catch (final IllegalArgumentException e) {
      // Written by a codec that no longer understands it: computed anew, then replaced.
      return Optional.empty();
    } catch (final IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private void start(int threads) {
    synchronized (workers) {
      for (int i = 0; i < threads; i++) {
        final Thread worker = new Thread(this::work, "torqueloom-" + stage.name() + "-" + i);
        worker.setDaemon(true);
        workers.add(worker);
      }
      workers.forEach(Thread::start);
    }
    if (canceled) {
      cancel();
    }
  }

  private void work() {
    try {
      while (!stopped) {
        final int turn = next.getAndIncrement();
        if (turn >= open.size()) {
          return;
        }
        outcomes.add(compute(open.get(turn)));
      }
    } finally {
      outcomes.add(new Outcome<>(-1, null, null, null));
    }
  }

  // Every failure is carried to the caller, so all of them are caught here.
  private Outcome<R> compute(int index) {
    try {
      final R result = stage.units().get(index).compute();
      if (result == null) {
        throw new IllegalStateException(stage.units().get(index).key() + " computed null");
      }
      final String payload = store == null ? null : stage.codec().encode(result);
      return new Outcome<>(index, result, payload, null);
    } catch (final Throwable failed) {
      stopped = true;
      return new Outcome<>(index, null, null, failed);
    }
  }

  private void collectUntilEnd() throws InterruptedException {
    lastStored = System.nanoTime();
    boolean ended = false;
    try {
      collect();
      ended = true;
    } finally {
      if (!ended) {
        cancel();
        takeWhatIsThere();
      }
      storeBatch();
    }
  }

  private void takeWhatIsThere() {
    for (Outcome<R> outcome = outcomes.poll(); outcome != null; outcome = outcomes.poll()) {
      if (!outcome.isEnd()) {
        take(outcome);
      }
    }
  }

  private void collect() throws InterruptedException {
    int running = workers.size();
    long deadline = Long.MAX_VALUE;
    while (running > 0) {
      final Outcome<R> outcome = outcomes.poll(POLL_MILLIS, TimeUnit.MILLISECONDS);
      if (outcome == null) {
        storeIfDue();
      } else if (outcome.isEnd()) {
        running--;
      } else {
        take(outcome);
      }
      if (canceled) {
        deadline = deadline == Long.MAX_VALUE ? System.nanoTime() + GRACE_NANOS : deadline;
        if (System.nanoTime() > deadline) {
          return;
        }
      }
    }
  }

  private void take(Outcome<R> outcome) {
    if (outcome.failure() != null) {
      if (failure == null || outcome.index() < failure.index()) {
        failure = outcome;
      }
      return;
    }
    results.set(outcome.index(), Optional.of(outcome.result()));
    done++;
    if (store != null) {
      final String key = stage.units().get(outcome.index()).key();
      batch.add(new StoredUnit(stage.name(), stage.digest(), key, outcome.payload()));
    }
    progress.report(stage.name(), done, results.size(), "");
    storeIfDue();
  }

  private void storeIfDue() {
    if (batch.size() >= LARGEST_BATCH || System.nanoTime() - lastStored >= STORE_EVERY_NANOS) {
      storeBatch();
    }
  }

  private void storeBatch() {
    if (!batch.isEmpty()) {
      try {
        store.append(batch);
      } catch (final IOException e) {
        throw new UncheckedIOException("results cannot be stored", e);
      }
      batch.clear();
    }
    lastStored = System.nanoTime();
  }

  private void throwFailure() throws InterruptedException {
    final Throwable cause = failure == null ? null : failure.failure();
    if (cause instanceof RuntimeException unchecked && !canceled) {
      throw unchecked;
    }
    if (cause instanceof Error error) {
      throw error;
    }
    throw new InterruptedException("stage " + stage.name() + " was canceled");
  }
}
