package torqueloom.reports.document;

import java.util.regex.Pattern;

/** Names of sections, tables and figures. */
final class Ids {
  private static final Pattern NAME = Pattern.compile("[a-z][a-z0-9-]*");

  private Ids() {}

  static void check(String id) {
    if (!NAME.matcher(id).matches()) {
      throw new IllegalArgumentException(
          "an id holds lower-case letters, digits and hyphens, got " + id);
    }
  }
}
