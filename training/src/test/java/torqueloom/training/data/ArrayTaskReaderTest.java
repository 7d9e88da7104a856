package torqueloom.training.data;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.List;
import java.util.zip.GZIPOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ArrayTaskReaderTest {
  private static final byte[] IMAGES =
      hex("00000803 00000003 00000001 00000002 0001 10FF 8020".replace(" ", ""));
  private static final byte[] LABELS = hex("00000801 00000003 070207".replace(" ", ""));

  @TempDir Path folder;

  private static byte[] hex(String text) {
    return HexFormat.of().parseHex(text.replace(" ", ""));
  }

  private DataFile file(String name, byte[] bytes) throws IOException {
    return DataFile.read(Files.write(folder.resolve(name), bytes));
  }

  private static byte[] gzip(byte[] bytes) throws IOException {
    final ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (GZIPOutputStream zip = new GZIPOutputStream(out)) {
      zip.write(bytes);
    }
    return out.toByteArray();
  }

  private static byte[] npy(int version, String header, byte[] data) {
    final byte[] text = header.getBytes(StandardCharsets.UTF_8);
    final ByteBuffer out =
        ByteBuffer.allocate(12 + text.length + data.length).order(ByteOrder.LITTLE_ENDIAN);
    out.put(hex("934E554D5059")).put((byte) version).put((byte) 0);
    if (version == 1) {
      out.putShort((short) text.length);
    } else {
      out.putInt(text.length);
    }
    out.put(text).put(data);
    return Arrays.copyOf(out.array(), out.position());
  }

  @ParameterizedTest
  @ValueSource(booleans = {false, true})
  void readsIdxPlainAndGzipped(boolean zipped) throws IOException {
    final TaskTable table =
        ArrayTaskReader.read(
            file("images", zipped ? gzip(IMAGES) : IMAGES),
            file("labels", zipped ? gzip(LABELS) : LABELS));
    assertEquals(List.of("2", "7"), table.classNames());
    assertArrayEquals(new int[] {1, 0, 1}, table.labels());
    assertArrayEquals(new float[] {0, 1, 16, 255, 128, 32}, table.features());
    assertEquals(List.of("x0", "x1"), table.featureNames());
  }

  @ParameterizedTest
  @CsvSource({
    "00000901 00000002 FF7F, -1, 127",
    "00000B01 00000002 FFFF0102, -1, 258",
    "00000C01 00000002 FFFFFFFE00010000, -2, 65536",
    "00000D01 00000002 3FC00000C0000000, 1.5, -2",
    "00000E01 00000002 3FF8000000000000C000000000000000, 1.5, -2",
  })
  void readsEveryIdxType(String bytes, double first, double second) throws IOException {
    assertArrayEquals(
        new double[] {first, second}, IdxReader.read(file("array", hex(bytes))).values());
  }

  @ParameterizedTest
  @CsvSource({
    "00000803 00000003 00000001 00000002 0001 10FF 80, ends after 5 of the 6",
    "00000803 00000003 00000001 00000002 0001 10FF 8020 00, goes on after the 6",
    "00000803 00000003 00000001, cut short",
    "00000A03 00000003, magic number",
    "00000800, magic number",
    "00010801 00000001 00, magic number",
    "00000802 00000003 00000000, axis has length 0",
    "00000803 7FFFFFFF 7FFFFFFF 7FFFFFFF, too many",
    "00000802 FFFFFFFF 00000001, axis has length -1",
  })
  void refusesADamagedIdxFile(String bytes, String words) throws IOException {
    final DataFile data = file("array", hex(bytes));
    final String message =
        assertThrows(TaskDataException.class, () -> IdxReader.read(data)).getMessage();
    assertTrue(message.contains("array") && message.contains(words), message);
  }

  @Test
  void refusesADamagedGzipFile() throws IOException {
    final byte[] whole = gzip(IMAGES);
    final DataFile cut = file("cut.gz", Arrays.copyOf(whole, whole.length - 12));
    assertThrows(TaskDataException.class, () -> IdxReader.read(cut));
    whole[whole.length - 6] ^= 1; // the checksum
    final DataFile wrong = file("wrong.gz", whole);
    assertThrows(TaskDataException.class, () -> IdxReader.read(wrong));
  }

  @Test
  void readsNpyInBothMemoryOrders() throws IOException {
    // numpy.array([[1, 2, 3], [4, 5, 6]], '<i2'), once in C and once in Fortran order
    final byte[] rows = hex("0100 0200 0300 0400 0500 0600");
    final byte[] columns = hex("0100 0400 0200 0500 0300 0600");
    final String header = "{'descr': '<i2', 'fortran_order': %s, 'shape': (2, 3), }\n";
    final double[] expected = {1, 2, 3, 4, 5, 6};
    final DataFile c = file("c.npy", npy(1, String.format(header, "False"), rows));
    final DataFile f = file("f.npy", npy(2, String.format(header, "True"), columns));
    assertArrayEquals(expected, NpyReader.read(c).values());
    assertArrayEquals(expected, NpyReader.read(f).values());
  }

  @ParameterizedTest
  @CsvSource({
    "|b1, 0100, 1, 0",
    "|u1, FF01, 255, 1",
    "|i1, FF01, -1, 1",
    "<u2, FFFF0100, 65535, 1",
    ">i4, FFFFFFFF00000001, -1, 1",
    "<u4, FFFFFFFF01000000, 4294967295, 1",
    "<i8, FFFFFFFFFFFFFFFF0100000000000000, -1, 1",
    ">f4, 3FC00000C0000000, 1.5, -2",
    "<f8, 000000000000F83F00000000000000C0, 1.5, -2",
  })
  void readsEveryNpyType(String descr, String bytes, double first, double second)
      throws IOException {
    final String header = "{'descr': '" + descr + "', 'fortran_order': False, 'shape': (2,), }";
    final DataFile data = file("a.npy", npy(1, header, hex(bytes)));
    assertArrayEquals(new double[] {first, second}, NpyReader.read(data).values());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "{'descr': '|O', 'fortran_order': False, 'shape': (2,), } ; booleans, integers and floats",
        "{'descr': '<c8', 'fortran_order': False, 'shape': (2,), } ; booleans, integers and floats",
        "{'descr': '<f4', 'fortran_order': False, 'shape': (3,), } ; announces 12",
        "{'descr': '<f4', 'fortran_order': False, 'shape': (), } ; one axis",
        "{'descr': '<f4', 'fortran_order': False, 'shape': (99999999999,), } ; one axis",
        "{'descr': '<f4', 'fortran_order': False } ; 'shape'",
        "{'descr': [('a', '<f4')], 'fortran_order': False, 'shape': (2,), } ; 'descr'",
      })
  void refusesAnNpyFileItCannotRead(String header, String words) throws IOException {
    final DataFile data = file("a.npy", npy(1, header, new byte[8]));
    final String message =
        assertThrows(TaskDataException.class, () -> NpyReader.read(data)).getMessage();
    assertTrue(message.contains("a.npy") && message.contains(words), message);
  }

  @Test
  void refusesFilesThatDoNotFitTogether() throws IOException {
    final DataFile images = file("images", IMAGES);
    final DataFile twoLabels = file("labels", hex("00000801 00000002 0702"));
    assertMessage(images, twoLabels, "2 labels", "3 cases");
    final DataFile half = file("half", hex("00000D01 00000003 3F800000 3FC00000 3F800000"));
    assertMessage(images, half, "label of case 1", "1.5");
    final DataFile nan = file("nan", hex("00000D02 00000003 00000001 3F800000 7FC00000 00000000"));
    assertMessage(nan, file("fine", LABELS), "case 1", "NaN");
    assertMessage(file("text", "x,y".getBytes(StandardCharsets.UTF_8)), images, "text", "neither");
    assertMessage(images, images, "2 numbers a case", "labels");
  }

  private static void assertMessage(DataFile features, DataFile labels, String... words) {
    final String message =
        assertThrows(TaskDataException.class, () -> ArrayTaskReader.read(features, labels))
            .getMessage();
    for (final String word : words) {
      assertTrue(message.contains(word), message);
    }
  }
}
