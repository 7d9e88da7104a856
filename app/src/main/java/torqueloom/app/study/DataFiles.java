package torqueloom.app.study;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.security.DigestInputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** The data files of a study: where they stand, whether they can be read, and their digests. */
final class DataFiles {
  /** Keys that name data files. */
  static final List<String> KEYS =
      List.of("task.data", "task.data.features", "task.data.labels", "task.train", "task.test");

  private DataFiles() {}

  /**
   * Finds and reads the data files once.
   *
   * @param values the study's values
   * @param folder the study's folder
   * @param faults where missing and unreadable files are noted
   * @return SHA-256 by key
   */
  static Map<String, String> digests(Values values, Path folder, Faults faults) {
    final Map<String, String> digests = new TreeMap<>();
    for (final String key : KEYS) {
      values
          .findText(key)
          .ifPresent(
              text -> {
                try {
                  digests.put(key, sha256(checked(resolve(folder, text))));
                } catch (IOException | InvalidPathException e) {
                  final String reason = e.getMessage();
                  faults.add(
                      values.placeOf(key),
                      key,
                      "found "
                          + ScalarReader.quote(text)
                          + "; "
                          + reason
                          + "; a file that can be read is needed, relative to "
                          + shown(folder));
                }
              });
    }
    return digests;
  }

  /** A path of the study: relative to the study's folder unless absolute. */
  static Path resolve(Path folder, String text) {
    return folder.resolve(text).normalize();
  }

  private static Path checked(Path path) throws IOException {
    if (!Files.exists(path)) {
      throw new IOException("no such file");
    }
    if (!Files.isRegularFile(path)) {
      throw new IOException("not a file");
    }
    if (!Files.isReadable(path)) {
      throw new IOException("permission denied");
    }
    return path;
  }

  private static String shown(Path folder) {
    return folder.toString().isEmpty() ? "this folder" : folder.toString();
  }

  private static String sha256(Path path) throws IOException {
    final MessageDigest digest = newSha256();
    try (InputStream in = new DigestInputStream(Files.newInputStream(path), digest)) {
      in.transferTo(java.io.OutputStream.nullOutputStream());
    }
    return HexFormat.of().formatHex(digest.digest());
  }

  static MessageDigest newSha256() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }
}
