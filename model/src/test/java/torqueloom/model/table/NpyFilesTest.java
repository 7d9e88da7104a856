package torqueloom.model.table;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The files come from NumPy 2.4.6, by the script make-npy.py beside them. */
class NpyFilesTest {
  private static final double[] VALUES = {1.5, -2, 0, 1e-300, 3e38, 7};

  @TempDir Path folder;

  @Test
  void readsWhatNumpyWrote() throws IOException {
    assertArray(NpyFiles.read(numpy("float64.npy")), VALUES, 2, 3);
    assertArray(NpyFiles.read(numpy("float32.npy")), new double[] {1.5, -0.1f, 3}, 3);
    assertArray(NpyFiles.read(numpy("int32.npy")), new double[] {1, -2, 3, 2147483647}, 2, 2);
    assertArray(NpyFiles.read(numpy("int64.npy")), new double[] {-5, 1L << 40}, 2);
    assertArray(NpyFiles.read(numpy("uint8.npy")), new double[] {0, 128, 255}, 3);
    assertArray(NpyFiles.read(numpy("scalar.npy")), new double[] {2.5});
  }

  @ParameterizedTest
  @CsvSource({
    "fortran.npy, Fortran order",
    "big-endian.npy, big-endian",
    "object.npy, Python objects",
    "text.npy, <U2",
    "structured.npy, plain arrays",
  })
  void refusesByName(String file, String words) {
    final FileContentException refusal =
        assertThrows(FileContentException.class, () -> NpyFiles.read(numpy(file)));
    assertTrue(refusal.getMessage().contains(words), refusal.getMessage());
    assertTrue(refusal.getMessage().startsWith(file), refusal.getMessage());
  }

  /**
   * NumPy pads the header to 64 bytes and orders its keys alike, so the files agree to the byte.
   */
  @Test
  void writesTheBytesNumpyWrites() throws IOException {
    NpyFiles.write(folder.resolve("a.npy"), VALUES, 2, 3);
    assertEquals(VALUES.length * 8 + 128, Files.size(folder.resolve("a.npy")));
    assertArrayEquals(
        Files.readAllBytes(numpy("float64.npy")), Files.readAllBytes(folder.resolve("a.npy")));
    NpyFiles.write(folder.resolve("b.npy"), new int[] {1, -2, 3, 2147483647}, 2, 2);
    assertArrayEquals(
        Files.readAllBytes(numpy("int32.npy")), Files.readAllBytes(folder.resolve("b.npy")));
  }

  @Test
  void refusesCutAndForeignFiles() throws IOException {
    final byte[] whole = Files.readAllBytes(numpy("float64.npy"));
    for (final int length : new int[] {0, 5, 11, 60, whole.length - 1}) {
      final Path cut = Files.write(folder.resolve("cut.npy"), Arrays.copyOf(whole, length));
      assertThrows(FileContentException.class, () -> NpyFiles.read(cut), "length " + length);
    }
    final Path longer =
        Files.write(folder.resolve("c.npy"), Arrays.copyOf(whole, whole.length + 8));
    assertThrows(FileContentException.class, () -> NpyFiles.read(longer));
    assertThrows(FileContentException.class, () -> NpyFiles.read(folder.resolve("none.npy")));
  }

  @Test
  void refusesAShapeThatDoesNotFitAndWritesNothing() {
    final Path file = folder.resolve("a.npy");
    assertThrows(IllegalArgumentException.class, () -> NpyFiles.write(file, VALUES, 4));
    assertThrows(
        IllegalArgumentException.class, () -> NpyFiles.write(file, VALUES, 1 << 20, 1 << 20));
    assertFalse(Files.exists(file));
  }

  private static void assertArray(NpyArray array, double[] values, int... shape) {
    assertArrayEquals(shape, array.shape());
    assertArrayEquals(values, array.values());
  }

  private static Path numpy(String name) {
    try {
      return Path.of(NpyFilesTest.class.getResource(name).toURI());
    } catch (final URISyntaxException e) {
      throw new IllegalStateException(e);
    }
  }
}
