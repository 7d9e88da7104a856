package torqueloom.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Bad input: one clear message, exit code 2, no stack trace, nothing written. */
class BadInputTest {
  private static final String GOOD_DATA = "a,b,state\n" + "0.1,0.2,on\n0.9,0.8,off\n".repeat(20);

  @TempDir Path folder;

  private Path study;

  private void write(String before, String after, String data) throws IOException {
    try (InputStream in = getClass().getResourceAsStream("/torqueloom/app/full.yaml")) {
      final String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      assertTrue(text.contains(before), before);
      study = Files.writeString(folder.resolve("study.yaml"), text.replace(before, after));
    }
    Files.writeString(folder.resolve("task.csv"), data);
  }

  private List<Path> files() throws IOException {
    try (Stream<Path> all = Files.walk(folder)) {
      return all.sorted().toList();
    }
  }

  private void refused(String command, List<String> words, Object... more) throws IOException {
    final List<Path> before = files();
    final Object[] arguments = Stream.concat(Stream.of(command, study), Stream.of(more)).toArray();
    final CommandRun run = CommandRun.of(arguments);
    assertEquals(ExitCode.BAD_INPUT, run.code(), run.err());
    assertEquals("", run.out());
    for (final String word : words) {
      assertTrue(run.err().contains(word), word + " in: " + run.err());
    }
    assertFalse(run.err().contains("\tat "), run.err());
    assertFalse(run.err().contains("Exception"), run.err());
    assertEquals(before, files(), "something was written");
  }

  @ParameterizedTest
  @ValueSource(strings = {"check", "device"})
  void missingFile(String command) throws IOException {
    study = folder.resolve("gone.yaml");
    refused(command, List.of("gone.yaml", "no such file", "nothing was written"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"check", "device"})
  void emptyFile(String command) throws IOException {
    study = Files.writeString(folder.resolve("empty.yaml"), "");
    refused(command, List.of("empty.yaml", "is empty"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"check", "device"})
  void notYaml(String command) throws IOException {
    study = Files.writeString(folder.resolve("odd.yaml"), "a: [1\nb: }\n");
    refused(command, List.of("odd.yaml:2:", "not readable as YAML"));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "thickness: 4 nm | thicknes: 4 nm | device.film.thicknes,unknown key,thickness",
        "thickness: 4 nm | thickness: -4 nm | device.film.thickness,found -4 nm,at least 0.1 nm",
        "thickness: 4 nm | thickness: 4 T | device.film.thickness,found \"4 T\",a length",
        "damping: 0.1 | damping: 0 | device.film.damping,found 0,more than 0",
        "damping: 0.1 | damping: 1.5 | device.film.damping,found 1.5,at most 1",
        "damping: 0.1 | damping: .nan | device.film.damping,.nan,not finite",
        "damping: 0.1 | damping: .inf | device.film.damping,.inf,not finite",
        "pulse: 0.5 ns | 'pulse: 0.5 ns\n  pulse: 1 ns' | protocol.pulse,duplicate key,first in line"
      })
  void faultsInTheStudy(String before, String after, String words) throws IOException {
    write(before, after, GOOD_DATA);
    refused("check", List.of(words.split(",")));
    refused("device", List.of(words.split(",")));
  }

  @Test
  void severalFaultsAreCounted() throws IOException {
    write("damping: 0.1\n", "damping: 0\n    dampng: 1\n", GOOD_DATA);
    refused("check", List.of("2 problems; nothing was run, nothing was written."));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "'a,b,state\n1,2,on\n1,off\n' | task.csv:3",
        "'a,b,state\n1,2,on\n2,2,on\n' | one class",
        "'a,b,mood\n1,2,on\n2,2,off\n' | state",
        "'a,b,state\n1,x,on\n2,2,off\n' | task.csv:2",
        "'a,b,state\n1,NaN,on\n2,2,off\n' | task.csv:2",
        "'a,b,state\n' | task.csv",
        "'' | task.csv"
      })
  void faultsInTheData(String data, String word) throws IOException {
    write("seed: 42", "seed: 42", data == null ? "" : data);
    refused("check", List.of(word, "nothing was run, nothing was written"));
  }

  @Test
  void missingData() throws IOException {
    write("task.csv", "gone.csv", GOOD_DATA);
    refused("check", List.of("task.data", "gone.csv", "no such file"));
  }

  @Test
  void outputFolderThatCannotBeMade() throws IOException {
    write("seed: 42", "seed: 42", GOOD_DATA);
    Files.writeString(folder.resolve("taken"), "x");
    refused(
        "check", List.of("output folder", "a folder is needed"), "--out", folder.resolve("taken"));
    refused(
        "check", List.of("output folder", "is not a folder"), "--out", folder.resolve("taken/in"));
  }

  @ParameterizedTest
  @CsvSource({
    "--threads 0, --threads",
    "--threads x, threads",
    "--seed -1, --seed",
    "--seed 1.5, seed",
    "--sed 1, Unknown option",
    "--out, --out"
  })
  void badOptions(String options, String word) throws IOException {
    write("seed: 42", "seed: 42", GOOD_DATA);
    refused("check", List.of(word), (Object[]) options.split(" "));
  }

  @Test
  void seedBeyondTheLargestIsRefused() throws IOException {
    write("seed: 42", "seed: 42", GOOD_DATA);
    refused("check", List.of("--seed", "9007199254740991"), "--seed", "9007199254740992");
  }

  @Test
  void noCommandAndUnknownCommand() {
    assertEquals(ExitCode.BAD_INPUT, CommandRun.of().code());
    final CommandRun unknown = CommandRun.of("trian", "x.yaml");
    assertEquals(ExitCode.BAD_INPUT, unknown.code());
    assertTrue(unknown.err().contains("trian"), unknown.err());
    assertEquals(ExitCode.BAD_INPUT, CommandRun.of("device").code());
  }

  /** Commands of later versions say so instead of pretending. */
  @ParameterizedTest
  @ValueSource(strings = {"range", "budget", "replay", "compare", "sweep"})
  void laterCommands(String command) {
    final CommandRun run =
        CommandRun.of(command, folder.resolve("x.yaml"), "--json", "--threads", "2");
    assertEquals(ExitCode.BAD_INPUT, run.code());
    assertEquals("", run.out());
    assertTrue(run.err().contains(command + " is not in this version"), run.err());
  }
}
