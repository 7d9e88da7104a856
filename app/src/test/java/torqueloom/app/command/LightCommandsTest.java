package torqueloom.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import torqueloom.model.table.JsonReader;

/** Commands that compute little: help, new, check, device. */
class LightCommandsTest {
  private static final Path PINNED = Path.of("..", "datasets-synthetic", "demo", "pinned.yaml");

  @TempDir Path folder;

  @SuppressWarnings("unchecked")
  private static Map<String, Object> object(Object value) {
    return (Map<String, Object>) value;
  }

  private static Map<String, Object> json(CommandRun run) throws IOException {
    assertEquals(ExitCode.DONE, run.code(), run.err());
    return object(JsonReader.parse(run.out(), "output"));
  }

  @Test
  void versionAndHelp() {
    assertTrue(CommandRun.of("--version").out().startsWith("torqueloom "));
    final CommandRun help = CommandRun.of("--help");
    assertEquals(ExitCode.DONE, help.code());
    for (final String command :
        List.of("new", "check", "device", "range", "budget", "replay", "compare", "sweep")) {
      assertTrue(help.out().contains("\n  " + command + " "), command + " in: " + help.out());
    }
    final CommandRun device = CommandRun.of("help", "device");
    for (final String option :
        List.of("--json", "--out", "--threads", "--seed", "--resume", "--quiet")) {
      assertTrue(device.out().contains(option), option);
    }
  }

  /** Keys of the result as documented in docs/commands.md. */
  @Test
  void deviceJsonHasTheDocumentedKeys() throws IOException {
    final Map<String, Object> document = json(CommandRun.of("device", "--json", PINNED));
    assertEquals(1L, document.get("schema"));
    final Map<String, Object> device = object(document.get("device"));
    for (final String key :
        List.of(
            "demagnetizingFactors",
            "axisFieldsTesla",
            "easyAxis",
            "middleAxis",
            "hardAxis",
            "easyFieldTesla",
            "hardFieldTesla",
            "imbalanceTesla",
            "restDirection",
            "thresholdTesla",
            "criticalCurrentDensity",
            "compensationThicknessMeters",
            "dampingNumber",
            "maximumDriveRatio",
            "thermalStability",
            "ringDownSeconds",
            "torqueTeslaPerDrive",
            "electrical",
            "warnings")) {
      assertTrue(device.containsKey(key), key + " in " + device.keySet());
    }
    assertEquals("y", device.get("hardAxis"));
  }

  @Test
  void deviceTextNamesTheQuantitiesWithUnits() {
    final CommandRun run = CommandRun.of("device", PINNED);
    assertEquals(ExitCode.DONE, run.code(), run.err());
    for (final String word : List.of("Puck A", "300 K", "mT", "A/m^2", "Electrical chain")) {
      assertTrue(run.out().contains(word), word + " in: " + run.out());
    }
  }

  @Test
  void newWritesARunnableStudyAndNeverOverwrites() throws IOException {
    final Path made = folder.resolve("a folder");
    final CommandRun first = CommandRun.of("new", made);
    assertEquals(ExitCode.DONE, first.code(), first.err());
    final Path study = made.resolve(NewCommand.STUDY);
    final CommandRun check = CommandRun.of("check", study);
    assertEquals(ExitCode.DONE, check.code(), check.err());
    assertEquals("", check.err());
    Files.writeString(study, "mine");
    final CommandRun second = CommandRun.of("new", made);
    assertEquals(ExitCode.BAD_INPUT, second.code());
    assertTrue(second.err().contains("not overwritten"), second.err());
    assertEquals("mine", Files.readString(study));
  }

  @Test
  void checkComputesNothingAndWritesNothing() throws IOException {
    final Path made = folder.resolve("s");
    CommandRun.of("new", made, "--quiet");
    final Map<String, Object> plan =
        json(CommandRun.of("check", "--json", made.resolve(NewCommand.STUDY), "--seed", "5"));
    assertEquals(5L, object(plan.get("study")).get("seed"));
    assertEquals(5, ((List<?>) plan.get("stages")).size());
    try (var files = Files.list(made)) {
      assertEquals(2, files.count());
    }
  }

  @Test
  void quietHidesNotices() {
    assertTrue(CommandRun.of("device", PINNED).err().contains("not used by this version"));
    assertEquals("", CommandRun.of("device", PINNED, "--quiet").err());
  }
}
