package torqueloom.model.table;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;

/**
 * A CSV file in memory: every row has as many cells as the header.
 *
 * <p>Rows and columns count from 0, lines in messages from 1.
 */
public final class CsvTable {
  private static final Pattern NUMBER =
      Pattern.compile("[+-]?(?:[0-9]+\\.?[0-9]*|\\.[0-9]+)(?:[eE][+-]?[0-9]+)?");

  private final String file;
  private final List<String> header;
  private final List<List<String>> rows;
  private final long[] lines;

  CsvTable(String file, List<String> header, List<List<String>> rows, long[] lines) {
    this.file = file;
    this.header = List.copyOf(header);
    this.rows = List.copyOf(rows);
    this.lines = lines.clone();
  }

  /** Name of the file as messages show it. */
  public String file() {
    return file;
  }

  /** The names of the columns, without blanks at their ends. */
  public List<String> header() {
    return header;
  }

  /** The number of rows below the header. */
  public int size() {
    return rows.size();
  }

  /** The cells of a row as they stand in the file. */
  public List<String> row(int row) {
    return rows.get(row);
  }

  /** The line of the file in which a row starts. */
  public long line(int row) {
    return lines[row];
  }

  /**
   * The place of a named column.
   *
   * @throws FileContentException if there is none, naming the columns there are
   */
  public int column(String name) throws FileContentException {
    final int column = header.indexOf(name);
    if (column < 0) {
      throw new FileContentException(
          file, 1, "columns " + String.join(", ", header), "a column \"" + name + "\" is needed");
    }
    return column;
  }

  /** The cells of a column as they stand in the file. */
  public List<String> texts(int column) {
    final List<String> texts = new ArrayList<>(rows.size());
    rows.forEach(row -> texts.add(row.get(column)));
    return texts;
  }

  /**
   * A column of numbers.
   *
   * @throws FileContentException naming the first cell that is no finite decimal number
   */
  public double[] numbers(int column) throws FileContentException {
    final double[] numbers = new double[rows.size()];
    for (int row = 0; row < numbers.length; row++) {
      numbers[row] = number(row, column);
    }
    return numbers;
  }

  /**
   * One number.
   *
   * @throws FileContentException if the cell is no finite decimal number
   */
  public double number(int row, int column) throws FileContentException {
    final String cell = rows.get(row).get(column).strip();
    final double value = NUMBER.matcher(cell).matches() ? Double.parseDouble(cell) : Double.NaN;
    if (!Double.isFinite(value)) {
      throw new FileContentException(
          file,
          lines[row],
          (cell.isEmpty() ? "an empty cell" : "\"" + cell + "\"") + " in column " + name(column),
          "a finite number is needed");
    }
    return value;
  }

  private String name(int column) {
    final String name = header.get(column);
    return name.isEmpty() ? String.valueOf(column + 1) : name;
  }
}
