package torqueloom.training.study;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Map;
import java.util.TreeMap;
import torqueloom.model.table.CanonicalJson;

/** Digest of what a stage depends on: SHA-256 of its inputs as sorted JSON. */
final class StageDigest {
  private StageDigest() {}

  /**
   * @param stage name and version of the stage's algorithm, e.g. {@code chips/1}
   * @param inputs plain values and records by name
   * @return 64 hexadecimal digits
   */
  static String of(String stage, Map<String, ?> inputs) {
    final Map<String, Object> all = new TreeMap<>(inputs);
    all.put("stage", stage);
    try {
      final byte[] hash =
          MessageDigest.getInstance("SHA-256")
              .digest(CanonicalJson.sortedLine(all).getBytes(StandardCharsets.UTF_8));
      return HexFormat.of().formatHex(hash);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }
}
