package torqueloom.reports.document;

import java.util.Objects;

/**
 * A table's cell: what the reader sees, and the number behind it.
 *
 * @param text as shown
 * @param value a {@link Number} in SI units for machine-readable tables, or null when the text itself
 *     is the value
 */
public record Cell(Text text, Number value) {
  /** Refuses a missing text. */
  public Cell {
    Objects.requireNonNull(text, "text");
  }

  /** A cell of text. */
  public static Cell of(String text) {
    return new Cell(Text.of(text), null);
  }

  /** A cell of text with styles. */
  public static Cell of(Text text) {
    return new Cell(text, null);
  }

  /** A number with the words that show it. */
  public static Cell number(String shown, Number value) {
    return new Cell(Text.of(shown), value);
  }
}
