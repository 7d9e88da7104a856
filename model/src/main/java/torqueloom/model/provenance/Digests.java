package torqueloom.model.provenance;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/** SHA-256 digests (FIPS 180-4) as 64 lower-case hexadecimal digits. */
public final class Digests {
  private static final int BUFFER = 1 << 16;

  private Digests() {}

  /** The digest of bytes. */
  public static String sha256(byte[] bytes) {
    return HexFormat.of().formatHex(algorithm().digest(bytes));
  }

  /** The digest of a text in UTF-8, such as a document of canonical JSON. */
  public static String sha256(String text) {
    return sha256(text.getBytes(StandardCharsets.UTF_8));
  }

  /**
   * The digest of a file's content, read in pieces.
   *
   * @throws IOException if the file cannot be read
   */
  public static String sha256(Path file) throws IOException {
    final MessageDigest digest = algorithm();
    final byte[] buffer = new byte[BUFFER];
    try (InputStream in = Files.newInputStream(file)) {
      for (int read = in.read(buffer); read >= 0; read = in.read(buffer)) {
        digest.update(buffer, 0, read);
      }
    }
    return HexFormat.of().formatHex(digest.digest());
  }

  private static MessageDigest algorithm() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (final NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }
}
