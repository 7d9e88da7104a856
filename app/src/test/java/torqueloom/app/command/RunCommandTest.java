package torqueloom.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import torqueloom.model.table.JsonReader;
import torqueloom.model.work.RunLock;

/** A whole study, from the study file to the report, and what is reused of it. */
class RunCommandTest {
  @TempDir static Path folder;

  private static Path study;
  private static CommandRun first;

  @BeforeAll
  static void runOnce() throws IOException {
    study = TinyStudy.write(folder);
    first = CommandRun.of("run", study, "--threads", "1", "--json");
  }

  private static Path inRun(String name) {
    return folder.resolve("tiny.run").resolve(name);
  }

  private static Map<?, ?> json(String text) throws IOException {
    return (Map<?, ?>) JsonReader.parse(text, "output");
  }

  private static int wanted() throws IOException {
    return "met".equals(json(first.out()).get("verdict")) ? ExitCode.DONE : ExitCode.NOT_MET;
  }

  @Test
  void printsOneDocumentAndLeavesTheDocumentedFiles() throws IOException {
    assertEquals(wanted(), first.code(), first.err());
    assertEquals(Files.readString(inRun("results.json")), first.out());
    for (final String name :
        List.of("report.html", "library.json", "network.zip", "provenance.json", "timing.json")) {
      assertTrue(Files.size(inRun(name)) > 0, name);
    }
    try (Stream<Path> files = Files.list(inRun(""))) {
      assertFalse(files.anyMatch(file -> file.toString().endsWith(".part")));
    }
  }

  @Test
  void resultsHaveTheDocumentedKeys() throws IOException {
    final Map<?, ?> results = json(first.out());
    for (final String key :
        List.of(
            "schema",
            "study",
            "version",
            "verdict",
            "ideal",
            "baseline",
            "chips",
            "energyPerInferenceJoules",
            "latencySeconds")) {
      assertTrue(results.containsKey(key), key + " in " + results.keySet());
    }
    final Map<?, ?> chips = (Map<?, ?>) ((List<?>) results.get("chips")).get(0);
    assertEquals(6L, chips.get("count"));
    assertEquals(6, ((List<?>) chips.get("accuracies")).size());
    assertEquals(3L, ((Map<?, ?>) results.get("study")).get("seed"));
    // Two slots and one layer of devices, 4 ns each.
    assertEquals(12e-9, (Double) results.get("latencySeconds"), 1e-20);
  }

  /** The manual names every key, so that none is added in silence. */
  @Test
  void everyKeyStandsInTheManual() throws IOException {
    final String manual = Files.readString(Path.of("..", "docs", "commands.md"));
    final Map<?, ?> results = json(first.out());
    final Map<?, ?> chips = (Map<?, ?>) ((List<?>) results.get("chips")).get(0);
    for (final Object key :
        Stream.concat(results.keySet().stream(), chips.keySet().stream()).toList()) {
      assertTrue(manual.contains("`" + key + "`"), key + " is missing in docs/commands.md");
    }
    final Map<?, ?> curve =
        (Map<?, ?>)
            ((List<?>) json(CommandRun.of("calibrate", study, "--json").out()).get("response"))
                .get(0);
    for (final Object key : curve.keySet()) {
      assertTrue(manual.contains("`" + key + "`"), key + " is missing in docs/commands.md");
    }
  }

  /** The same study and seed give the same bytes on any number of threads. */
  @Test
  void resultsDoNotDependOnThreads() {
    final CommandRun two =
        CommandRun.of("run", study, "--threads", "2", "--json", "--out", folder.resolve("two"));
    assertEquals(first.out(), two.out());
  }

  @Test
  void anotherSeedGivesAnotherResult() {
    final CommandRun other =
        CommandRun.of("run", study, "--seed", "4", "--json", "--out", folder.resolve("seed"));
    assertFalse(first.out().equals(other.out()));
  }

  @Test
  void textEndsWithVerdictAndReport() throws IOException {
    final CommandRun again = CommandRun.of("run", study, "--quiet");
    assertEquals(wanted(), again.code(), again.err());
    assertEquals("", again.err());
    final List<String> lines = again.out().lines().toList();
    assertEquals(4, lines.size(), again.out());
    assertTrue(lines.get(3).endsWith("report.html"), again.out());
  }

  @Test
  void singleStagesPrintTheirDocuments() throws IOException {
    final Map<?, ?> response = json(CommandRun.of("calibrate", study, "--json").out());
    assertEquals(2, ((List<?>) response.get("response")).size());
    assertTrue(response.containsKey("synapse"));
    final Map<?, ?> training = json(CommandRun.of("train", study, "--json").out());
    assertEquals(json(first.out()).get("ideal"), training.get("ideal"));
    assertEquals(first.out(), CommandRun.of("chips", study, "--json").out());
    final CommandRun report = CommandRun.of("report", study, "--json");
    assertEquals(first.out(), report.out());
    assertEquals(ExitCode.DONE, report.code());
    for (final String command : List.of("calibrate", "train", "chips", "report")) {
      assertFalse(CommandRun.of(command, study).out().isBlank(), command);
    }
  }

  @Test
  void reportRefusesWhatWasNotComputed() {
    final Path empty = folder.resolve("empty");
    final CommandRun run = CommandRun.of("report", study, "--out", empty);
    assertEquals(ExitCode.BAD_INPUT, run.code());
    assertTrue(run.err().contains("no results"), run.err());
    assertFalse(Files.exists(empty));
    final CommandRun changed = CommandRun.of("report", study, "--seed", "99");
    assertEquals(ExitCode.BAD_INPUT, changed.code());
  }

  @Test
  void resumeRefusesWhatWasNotBegun() {
    final CommandRun run = CommandRun.of("run", study, "--resume", "--out", folder.resolve("none"));
    assertEquals(ExitCode.BAD_INPUT, run.code());
    assertTrue(run.err().contains("nothing was begun"), run.err());
  }

  @Test
  void aFolderInUseIsRefused() throws IOException {
    final Path held = Files.createDirectories(folder.resolve("held"));
    try (RunLock lock = RunLock.acquire(held)) {
      final CommandRun run = CommandRun.of("run", study, "--out", held);
      assertEquals(ExitCode.BAD_INPUT, run.code());
      assertTrue(run.err().contains("in use"), run.err());
    }
  }

  /** A folder below a device file can be made by nobody, root included. */
  @Test
  void aFolderThatCannotBeMadeIsRefused() {
    final CommandRun run = CommandRun.of("run", study, "--out", "/proc/none/run");
    assertEquals(ExitCode.BAD_INPUT, run.code(), run.err());
    assertTrue(run.err().contains("output folder"), run.err());
  }

  @Test
  void badDataIsRefusedBeforeTheFolderIsMade() throws IOException {
    final Path other = Files.createDirectories(folder.resolve("other"));
    Files.writeString(other.resolve("tiny.csv"), "a,b,state\n1,2,on\n3,on\n");
    final Path bad = Files.writeString(other.resolve("bad.yaml"), TinyStudy.TEXT);
    for (final String command : List.of("train", "chips", "run")) {
      final CommandRun run = CommandRun.of(command, bad);
      assertEquals(ExitCode.BAD_INPUT, run.code(), run.err());
      assertFalse(Files.exists(other.resolve("bad.run")), command);
    }
  }
}
