package torqueloom.reports.document;

import java.util.List;

/**
 * A section; sections inside it are one level lower.
 *
 * @param id fixed short name, lower case with hyphens; unique in the document
 * @param title heading
 * @param blocks contents
 */
public record Section(String id, String title, List<Block> blocks) implements Block {
  /** @throws IllegalArgumentException if the id is not a plain name */
  public Section {
    Ids.check(id);
    blocks = List.copyOf(blocks);
  }
}
