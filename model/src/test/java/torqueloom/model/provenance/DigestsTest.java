package torqueloom.model.provenance;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class DigestsTest {
  /** The one-block example of FIPS 180-4's companion (NIST, SHA-256 of "abc"), from memory. */
  private static final String ABC =
      "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad";

  @TempDir Path folder;

  @Test
  void matchesThePublishedExample() throws IOException {
    assertEquals(ABC, Digests.sha256("abc"));
    assertEquals(ABC, Digests.sha256(new byte[] {'a', 'b', 'c'}));
    assertEquals(ABC, Digests.sha256(Files.writeString(folder.resolve("f"), "abc")));
  }

  @Test
  void filesLargerThanTheBufferAreReadWhole() throws IOException {
    final byte[] bytes = new byte[200_001];
    bytes[200_000] = 1;
    assertEquals(Digests.sha256(bytes), Digests.sha256(Files.write(folder.resolve("f"), bytes)));
  }

  /** Text counts as UTF-8: the digest of the two bytes C2 B5. */
  @Test
  void textIsUtf8() {
    assertEquals(Digests.sha256(new byte[] {(byte) 0xC2, (byte) 0xB5}), Digests.sha256("\u00B5"));
  }
}
