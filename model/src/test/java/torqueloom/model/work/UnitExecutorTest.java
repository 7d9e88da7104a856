package torqueloom.model.work;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

@Timeout(60)
class UnitExecutorTest {
  @TempDir Path folder;

  private final AtomicInteger computed = new AtomicInteger();

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 7, 1000})
  void resultsComeInTheOrderOfTheUnits(int threads) throws Exception {
    final List<String> results =
        new UnitExecutor(threads, null, Progress.NONE).run(stage("d", 300));
    assertEquals(IntStream.range(0, 300).mapToObj(i -> "r" + i).toList(), results);
    assertEquals(300, computed.get());
  }

  @Test
  void anEmptyStageHasNoResults() throws Exception {
    assertEquals(List.of(), new UnitExecutor(2, null, Progress.NONE).run(stage("d", 0)));
  }

  @Test
  void storedResultsAreNotComputedAgain() throws Exception {
    final List<String> reports = new ArrayList<>();
    try (RunStore store = RunStore.open(folder)) {
      store.append(
          List.of(
              new StoredUnit("s", "d", "unit=1", "stored"),
              new StoredUnit("s", "stale", "unit=2", "stale"),
              new StoredUnit("s", "d", "unit=3", "?")));
      final UnitExecutor executor =
          new UnitExecutor(2, store, (s, done, total, note) -> reports.add(done + "/" + total));
      assertEquals(List.of("r0", "stored", "r2", "r3"), executor.run(stage("d", 4)));
      assertEquals(3, computed.get());
      assertEquals(List.of("1/4", "2/4", "3/4", "4/4"), reports);
      assertEquals(List.of("r0", "stored", "r2", "r3"), executor.run(stage("d", 4)));
      assertEquals(3, computed.get());
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 8})
  void theFirstFailureInOrderIsThrownAndWhatWasDoneIsStored(int threads) throws Exception {
    final RuntimeException fault = new IllegalStateException("unit 5");
    final List<WorkUnit<String>> units = new ArrayList<>();
    for (int i = 0; i < 200; i++) {
      final int index = i;
      units.add(
          WorkUnit.of(
              "unit=" + i,
              () -> {
                Thread.sleep(index == 5 ? 20 : 1);
                if (index == 5) {
                  throw fault;
                }
                if (index > 5) {
                  throw new IllegalStateException("a later unit");
                }
                return "r" + index;
              }));
    }
    final Stage<String> stage = new Stage<>("s", "d", units, TextCodec.INSTANCE);
    try (RunStore store = RunStore.open(folder)) {
      final UnitExecutor executor = new UnitExecutor(threads, store, Progress.NONE);
      assertSame(fault, assertThrows(RuntimeException.class, () -> executor.run(stage)));
      assertEquals(5, store.size());
    }
  }

  @Test
  void errorsOfUnitsReachTheCaller() {
    final Stage<String> stage =
        new Stage<>(
            "s",
            "d",
            List.of(
                WorkUnit.of(
                    "u",
                    () -> {
                      throw new StackOverflowError("deep");
                    })),
            TextCodec.INSTANCE);
    assertThrows(
        StackOverflowError.class, () -> new UnitExecutor(1, null, Progress.NONE).run(stage));
  }

  @Test
  void cancelEndsSoonAndKeepsWhatIsDone() throws Exception {
    try (RunStore store = RunStore.open(folder)) {
      final UnitExecutor executor = new UnitExecutor(2, store, Progress.NONE);
      final CountDownLatch started = new CountDownLatch(2);
      final Stage<String> stage = firstDoneThenWaiting(started);
      final Thread canceler =
          new Thread(
              () -> {
                await(started);
                executor.cancel();
              });
      canceler.start();
      final long start = System.nanoTime();
      assertThrows(InterruptedException.class, () -> executor.run(stage));
      assertTrue(System.nanoTime() - start < TimeUnit.SECONDS.toNanos(20));
      assertEquals(1, store.size());
      assertThrows(InterruptedException.class, () -> executor.run(stage("d", 3)));
    }
    try (RunStore store = RunStore.open(folder)) {
      assertEquals(1, store.size());
    }
  }

  @Test
  void anInterruptOfTheCallerEndsTheRunWithWholeLines() throws Exception {
    try (RunStore store = RunStore.open(folder)) {
      final CountDownLatch started = new CountDownLatch(2);
      final Stage<String> stage = firstDoneThenWaiting(started);
      final Thread caller = Thread.currentThread();
      new Thread(
              () -> {
                await(started);
                caller.interrupt();
              })
          .start();
      assertThrows(
          InterruptedException.class, () -> new UnitExecutor(2, store, Progress.NONE).run(stage));
      assertEquals(1, store.size());
    }
    final byte[] bytes = Files.readAllBytes(folder.resolve(RunStore.FILE));
    assertEquals('\n', bytes[bytes.length - 1]);
  }

  @Test
  void aStoreThatCannotBeWrittenStopsTheRun() throws IOException {
    final RunStore store = RunStore.open(folder);
    store.close();
    final UnitExecutor executor = new UnitExecutor(2, store, Progress.NONE);
    assertThrows(UncheckedIOException.class, () -> executor.run(stage("d", 10)));
  }

  /** Killed without warning, a run resumes and ends with the results it would have had. */
  @Test
  void resumesAfterAKill() throws Exception {
    final Process child = ChildProcess.start("compute", folder);
    try (BufferedReader output = ChildProcess.output(child)) {
      int done = 0;
      while (done < 1500) {
        done = Integer.parseInt(output.readLine());
      }
    } finally {
      child.destroyForcibly();
    }
    assertTrue(child.waitFor(10, TimeUnit.SECONDS));
    try (RunStore store = RunStore.open(folder)) {
      final int kept = store.size();
      assertTrue(kept > 100 && kept < 10_000, "kept " + kept);
      final AtomicInteger first = new AtomicInteger(-1);
      final Progress progress = (stage, done, total, note) -> first.compareAndSet(-1, (int) done);
      final List<String> results =
          new UnitExecutor(2, store, progress).run(ChildProcess.stage(2000));
      assertEquals(IntStream.range(0, 2000).mapToObj(ChildProcess::resultOf).toList(), results);
      assertTrue(first.get() > 100 && first.get() <= kept, "reused " + first.get());
    }
  }

  @Test
  void keysMustDifferAndThreadsBePositive() {
    final WorkUnit<String> unit = WorkUnit.of("u", () -> "r");
    assertThrows(
        IllegalArgumentException.class,
        () -> new Stage<>("s", "d", List.of(unit, unit), TextCodec.INSTANCE));
    assertThrows(IllegalArgumentException.class, () -> new UnitExecutor(0, null, Progress.NONE));
  }

  @Test
  void noOtherEngineIsInstalledHere() {
    assertEquals(List.of(), EngineProvider.installed());
  }

  private Stage<String> stage(String digest, int count) {
    final List<WorkUnit<String>> units =
        IntStream.range(0, count)
            .mapToObj(
                i ->
                    WorkUnit.of(
                        "unit=" + i,
                        () -> {
                          computed.incrementAndGet();
                          return "r" + i;
                        }))
            .toList();
    return new Stage<>("s", digest, units, TextCodec.INSTANCE);
  }

  private static Stage<String> firstDoneThenWaiting(CountDownLatch started) {
    final List<WorkUnit<String>> units = new ArrayList<>();
    units.add(WorkUnit.of("first", () -> "done"));
    for (int i = 0; i < 4; i++) {
      units.add(
          WorkUnit.of(
              "waiting=" + i,
              () -> {
                started.countDown();
                Thread.sleep(30_000);
                return "never";
              }));
    }
    return new Stage<>("s", "d", units, TextCodec.INSTANCE);
  }

  private static void await(CountDownLatch latch) {
    try {
      latch.await();
    } catch (final InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}
