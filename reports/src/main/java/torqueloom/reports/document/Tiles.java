package torqueloom.reports.document;

import java.util.List;

/**
 * A few key numbers set large, side by side where the page is wide enough.
 *
 * @param tiles in order
 */
public record Tiles(List<Tile> tiles) implements Block {
  /** Copies the list. */
  public Tiles {
    tiles = List.copyOf(tiles);
  }

  /**
   * One key number.
   *
   * @param label what it is
   * @param value the number with its unit
   * @param detail its interval or what it is measured against; may be empty
   */
  public record Tile(String label, String value, String detail) {}
}
