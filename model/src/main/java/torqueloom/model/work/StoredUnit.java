package torqueloom.model.work;

import java.util.Objects;

/**
 * A result as it stands in the store.
 *
 * @param stage name of the stage
 * @param digest digest of all that the result depends on
 * @param key key of the unit
 * @param payload the encoded result, any text
 */
public record StoredUnit(String stage, String digest, String key, String payload) {

  /**
   * @throws NullPointerException if a part is null
   */
  public StoredUnit {
    Objects.requireNonNull(stage, "stage");
    Objects.requireNonNull(digest, "digest");
    Objects.requireNonNull(key, "key");
    Objects.requireNonNull(payload, "payload");
  }
}
