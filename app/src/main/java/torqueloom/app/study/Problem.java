package torqueloom.app.study;

/**
 * One fault of a study: where it stands, what was found and what would be right.
 *
 * @param file the file as the user named it
 * @param line line from 1, or 0 when the fault concerns the whole file
 * @param column column from 1, or 0
 * @param field dotted name of the field, empty when the fault concerns the whole file
 * @param text what was found and what is allowed
 */
public record Problem(String file, int line, int column, String field, String text) {
  /** A fault of a whole file. */
  public static Problem ofFile(String file, String text) {
    return new Problem(file, 0, 0, "", text);
  }

  /** The fault as two lines of text, place and field first. */
  public String format() {
    final StringBuilder place = new StringBuilder(file);
    if (line > 0) {
      place.append(':').append(line).append(':').append(column);
    }
    if (!field.isEmpty()) {
      place.append("  ").append(field);
    }
    return place + "\n    " + text.replace("\n", "\n    ");
  }
}
