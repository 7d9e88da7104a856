package torqueloom.training.data;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CsvTaskReaderTest {
  @TempDir Path folder;

  private TaskTable read(String text) throws IOException {
    return read(text.getBytes(StandardCharsets.UTF_8));
  }

  private TaskTable read(byte[] bytes) throws IOException {
    final Path file = folder.resolve("task.csv");
    Files.write(file, bytes);
    return CsvTaskReader.read(DataFile.read(file), "state");
  }

  @Test
  void readsQuotedFieldsByteOrderMarkAndAnyLabelColumn() throws IOException {
    final TaskTable table =
        read("\uFEFF\"rms, mean\",state,Größe\r\n1.5,\"worn\",-2e-3\r\n\r\n\"3\", fine ,0\r\n");
    assertEquals(List.of("rms, mean", "Größe"), table.featureNames());
    assertEquals(List.of("fine", "worn"), table.classNames());
    assertArrayEquals(new int[] {1, 0}, table.labels());
    assertArrayEquals(new float[] {1.5f, -2e-3f, 3, 0}, table.features());
  }

  @Test
  void sortsNumericLabelsByValueAndWritesThemPlainly() throws IOException {
    final TaskTable table = read("x,state\n1,10\n1,9.0\n1,-1\n1,9\n1,1e1\n");
    assertEquals(List.of("-1", "9", "10"), table.classNames());
    assertArrayEquals(new int[] {2, 1, 0, 1, 2}, table.labels());
  }

  @Test
  void sortsLabelsAsTextIfOneIsNoNumber() throws IOException {
    assertEquals(List.of("10", "9", "nine"), read("x,state\n1,10\n1,9\n1,nine\n").classNames());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '\0',
      value = {
        "x,y,state\\n1,2,a\\n1,a\\n         | :3  | 2 values       | 3 columns",
        "x,y,state\\n1,2,a\\n1,2,3,a\\n     | :3  | 4 values       | 3 columns",
        "x,y,state\\n1,2,a\\n1,,b\\n        | :3  | no value       | y",
        "x,y,state\\n1,2,a\\n1,2,\\n        | :3  | no value       | state",
        "x,y,state\\n1,2,a\\nNaN,2,b\\n     | :3  | \"NaN\"        | x",
        "x,y,state\\nInfinity,2,b\\n        | :2  | \"Infinity\"   | x",
        "x,y,state\\n1,0x1p3,b\\n           | :2  | \"0x1p3\"      | y",
        "x,y,state\\n1,2d,b\\n              | :2  | \"2d\"         | y",
        "x,y,state\\n1,1e39,b\\n            | :2  | \"1e39\"       | 3.4e38",
        "x,y,state\\n1,\"1,5\",b\\n         | :2  | \"1,5\"        | y",
        "x,y,label\\n1,2,a\\n               | :1  | state          | x, y, label",
        "x,x,state\\n1,2,a\\n               | :1  | twice          | x",
        "x,,state\\n1,2,a\\n                | :1  | no name        | column 2",
        "state\\na\\nb\\n                   | :1  | only the label | feature column",
        "x,state\\n                         | csv | no row         | header",
        "\\n\\n                             | csv | no line        | task.csv",
      })
  void namesPlaceAndContentOfAFault(String text, String place, String found, String other) {
    final String csv = text.strip().replace("\\n", "\n");
    final String message = assertThrows(TaskDataException.class, () -> read(csv)).getMessage();
    for (final String word : List.of("task.csv", place.strip(), found.strip(), other.strip())) {
      assertTrue(message.contains(word), () -> "\"" + word + "\" is not in: " + message);
    }
  }

  @Test
  void tellsTheFirstTenFaultsAndCountsTheRest() {
    final String csv = "x,state\n" + "?,a\n".repeat(25);
    final TaskDataException e = assertThrows(TaskDataException.class, () -> read(csv));
    assertEquals(11, e.faults().size());
    assertTrue(e.faults().get(9).contains("task.csv:11"), e.getMessage());
    assertTrue(e.faults().get(10).contains("15 more"), e.getMessage());
  }

  @Test
  void refusesAnEmptyFileAMissingOneAndAFolder() {
    assertTrue(
        assertThrows(TaskDataException.class, () -> read("")).getMessage().contains("empty"));
    final Path missing = folder.resolve("missing.csv");
    assertTrue(
        assertThrows(TaskDataException.class, () -> DataFile.read(missing))
            .getMessage()
            .contains("missing.csv: no such file"));
    assertTrue(
        assertThrows(TaskDataException.class, () -> DataFile.read(folder))
            .getMessage()
            .contains("is a folder"));
  }

  @Test
  void refusesBytesThatAreNotUtf8() {
    final byte[] latin = "x,state\n1,a\n1,\u00e4\n".getBytes(StandardCharsets.ISO_8859_1);
    final String message = assertThrows(TaskDataException.class, () -> read(latin)).getMessage();
    assertTrue(message.contains("task.csv:3") && message.contains("UTF-8"), message);
  }

  @Test
  void listsTwentyColumnNamesAtMostIfTheLabelIsMissing() {
    final StringBuilder header = new StringBuilder("c0");
    for (int i = 1; i < 50; i++) {
      header.append(",c").append(i);
    }
    final String message =
        assertThrows(TaskDataException.class, () -> read(header + "\n")).getMessage();
    assertTrue(message.contains("c19 and 30 more"), message);
  }
}
