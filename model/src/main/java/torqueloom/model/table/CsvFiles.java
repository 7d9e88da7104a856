package torqueloom.model.table;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.writer.CsvWriter;
import de.siegmar.fastcsv.writer.LineDelimiter;
import java.io.IOException;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.Iterator;
import java.util.List;
import java.util.Set;
import torqueloom.model.work.AtomicFiles;

/**
 * Comma-separated files with a header line, quoted as RFC 4180 says, in UTF-8 with or without byte
 * order mark. Empty lines are skipped.
 */
public final class CsvFiles {
  private CsvFiles() {}

  /**
   * Reads a file.
   *
   * @throws FileContentException if it is empty, not UTF-8, has a ragged row, a column name twice
   *     or a quote that is not closed
   * @throws IOException if it cannot be read
   */
  public static CsvTable read(Path path) throws IOException {
    final String name = InputFiles.name(path);
    return parse(Utf8.decode(InputFiles.bytes(path), name), name);
  }

  /**
   * Reads a text.
   *
   * @param file what messages call it
   * @throws FileContentException as {@link #read}
   */
  public static CsvTable parse(String text, String file) throws FileContentException {
    try {
      final Iterator<CsvRecord> records =
          CsvReader.builder().acceptCharsAfterQuotes(false).ofCsvRecord(text).iterator();
      if (!records.hasNext()) {
        throw new FileContentException(
            file, 0, "no content", "a header line and rows of comma-separated values are needed");
      }
      final List<String> header = header(records.next(), file);
      return rows(records, header, file, text);
    } catch (final CsvParseException e) {
      throw new FileContentException(
          file, 0, "an error in the quoting (" + rootMessage(e) + ")", "valid CSV is needed");
    }
  }

  private static List<String> header(CsvRecord first, String file) throws FileContentException {
    final List<String> header = first.getFields().stream().map(String::strip).toList();
    final Set<String> seen = new HashSet<>();
    for (final String name : header) {
      if (!seen.add(name)) {
        throw new FileContentException(
            file, 1, "the column name \"" + name + "\" twice", "each column needs its own name");
      }
    }
    if (header.size() == 1 && header.get(0).matches(".*[;\t].*")) {
      throw new FileContentException(
          file, 1, "columns parted by a semicolon or tab", "commas are needed");
    }
    return header;
  }

  private static CsvTable rows(
      Iterator<CsvRecord> records, List<String> header, String file, String text)
      throws FileContentException {
    final List<List<String>> rows = new ArrayList<>();
    final List<Long> lines = new ArrayList<>();
    while (records.hasNext()) {
      final CsvRecord record = records.next();
      if (record.getFieldCount() != header.size()) {
        throw new FileContentException(
            file,
            record.getStartingLineNumber(),
            record.getFieldCount() + " cells",
            header.size() + " cells are needed, as in the header");
      }
      rows.add(List.copyOf(record.getFields()));
      lines.add(record.getStartingLineNumber());
    }
    refuseOpenQuote(text, file);
    return new CsvTable(file, header, rows, lines.stream().mapToLong(Long::longValue).toArray());
  }

  /** With every quote closed their number is even, since a quote inside a cell is doubled. */
  private static void refuseOpenQuote(String text, String file) throws FileContentException {
    if (text.chars().filter(c -> c == '"').count() % 2 != 0) {
      throw new FileContentException(
          file, 0, "a quote that is never closed", "quotes are needed in pairs");
    }
  }

  /**
   * Writes a file, whole or not at all; see {@link #text}.
   *
   * @throws IOException if it cannot be written
   */
  public static void write(Path path, List<String> header, Iterable<? extends List<?>> rows)
      throws IOException {
    AtomicFiles.write(path, text(header, rows).getBytes(StandardCharsets.UTF_8));
  }

  /**
   * The text of a file with LF line ends. Numbers stand as in {@link CanonicalJson#number}, what is
   * not known (NaN, infinity, null) as an empty cell. A text that a spreadsheet would take for a
   * formula gets an apostrophe before it.
   *
   * @throws IllegalArgumentException if a row has not as many cells as the header
   */
  public static String text(List<String> header, Iterable<? extends List<?>> rows) {
    final StringWriter out = new StringWriter();
    try (CsvWriter writer = CsvWriter.builder().lineDelimiter(LineDelimiter.LF).build(out)) {
      writer.writeRecord(header.stream().map(CsvFiles::cell).toList());
      for (final List<?> row : rows) {
        if (row.size() != header.size()) {
          throw new IllegalArgumentException(
              "a row of " + row.size() + " cells under a header of " + header.size());
        }
        writer.writeRecord(row.stream().map(CsvFiles::cell).toList());
      }
    } catch (final IOException e) {
      throw new IllegalStateException("writing to memory failed", e);
    }
    return out.toString();
  }

  private static String cell(Object value) {
    if (value == null) {
      return "";
    }
    if (value instanceof Number || value instanceof Boolean) {
      final String number = CanonicalJson.line(value);
      return number.equals("null") ? "" : number;
    }
    final String text = value.toString();
    return !text.isEmpty() && "=+-@\t\r".indexOf(text.charAt(0)) >= 0 ? "'" + text : text;
  }

  private static String rootMessage(Throwable e) {
    Throwable root = e;
    while (root.getCause() != null) {
      root = root.getCause();
    }
    return root.getMessage();
  }
}
