package torqueloom.model.response;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import torqueloom.model.table.FileContentException;
import torqueloom.model.table.JsonFields;

/**
 * Response curves as JSON values and back, to the last bit of every number: one object a curve with
 * the keys {@code instance}, {@code temperatureKelvin}, {@code pulseSeconds}, {@code driveUnit},
 * {@code restLevel}, {@code previousDrive} (null after a quiet slot), {@code drive}, {@code trials},
 * {@code countsFrom}, {@code counts}, {@code halfTurns} (an object a drive, half turns to trials),
 * {@code latencySeconds} and {@code jitterSeconds} (null where unknown).
 */
public final class ResponseJson {
  /** Version of the document. */
  public static final int SCHEMA = 1;

  private ResponseJson() {}

  /** The document {@code {"schema":1,"response":[...]}} of a library. */
  public static Map<String, Object> document(ResponseLibrary library) {
    final Map<String, Object> document = new LinkedHashMap<>();
    document.put("schema", SCHEMA);
    document.put("response", entries(library));
    return document;
  }

  static List<Object> entries(ResponseLibrary library) {
    final List<Object> entries = new ArrayList<>();
    library.curves().forEach(curve -> entries.add(entry(curve, library.driveUnit())));
    return entries;
  }

  /** One curve. */
  static Map<String, Object> entry(ResponseCurve curve, String driveUnit) {
    final Map<String, Object> entry = new LinkedHashMap<>();
    entry.put("instance", curve.instance());
    entry.put("temperatureKelvin", curve.temperatureKelvin());
    entry.put("pulseSeconds", curve.pulseSeconds());
    entry.put("driveUnit", driveUnit);
    entry.put("restLevel", curve.restLevel());
    entry.put("previousDrive", curve.previousDrive());
    entry.put("drive", curve.drive());
    entry.put("trials", curve.trials());
    entry.put("countsFrom", curve.countsFrom());
    entry.put("counts", curve.counts());
    entry.put("halfTurns", curve.halfTurns().stream().map(ResponseJson::named).toList());
    entry.put("latencySeconds", curve.latencySeconds());
    entry.put("jitterSeconds", curve.jitterSeconds());
    return entry;
  }

  private static Map<String, Object> named(SortedMap<Integer, Integer> halfTurns) {
    final Map<String, Object> named = new LinkedHashMap<>();
    halfTurns.forEach((turns, trials) -> named.put(turns.toString(), trials));
    return named;
  }

  /**
   * Reads one curve.
   *
   * @throws FileContentException if a field is missing, of another type or does not fit the others
   */
  static ResponseCurve curve(JsonFields entry) throws FileContentException {
    final double[] drive = entry.numbers("drive");
    final ResponseCurve curve =
        new ResponseCurve(
            entry.integer("instance"),
            entry.number("temperatureKelvin"),
            entry.number("pulseSeconds"),
            entry.integer("restLevel"),
            entry.number("previousDrive"),
            drive,
            entry.integers("trials"),
            entry.integer("countsFrom"),
            counts(entry),
            halfTurns(entry),
            entry.numbers("latencySeconds"),
            entry.numbers("jitterSeconds"));
    requireLength(entry, "trials", curve.trials().length, drive.length);
    requireLength(entry, "counts", curve.counts().length, drive.length);
    requireLength(entry, "halfTurns", curve.halfTurns().size(), drive.length);
    requireLength(entry, "latencySeconds", curve.latencySeconds().length, drive.length);
    requireLength(entry, "jitterSeconds", curve.jitterSeconds().length, drive.length);
    requireSums(entry, curve);
    return curve;
  }

  private static int[][] counts(JsonFields entry) throws FileContentException {
    final double[][] rows = entry.matrix("counts");
    final int[][] counts = new int[rows.length][];
    for (int d = 0; d < rows.length; d++) {
      counts[d] = new int[rows[d].length];
      for (int n = 0; n < rows[d].length; n++) {
        counts[d][n] = (int) rows[d][n];
        if (counts[d][n] != rows[d][n] || counts[d][n] < 0) {
          throw entry.wrong("counts", "an array of arrays of numbers of trials");
        }
      }
    }
    return counts;
  }

  private static List<SortedMap<Integer, Integer>> halfTurns(JsonFields entry)
      throws FileContentException {
    final List<SortedMap<Integer, Integer>> list = new ArrayList<>();
    for (final JsonFields drive : entry.objects("halfTurns")) {
      final SortedMap<Integer, Integer> turns = new TreeMap<>();
      for (final String name : drive.names()) {
        try {
          turns.put(Integer.valueOf(name), drive.integer(name));
        } catch (final NumberFormatException e) {
          throw drive.wrong(name, "a whole number of half turns as the name");
        }
      }
      list.add(turns);
    }
    return list;
  }

  private static void requireLength(JsonFields entry, String name, int length, int wanted)
      throws FileContentException {
    if (length != wanted) {
      throw entry.wrong(name, "one element a drive (" + wanted + ")");
    }
  }

  private static void requireSums(JsonFields entry, ResponseCurve curve)
      throws FileContentException {
    for (int d = 0; d < curve.trials().length; d++) {
      long sum = 0;
      for (final int trials : curve.counts()[d]) {
        sum += trials;
      }
      if (sum != curve.trials()[d] || sum == 0) {
        throw entry.wrong("trials", "the sum of the counts at each drive");
      }
    }
  }
}
