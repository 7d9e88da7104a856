package torqueloom.model.work;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.IntStream;

/** A second Java process for the tests of locks and crashes. */
final class ChildProcess {
  private ChildProcess() {}

  static Process start(String task, Path folder) throws IOException {
    return new ProcessBuilder(
            Path.of(System.getProperty("java.home"), "bin", "java").toString(),
            "-Xmx64m",
            "-XX:TieredStopAtLevel=1",
            "-cp",
            System.getProperty("java.class.path"),
            ChildProcess.class.getName(),
            task,
            folder.toString())
        .redirectError(ProcessBuilder.Redirect.DISCARD)
        .start();
  }

  static BufferedReader output(Process process) {
    return new BufferedReader(
        new InputStreamReader(process.getInputStream(), StandardCharsets.UTF_8));
  }

  public static void main(String[] arguments) throws Exception {
    final Path folder = Path.of(arguments[1]);
    if (arguments[0].equals("lock")) {
      try (RunLock lock = RunLock.acquire(folder)) {
        System.out.println("locked");
        System.in.read();
      }
    } else {
      computeSlowly(folder);
    }
  }

  private static void computeSlowly(Path folder) throws Exception {
    try (RunStore store = RunStore.open(folder);
        UnitExecutor executor =
            new UnitExecutor(2, store, (stage, done, total, note) -> System.out.println(done))) {
      executor.run(stage(10_000));
    }
  }

  /** Units of about a millisecond, whose result is a fixed function of the key. */
  static Stage<String> stage(int count) {
    final List<WorkUnit<String>> units =
        IntStream.range(0, count)
            .mapToObj(
                i ->
                    WorkUnit.of(
                        "unit=" + i,
                        () -> {
                          Thread.sleep(1);
                          return resultOf(i);
                        }))
            .toList();
    return new Stage<>("slow", "digest", units, TextCodec.INSTANCE);
  }

  static String resultOf(int i) {
    return "result " + i * 7919L;
  }
}
