package torqueloom.app.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The manual and the editor schema say what the schema says. */
class ManualTest {
  private static final Path DOCS = Path.of("..", "docs");
  private static final String MARK = "-Dmanual.write=true -->\n";
  private static final boolean WRITE = Boolean.getBoolean("manual.write");

  @Test
  void manualShowsTheSchema() throws IOException {
    final Path file = DOCS.resolve("study-file.md");
    final String text = Files.readString(file);
    final int end = text.indexOf(MARK) + MARK.length();
    assertTrue(end > MARK.length(), "the mark before the tables is missing");
    final String expected = text.substring(0, end) + Manual.tables();
    if (WRITE) {
      Files.writeString(file, expected);
    } else {
      assertEquals(expected, text, "write it anew as the mark in the file says");
    }
  }

  @Test
  void everyKeyStandsInTheManualWithItsMeaning() throws IOException {
    final String text = Files.readString(DOCS.resolve("study-file.md"));
    final List<String> missing = new ArrayList<>();
    StudySchema.walk(
        (path, key) -> {
          if (!text.contains("| `" + key.name() + "` | " + key.meaning() + " |")
              || key.meaning().isBlank()) {
            missing.add(path);
          }
        });
    assertEquals(List.of(), missing);
  }

  @Test
  void editorSchemaShowsTheSchema() throws IOException {
    final Path file = DOCS.resolve("study.schema.json");
    if (WRITE) {
      Files.writeString(file, JsonSchemaWriter.text());
    } else {
      assertEquals(JsonSchemaWriter.text(), Files.readString(file));
    }
  }
}
