package torqueloom.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/** Ctrl-C in the middle of a run: exit code 130, no half-written file, and it can be taken up. */
@EnabledOnOs({OS.LINUX, OS.MAC})
class StopTest {
  @TempDir Path folder;

  @Test
  void ctrlCLeavesNothingHalfWritten() throws Exception {
    final Path study = TinyStudy.write(folder);
    Files.writeString(
        study,
        TinyStudy.TEXT.replace(
            "{instances: 2, drives: 6, half-width: 20 %, maximum-trials: 64}",
            "{instances: 400, drives: 24, half-width: 2 %, maximum-trials: 4000}"));
    final Path log = folder.resolve("log");
    final Process process = start(study, log);
    waitFor(log, "calibrate");
    new ProcessBuilder("kill", "-INT", Long.toString(process.pid())).start().waitFor();
    assertTrue(process.waitFor(30, TimeUnit.SECONDS), "it did not stop");
    assertEquals(ExitCode.STOPPED, process.exitValue());
    assertFalse(Files.readString(log).contains("Exception"), Files.readString(log));
    try (Stream<Path> files = Files.list(folder.resolve("tiny.run"))) {
      final List<String> left = files.map(file -> file.getFileName().toString()).sorted().toList();
      assertEquals(List.of("lock", "units.jsonl"), left);
    }
  }

  private static Process start(Path study, Path log) throws IOException {
    final String java =
        System.getProperty("java.home") + File.separator + "bin" + File.separator + "java";
    return new ProcessBuilder(
            java,
            "-Xmx400m",
            "-cp",
            System.getProperty("java.class.path"),
            "torqueloom.app.Main",
            "run",
            study.toString())
        .redirectErrorStream(true)
        .redirectOutput(log.toFile())
        .start();
  }

  private static void waitFor(Path log, String word) throws Exception {
    for (int i = 0; i < 600; i++) {
      if (Files.exists(log) && Files.readString(log).contains(word)) {
        Thread.sleep(300);
        return;
      }
      Thread.sleep(100);
    }
    throw new IllegalStateException("no progress in " + Files.readString(log));
  }
}
