package torqueloom.training.data;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.Iterator;
import java.util.List;
import java.util.Set;

/**
 * Reads a CSV file with a header line (RFC 4180: commas, double quotes; UTF-8 with or without a
 * byte-order mark; blank lines skipped). One column, found by its name, holds the label; every
 * other column is a feature and must hold a finite decimal number that fits a float.
 */
final class CsvTaskReader {
  /** Column names shown when the label column is not among them. */
  private static final int NAMES_SHOWN = 20;

  private static final String NUMBER_NEEDED = "a finite decimal number is needed, e.g. 0.35";

  private final String file;
  private final TaskDataException.Collector faults = new TaskDataException.Collector();
  private List<String> header;
  private int labelColumn;
  private float[] features = new float[1024];
  private int used;
  private final List<String> labels = new ArrayList<>();

  private CsvTaskReader(String file) {
    this.file = file;
  }

  /**
   * @param label name of the label column
   * @throws TaskDataException naming the first faults, each with line, column and content
   */
  static TaskTable read(DataFile data, String label) {
    return new CsvTaskReader(data.name()).read(decode(data), label);
  }

  private static String decode(DataFile data) {
    final int skip = data.startsWith(0xEF, 0xBB, 0xBF) ? 3 : 0;
    final ByteBuffer bytes = ByteBuffer.wrap(data.bytes(), skip, data.bytes().length - skip);
    try {
      return StandardCharsets.UTF_8.newDecoder().decode(bytes).toString();
    } catch (CharacterCodingException e) {
      final int line = lineOf(data.bytes(), bytes.position());
      throw new TaskDataException(
          TaskDataException.fault(
              data.name() + ":" + line, "", "bytes that are not UTF-8", "save the file as UTF-8"));
    }
  }

  private static int lineOf(byte[] bytes, int position) {
    int line = 1;
    for (int i = 0; i < position; i++) {
      if (bytes[i] == '\n') {
        line++;
      }
    }
    return line;
  }

  private TaskTable read(String text, String label) {
    try (CsvReader<CsvRecord> csv =
        CsvReader.builder().skipEmptyLines(true).ofCsvRecord(new StringReader(text))) {
      final Iterator<CsvRecord> records = csv.iterator();
      if (!records.hasNext()) {
        throw new TaskDataException(file + ": the file holds no line");
      }
      readHeader(records.next(), label);
      while (records.hasNext()) {
        readRow(records.next());
      }
    } catch (CsvParseException e) {
      throw new TaskDataException(file + ": is not a CSV file (" + e.getMessage() + ")");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    faults.throwIfAny(file);
    return table();
  }

  private void readHeader(CsvRecord row, String label) {
    header = row.getFields().stream().map(String::strip).toList();
    final String place = file + ":" + row.getStartingLineNumber();
    final Set<String> seen = new HashSet<>();
    for (int i = 0; i < header.size(); i++) {
      final String name = header.get(i);
      if (name.isEmpty()) {
        faults.add(
            place, "column " + (i + 1), "no name", "every column needs a name in the header");
      } else if (!seen.add(name)) {
        faults.add(place, name, "this column name twice", "column names must differ");
      }
    }
    labelColumn = header.indexOf(label);
    if (labelColumn < 0) {
      faults.add(place, label, "no column of this name", "the columns are " + shownNames());
    } else if (header.size() == 1) {
      faults.add(place, label, "only the label column", "at least one feature column is needed");
    }
    faults.throwIfAny(file);
  }

  private String shownNames() {
    final String shown = String.join(", ", header.subList(0, Math.min(NAMES_SHOWN, header.size())));
    final int hidden = header.size() - NAMES_SHOWN;
    return hidden <= 0 ? shown : shown + " and " + hidden + " more";
  }

  private void readRow(CsvRecord row) {
    final String place = file + ":" + row.getStartingLineNumber();
    if (row.getFieldCount() != header.size()) {
      faults.add(
          place,
          "",
          row.getFieldCount() + " values",
          "the header has " + header.size() + " columns, so every row needs as many values");
      return;
    }
    for (int i = 0; i < header.size(); i++) {
      final String text = row.getField(i).strip();
      if (i == labelColumn) {
        readLabel(place, text);
      } else {
        append(number(place, header.get(i), text));
      }
    }
  }

  private void readLabel(String place, String text) {
    if (text.isEmpty()) {
      faults.add(place, header.get(labelColumn), "no value", "every row needs its class");
    }
    labels.add(text);
  }

  private float number(String place, String column, String text) {
    if (text.isEmpty()) {
      faults.add(place, column, "no value", NUMBER_NEEDED + "; rows with gaps must be left out");
      return 0;
    }
    final double value = decimalOrNaN(text);
    if (Double.isNaN(value)) {
      faults.add(place, column, quoted(text), NUMBER_NEEDED);
      return 0;
    }
    if (Double.isInfinite((float) value)) {
      faults.add(place, column, quoted(text), "numbers up to 3.4e38 are allowed");
      return 0;
    }
    return (float) value;
  }

  private static String quoted(String text) {
    return '"' + (text.length() > 40 ? text.substring(0, 40) + "..." : text) + '"';
  }

  /** Decimal notation only: Java would also read "1d", hexadecimal numbers, "NaN", "Infinity". */
  private static double decimalOrNaN(String text) {
    for (int i = 0; i < text.length(); i++) {
      final char c = text.charAt(i);
      if ((c < '0' || c > '9') && "+-.eE".indexOf(c) < 0) {
        return Double.NaN;
      }
    }
    try {
      return Double.parseDouble(text);
    } catch (NumberFormatException e) {
      return Double.NaN;
    }
  }

  private void append(float value) {
    if (used == features.length) {
      features = Arrays.copyOf(features, (int) Math.min(2L * used, Integer.MAX_VALUE - 16));
    }
    features[used++] = value;
  }

  private TaskTable table() {
    if (labels.isEmpty()) {
      throw new TaskDataException(file + ": has a header but no row");
    }
    final List<String> names = new ArrayList<>(header);
    names.remove(labelColumn);
    final ClassNames classes = ClassNames.of(labels);
    return TaskTable.owning(
        Arrays.copyOf(features, used), classes.indices(labels), names, classes.names());
  }
}
