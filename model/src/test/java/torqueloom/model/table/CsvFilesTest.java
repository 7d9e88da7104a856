package torqueloom.model.table;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CsvFilesTest {
  @TempDir Path folder;

  @Test
  void readsHeaderQuotesLineEndsAndByteOrderMark() throws IOException {
    final String text = "\uFEFFa, label \r\n1,\"x, \"\"y\"\"\nz\"\r\n\r\n-2.5e-3,w\r\n";
    final Path file = Files.write(folder.resolve("t.csv"), text.getBytes(StandardCharsets.UTF_8));
    final CsvTable table = CsvFiles.read(file);
    assertEquals("t.csv", table.file());
    assertEquals(List.of("a", "label"), table.header());
    assertEquals(2, table.size());
    assertArrayEquals(new double[] {1, -0.0025}, table.numbers(table.column("a")));
    assertEquals(List.of("x, \"y\"\nz", "w"), table.texts(1));
    assertEquals(2, table.line(0));
    assertEquals(5, table.line(1));
    assertEquals(List.of("-2.5e-3", "w"), table.row(1));
  }

  @ParameterizedTest(name = "{0}")
  @CsvSource(
      quoteCharacter = '`',
      value = {
        "``, f.csv: found no content",
        "`a,b\\n1,2\\n3\\n`, f.csv:3: found 1 cells; 2 cells are needed",
        "`a,b\\n1,2,3\\n`, f.csv:2: found 3 cells; 2 cells are needed",
        "`a,a\\n1,2\\n`, the column name \"a\" twice",
        "`a;b\\n1;2\\n`, commas are needed",
        "`a,b\\n1,\"2\\n`, quotes are needed in pairs",
        "`a,b\\n1,\"2\"x\\n`, valid CSV is needed",
      })
  void namesFileLineAndFault(String text, String words) {
    final String message =
        assertThrows(
                FileContentException.class,
                () -> CsvFiles.parse(text.replace("\\n", "\n"), "f.csv"))
            .getMessage();
    assertTrue(message.contains(words), message);
    assertTrue(message.startsWith("f.csv"), message);
  }

  @ParameterizedTest
  @CsvSource({"NaN", "inf", "abc", "0x1p3", "1d", "1e999", "''", "'1,5'"})
  void namesTheCellThatIsNoNumber(String cell) throws IOException {
    final CsvTable table = CsvFiles.parse("x,y\n1,2\n3,\"" + cell + "\"\n", "f.csv");
    final String message =
        assertThrows(FileContentException.class, () -> table.numbers(1)).getMessage();
    assertTrue(message.startsWith("f.csv:3: found "), message);
    assertTrue(message.contains("in column y"), message);
    assertTrue(
        assertThrows(FileContentException.class, () -> table.column("z"))
            .getMessage()
            .contains("x, y"));
  }

  @Test
  void missingFilesAndFoldersAreNamed() {
    final Path missing = folder.resolve("none.csv");
    assertTrue(
        assertThrows(FileContentException.class, () -> CsvFiles.read(missing))
            .getMessage()
            .contains("no such file"));
    assertThrows(FileContentException.class, () -> CsvFiles.read(folder));
  }

  @Test
  void writesGuardedTextAndShortestNumbers() throws IOException {
    final List<List<Object>> rows =
        List.of(
            Arrays.asList("=1+1", 300.0, -5e-10),
            Arrays.asList("a,b", Double.NaN, null),
            Arrays.asList("@x", 7, true),
            Arrays.asList("-3", 7, false));
    final Path file = folder.resolve("o.csv");
    CsvFiles.write(file, List.of("name", "x", "y"), rows);
    assertEquals(
        "name,x,y\n'=1+1,300,-5e-10\n\"a,b\",,\n'@x,7,true\n'-3,7,false\n", Files.readString(file));
    assertEquals(4, CsvFiles.read(file).size());
    assertThrows(
        IllegalArgumentException.class, () -> CsvFiles.text(List.of("a"), List.of(List.of(1, 2))));
  }
}
