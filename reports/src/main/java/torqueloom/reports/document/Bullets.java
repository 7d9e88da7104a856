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

  /** Points of plain text. */
  public static Bullets of(List<String> items) {
    return new Bullets(items.stream().map(Text::of).toList());
  }
}
