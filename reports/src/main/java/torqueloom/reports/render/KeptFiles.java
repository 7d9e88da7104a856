package torqueloom.reports.render;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import torqueloom.model.work.AtomicFiles;

/** Files whose former content is kept once beside them when it changes. */
public final class KeptFiles {
  /** Ending of the former content's name. */
  public static final String PREVIOUS = ".previous";

  private KeptFiles() {}

  /**
   * Writes a file, whole or not at all. Where it holds something else already, that is first written
   * to {@code NAME.previous}; where it holds the same, nothing is touched.
   *
   * @param path the file; its folder must exist
   * @param text new content, written in UTF-8
   * @throws IOException if either file cannot be written; {@code path} is then as it was
   */
  public static void write(Path path, String text) throws IOException {
    final byte[] fresh = text.getBytes(StandardCharsets.UTF_8);
    if (Files.exists(path)) {
      final byte[] former = Files.readAllBytes(path);
      if (Arrays.equals(former, fresh)) {
        return;
      }
      AtomicFiles.write(path.resolveSibling(path.getFileName() + PREVIOUS), former);
    }
    AtomicFiles.write(path, fresh);
  }
}
