package torqueloom.model.table;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

/** Reads input files as a whole, with messages for people. */
final class InputFiles {
  private static final long LARGEST = 1L << 30;

  private InputFiles() {}

  /** The file's own name, as messages show it. */
  static String name(Path path) {
    final Path name = path.getFileName();
    return name == null ? path.toString() : name.toString();
  }

  /**
   * The content of a file.
   *
   * @throws FileContentException if it is missing, a folder, or larger than 1 GiB
   * @throws IOException if it cannot be read
   */
  static byte[] bytes(Path path) throws IOException {
    try {
      if (Files.isDirectory(path)) {
        throw new FileContentException(path.toString(), 0, "a folder", "a file is needed");
      }
      if (Files.size(path) > LARGEST) {
        throw new FileContentException(
            name(path), 0, Files.size(path) + " bytes", "at most 1 GiB can be read");
      }
      return Files.readAllBytes(path);
    } catch (final NoSuchFileException e) {
      throw new FileContentException(path.toString(), 0, "no such file", "a file is needed");
    }
  }
}
