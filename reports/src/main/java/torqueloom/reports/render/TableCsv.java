package torqueloom.reports.render;

import java.util.List;
import torqueloom.model.table.CsvFiles;
import torqueloom.reports.document.Cell;
import torqueloom.reports.document.Table;

/**
 * Writes a table as CSV: the full numbers behind its cells, in the SI units that its headings name;
 * texts where there is no number. Numbers that are not known are empty.
 */
public final class TableCsv {
  private TableCsv() {}

  /** The whole file. */
  public static String of(Table table) {
    final List<String> header =
        table.columns().stream()
            .map(c -> c.unit().isEmpty() ? c.heading() : c.heading() + " (" + c.unit() + ")")
            .toList();
    return CsvFiles.text(
        header,
        table.rows().stream().map(row -> row.stream().map(TableCsv::value).toList()).toList());
  }

  private static Object value(Cell cell) {
    return cell.value() == null ? cell.text().plain() : cell.value();
  }
}
