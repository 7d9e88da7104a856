package torqueloom.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.api.io.TempDir;
import torqueloom.model.table.JsonReader;

/**
 * Every study that stands in the README, in the documents, in the demo or in {@code new} runs {@code
 * device} without a warning that its own comments do not name.
 */
class StandingStudiesTest {
  private static final Path HOME = Path.of("..");
  private static final Pattern BLOCK = Pattern.compile("(?s)```ya?ml\\n(.*?)```");

  @TempDir static Path folder;

  @TestFactory
  Stream<DynamicTest> warningsAreNamed() throws IOException {
    final List<DynamicTest> tests = new ArrayList<>();
    final String starter = new String(NewCommand.starter(), StandardCharsets.UTF_8);
    tests.add(test("new", starter));
    for (final Path file : list(HOME.resolve("datasets-synthetic/demo"), ".yaml")) {
      tests.add(test(file.getFileName().toString(), Files.readString(file)));
    }
    final List<Path> pages = new ArrayList<>(list(HOME.resolve("docs"), ".md"));
    pages.addAll(list(HOME, ".md"));
    for (final Path page : pages) {
      final Matcher block = BLOCK.matcher(Files.readString(page));
      while (block.find()) {
        if (block.group(1).contains("torqueloom: 1")) {
          tests.add(test(page.getFileName() + " at " + block.start(), block.group(1)));
        }
      }
    }
    assertTrue(tests.size() >= 3, "too few studies found");
    return tests.stream();
  }

  private static List<Path> list(Path folder, String ending) throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.filter(file -> file.toString().endsWith(ending)).sorted().toList();
    }
  }

  private static DynamicTest test(String name, String text) {
    return DynamicTest.dynamicTest(name, () -> check(text));
  }

  private static void check(String text) throws IOException {
    final Path study = Files.writeString(folder.resolve("study.yaml"), text);
    final CommandRun run = CommandRun.of("device", "--json", study);
    assertEquals(ExitCode.DONE, run.code(), run.err());
    final Map<?, ?> document = (Map<?, ?>) JsonReader.parse(run.out(), "output");
    final String comments =
        text.lines()
            .filter(line -> line.contains("#"))
            .map(line -> line.substring(line.indexOf('#')))
            .reduce("", (a, b) -> a + "\n" + b);
    for (final Object warning : (List<?>) ((Map<?, ?>) document.get("device")).get("warnings")) {
      final String code = (String) ((Map<?, ?>) warning).get("code");
      assertTrue(comments.contains(code), "no comment names " + warning);
    }
    assertFalse(comments.isEmpty());
  }
}
