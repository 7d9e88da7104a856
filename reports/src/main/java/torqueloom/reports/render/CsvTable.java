package torqueloom.reports.render;

import java.util.List;
import torqueloom.reports.document.Cell;
import torqueloom.reports.document.Table;

/**
 * Writes a table as CSV: comma, LF, UTF-8, quotes doubled (RFC 4180 but for the line end). Numbers are
 * the full ones behind the cells, in SI units named in the heading; a text that a spreadsheet would
 * run as a formula gets a leading apostrophe.
 */
public final class CsvTable {
  private static final String FORMULA_STARTS = "=+-@\t\r";

  private CsvTable() {}

  /** The whole file. */
  public static String of(Table table) {
    final StringBuilder out = new StringBuilder();
    line(
        table.columns().stream()
            .map(c -> text(c.unit().isEmpty() ? c.heading() : c.heading() + " (" + c.unit() + ")"))
            .toList(),
        out);
    for (final List<Cell> row : table.rows()) {
      line(row.stream().map(CsvTable::field).toList(), out);
    }
    return out.toString();
  }

  private static void line(List<String> fields, StringBuilder out) {
    out.append(String.join(",", fields)).append('\n');
  }

  private static String field(Cell cell) {
    final Number value = cell.value();
    if (value == null) {
      return text(cell.text().plain());
    }
    return Double.isFinite(value.doubleValue()) ? value.toString() : "";
  }

  private static String text(String raw) {
    final boolean formula = !raw.isEmpty() && FORMULA_STARTS.indexOf(raw.charAt(0)) >= 0;
    final String safe = formula ? "'" + raw : raw;
    final boolean quote = safe.chars().anyMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r');
    return quote ? '"' + safe.replace("\"", "\"\"") + '"' : safe;
  }
}
