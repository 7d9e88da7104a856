package torqueloom.training.data;

/**
 * Which bytes a task was read from.
 *
 * @param role what the file is in the study: data, features, labels, train or test
 * @param fileName name without its folder, so that a moved study keeps its digest
 * @param sha256 SHA-256 of the file's bytes, 64 hexadecimal digits
 * @param rows rows read from it
 */
public record DataDigest(String role, String fileName, String sha256, int rows) {}
