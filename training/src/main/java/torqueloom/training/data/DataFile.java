package torqueloom.training.data;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/** The bytes of one data file, read once; parsing and digest see the same bytes. */
final class DataFile {
  private final Path path;
  private final byte[] bytes;

  private DataFile(Path path, byte[] bytes) {
    this.path = path;
    this.bytes = bytes;
  }

  /**
   * Reads a whole file.
   *
   * @throws TaskDataException if it is missing, a folder, unreadable, empty, or 2 GiB or more
   */
  static DataFile read(Path path) {
    if (Files.isDirectory(path)) {
      throw new TaskDataException(path + ": is a folder; a data file is needed");
    }
    try {
      if (Files.size(path) > Integer.MAX_VALUE - 16) {
        throw new TaskDataException(path + ": has 2 GiB or more; data files must be smaller");
      }
      final byte[] bytes = Files.readAllBytes(path);
      if (bytes.length == 0) {
        throw new TaskDataException(path + ": the file is empty");
      }
      return new DataFile(path, bytes);
    } catch (NoSuchFileException e) {
      throw new TaskDataException(path + ": no such file");
    } catch (IOException e) {
      throw new TaskDataException(path + ": cannot be read (" + e.getMessage() + ")");
    }
  }

  byte[] bytes() {
    return bytes;
  }

  /** File name as it stands in messages. */
  String name() {
    return path.toString();
  }

  boolean startsWith(int... head) {
    if (bytes.length < head.length) {
      return false;
    }
    for (int i = 0; i < head.length; i++) {
      if ((bytes[i] & 0xFF) != head[i]) {
        return false;
      }
    }
    return true;
  }

  DataDigest digest(String role, int rows) {
    try {
      final byte[] hash = MessageDigest.getInstance("SHA-256").digest(bytes);
      return new DataDigest(
          role, path.getFileName().toString(), HexFormat.of().formatHex(hash), rows);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }
}
