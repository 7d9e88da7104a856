package torqueloom.app.study;

import java.nio.charset.StandardCharsets;
import java.util.HexFormat;
import java.util.Map;
import java.util.TreeMap;
import torqueloom.model.table.CanonicalJson;

/**
 * Digest of an effective study: SHA-256 of its values with defaults and overrides filled in, SI, keys
 * sorted, a data file standing with the SHA-256 of its bytes instead of its path. Spelling, order,
 * comments and names of data files do not change it; a value or a data byte does.
 */
final class StudyDigest {
  private StudyDigest() {}

  /**
   * @param values all values of the study
   * @param data SHA-256 of each data file by key
   * @return 64 lower-case hex digits
   */
  static String of(Values values, Map<String, String> data) {
    final Map<String, Object> effective = new TreeMap<>(values.all());
    effective.putAll(data);
    final String text = CanonicalJson.sortedLine(nested(effective));
    return HexFormat.of()
        .formatHex(DataFiles.newSha256().digest(text.getBytes(StandardCharsets.UTF_8)));
  }

  /** Dotted keys as nested objects. */
  @SuppressWarnings("unchecked")
  static Map<String, Object> nested(Map<String, Object> flat) {
    final Map<String, Object> root = new TreeMap<>();
    for (final Map.Entry<String, Object> entry : flat.entrySet()) {
      Map<String, Object> at = root;
      final String[] parts = entry.getKey().split("\\.");
      for (int i = 0; i < parts.length - 1; i++) {
        at = (Map<String, Object>) at.computeIfAbsent(parts[i], k -> new TreeMap<>());
      }
      at.put(parts[parts.length - 1], entry.getValue());
    }
    return root;
  }
}
