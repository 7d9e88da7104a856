package torqueloom.reports.document;

import java.util.ArrayList;
import java.util.List;

/**
 * A whole report.
 *
 * @param title main heading
 * @param subtitle one line below it
 * @param lead what stands before the first section: the answer
 * @param sections in order
 * @param footer last line
 */
public record Document(
    String title, String subtitle, List<Block> lead, List<Section> sections, String footer) {
  /** Copies the lists. */
  public Document {
    lead = List.copyOf(lead);
    sections = List.copyOf(sections);
  }

  /** All tables in reading order. */
  public List<Table> tables() {
    final List<Table> found = new ArrayList<>();
    lead.forEach(block -> collect(block, found));
    sections.forEach(block -> collect(block, found));
    return found;
  }

  private static void collect(Block block, List<Table> found) {
    if (block instanceof Table table) {
      found.add(table);
    } else if (block instanceof Section section) {
      section.blocks().forEach(inner -> collect(inner, found));
    } else if (block instanceof Callout callout) {
      callout.blocks().forEach(inner -> collect(inner, found));
    }
  }
}
