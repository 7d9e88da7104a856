package torqueloom.reports.document;

import java.util.List;

/**
 * A table.
 *
 * @param id fixed short name, also the name of its CSV file
 * @param caption what it shows
 * @param columns headings; the first column names its row
 * @param rows cells, as many a row as there are columns
 */
public record Table(String id, String caption, List<Column> columns, List<List<Cell>> rows)
    implements Block {
  /** @throws IllegalArgumentException if the id is no plain name or a row has another length */
  public Table {
    Ids.check(id);
    columns = List.copyOf(columns);
    rows = rows.stream().map(List::copyOf).toList();
    for (final List<Cell> row : rows) {
      if (row.size() != columns.size()) {
        throw new IllegalArgumentException(
            "table " + id + " has " + columns.size() + " columns, got a row of " + row.size());
      }
    }
  }

  /**
   * One column.
   *
   * @param heading as shown
   * @param unit SI unit of the numbers behind the cells, for machine-readable tables; may be empty
   * @param numeric whether cells are aligned as numbers
   * @param shown whether people see it; a column that is not shown stands in machine-readable tables
   *     only
   */
  public record Column(String heading, String unit, boolean numeric, boolean shown) {
    /** A column of text. */
    public static Column text(String heading) {
      return new Column(heading, "", false, true);
    }

    /** A column of numbers. */
    public static Column number(String heading, String unit) {
      return new Column(heading, unit, true, true);
    }

    /** A column of text for machine-readable tables only. */
    public static Column hidden(String heading) {
      return new Column(heading, "", false, false);
    }
  }
}
