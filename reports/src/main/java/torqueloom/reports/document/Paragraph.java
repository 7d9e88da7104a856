package torqueloom.reports.document;

import java.util.Objects;

/**
 * A paragraph.
 *
 * @param text what it says
 */
public record Paragraph(Text text) implements Block {
  /** Refuses null. */
  public Paragraph {
    Objects.requireNonNull(text, "text");
  }

  /** A paragraph in the program's own words, see {@link Text#withSymbols}. */
  public static Paragraph of(String text) {
    return new Paragraph(Text.withSymbols(text));
  }
}
