package torqueloom.reports.document;

import java.util.List;

/**
 * Terms with their values.
 *
 * @param entries in order
 */
public record Definitions(List<Entry> entries) implements Block {
  /** Copies the list. */
  public Definitions {
    entries = List.copyOf(entries);
  }

  /**
   * One term.
   *
   * @param term the name
   * @param value what belongs to it
   */
  public record Entry(Text term, Text value) {
    /** A pair of plain texts. */
    public static Entry of(String term, String value) {
      return new Entry(Text.of(term), Text.of(value));
    }
  }
}
