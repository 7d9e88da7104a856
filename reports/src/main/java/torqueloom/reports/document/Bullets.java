package torqueloom.reports.document;

import java.util.List;

/**
 * A list of points.
 *
 * @param items in order
 */
public record Bullets(List<Text> items) implements Block {
  /** Copies the list. */
  public Bullets {
    items = List.copyOf(items);
  }

  /** Points in the program's own words, see {@link Text#withSymbols}. */
  public static Bullets of(List<String> items) {
    return new Bullets(items.stream().map(Text::withSymbols).toList());
  }
}
