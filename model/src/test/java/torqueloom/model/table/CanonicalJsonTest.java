package torqueloom.model.table;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CanonicalJsonTest {
  private record Interval(double estimate, double low, double high) {}

  private record Chip(int count, float[] curve, Interval yield, List<String> names) {}

  @TempDir Path folder;

  private enum Side {
    LEFT
  }

  @Test
  void writesEnumConstantsByName() {
    assertEquals("{\"side\":[\"LEFT\"]}", CanonicalJson.line(Map.of("side", List.of(Side.LEFT))));
  }

  @Test
  void writesKeysInOrderAndNumbersOnOneLine() {
    final Map<String, Object> result = new LinkedHashMap<>();
    result.put("schema", 1);
    result.put("b", new double[] {300.0, 5e-10, Double.NaN, Double.NEGATIVE_INFINITY});
    result.put("a", new Chip(2, new float[] {0.1f}, new Interval(0.5, 0, 1), List.of("x", "y")));
    result.put("matrix", new int[][] {{1, 2}, {}, {3}});
    result.put("unknown", null);
    result.put("empty", Map.of());
    result.put("flag", true);
    assertEquals(
        """
        {
          "schema": 1,
          "b": [300, 5e-10, null, null],
          "a": {
            "count": 2,
            "curve": [0.1],
            "yield": {
              "estimate": 0.5,
              "low": 0,
              "high": 1
            },
            "names": ["x", "y"]
          },
          "matrix": [
            [1, 2],
            [],
            [3]
          ],
          "unknown": null,
          "empty": {},
          "flag": true
        }
        """,
        CanonicalJson.text(result));
  }

  @Test
  void writesOneLineAndSortedLine() {
    final Map<String, Object> value = new LinkedHashMap<>();
    value.put("b", List.of(1, Map.of("z", 0.5)));
    value.put("a", "t");
    assertEquals("{\"b\":[1,{\"z\":0.5}],\"a\":\"t\"}", CanonicalJson.line(value));
    assertEquals("{\"a\":\"t\",\"b\":[1,{\"z\":0.5}]}", CanonicalJson.sortedLine(value));
  }

  @Test
  void escapesOnlyWhatItMust() {
    assertEquals(
        "\"\\\"\\\\/\\n\\t\\u0001 \u00B5\u03A9 \uD83D\uDE00 \\ud83d\"",
        CanonicalJson.line("\"\\/\n\t\u0001 \u00B5\u03A9 \uD83D\uDE00 \uD83D"));
    assertArrayEquals(
        "\"\u00B5\"\n".getBytes(StandardCharsets.UTF_8), CanonicalJson.bytes("\u00B5"));
  }

  @Test
  void refusesOtherTypes() {
    assertThrows(IllegalArgumentException.class, () -> CanonicalJson.text(new Object()));
    assertThrows(IllegalArgumentException.class, () -> CanonicalJson.text(Map.of(1, 2)));
  }

  @Test
  void readsBackWhatItWrote() throws IOException {
    final Map<String, Object> value = new LinkedHashMap<>();
    value.put("text", "\u00B5 \"x\"\n");
    value.put("numbers", Arrays.asList(1L, 0.1, -0.0, 1e300, Long.MAX_VALUE, null));
    value.put("flag", false);
    value.put("inner", Map.of("k", List.of()));
    assertEquals(value, JsonReader.parse(CanonicalJson.text(value), "t"));
    assertEquals(value, JsonReader.parse(CanonicalJson.line(value), "t"));
    CanonicalJson.write(folder.resolve("v.json"), value);
    assertEquals(value, JsonReader.read(folder.resolve("v.json")));
  }

  @ParameterizedTest(name = "{0}")
  @CsvSource(
      quoteCharacter = '`',
      value = {
        "``, no content",
        "`{\"a\": 1, \"a\": 2}`, f.json:1",
        "`{\"a\": 1} {`, more after",
        "`{\"a\": NaN}`, valid JSON is needed",
        "`{\"a\":`, valid JSON is needed",
        "`[1, 2`, valid JSON is needed",
        "`hello`, valid JSON is needed",
      })
  void namesFileAndFaultOfBadJson(String text, String words) {
    final FileContentException refusal =
        assertThrows(FileContentException.class, () -> JsonReader.parse(text, "f.json"));
    assertTrue(refusal.getMessage().contains(words), refusal.getMessage());
    assertTrue(refusal.getMessage().startsWith("f.json"), refusal.getMessage());
    assertFalse(refusal.getMessage().contains("Source"), refusal.getMessage());
  }

  @Test
  void refusesBytesThatAreNoText() throws IOException {
    final Path file = Files.write(folder.resolve("f.json"), new byte[] {'"', (byte) 0xFF, '"'});
    assertTrue(
        assertThrows(FileContentException.class, () -> JsonReader.read(file))
            .getMessage()
            .contains("UTF-8"));
    final String deep = "[".repeat(100_000);
    assertThrows(FileContentException.class, () -> JsonReader.parse(deep, "deep.json"));
  }

  @Test
  void fieldsAreReadByTypeAndNamedInComplaints() throws IOException {
    final JsonFields fields =
        JsonFields.of(
            JsonReader.parse(
                """
                {"n": 2, "x": 0.5, "u": null, "t": "s", "f": true, "v": [1, null, 2.5],
                 "m": [[1], [2, 3]], "o": {"list": [{"k": 1}, {"k": "no"}]}, "s": ["a"], "i": [4]}
                """,
                "lib.json"),
            "lib.json");
    assertEquals(2, fields.integer("n"));
    assertEquals(0.5, fields.number("x"));
    assertTrue(Double.isNaN(fields.number("u")));
    assertFalse(fields.has("u"));
    assertEquals("s", fields.text("t"));
    assertTrue(fields.flag("f"));
    assertArrayEquals(new double[] {1, Double.NaN, 2.5}, fields.numbers("v"));
    assertArrayEquals(new double[][] {{1}, {2, 3}}, fields.matrix("m"));
    assertEquals(List.of("a"), fields.texts("s"));
    assertArrayEquals(new int[] {4}, fields.integers("i"));
    final List<JsonFields> inner = fields.object("o").objects("list");
    assertEquals(1, inner.get(0).whole("k"));
    assertComplaint("lib.json: found \"no\" at o.list[1].k", () -> inner.get(1).whole("k"));
    assertComplaint("no field o.z", () -> fields.object("o").number("z"));
    assertComplaint("found an array at v", () -> fields.integers("v"));
    assertComplaint("found 0.5 at x", () -> fields.integer("x"));
    assertComplaint("found an array at m[0]", () -> fields.integers("m"));
  }

  private static void assertComplaint(String words, Executable reading) {
    final String message = assertThrows(FileContentException.class, reading).getMessage();
    assertTrue(message.contains(words), message);
  }
}
