package torqueloom.training.data;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

/**
 * Splits the rows of each class by fixed shares. Each row draws one number, keyed by its class and
 * its place within the class; the rows with the smallest numbers go to the first part. So the parts
 * keep the classes' proportions to within one row, and rows appended to a file move only a few of
 * the others. Within a part rows keep the order of the file.
 */
final class StratifiedSplit {
  private StratifiedSplit() {}

  /**
   * Row indices of each part.
   *
   * @param table rows to split
   * @param shares share of each part (1), adding up to 1
   * @param names name of each part, for messages
   * @param seed study seed
   * @throws TaskDataException if a class has too few rows to give each part one
   */
  static int[][] rows(TaskTable table, double[] shares, String[] names, long seed) {
    final List<List<Integer>> parts = new ArrayList<>();
    for (int part = 0; part < shares.length; part++) {
      parts.add(new ArrayList<>());
    }
    final int[][] rowsOfClass = rowsOfClass(table);
    final List<String> faults = new ArrayList<>();
    for (int c = 0; c < rowsOfClass.length; c++) {
      final int[] ends = ends(rowsOfClass[c].length, shares);
      final String fault = faultOrNull(table.classNames().get(c), ends, shares, names);
      if (fault != null) {
        faults.add(fault);
      }
      final int[] order = shuffled(rowsOfClass[c], Streams.key(seed, Purpose.DATA_SPLIT, c));
      for (int part = 0, i = 0; part < shares.length; part++) {
        for (; i < ends[part]; i++) {
          parts.get(part).add(order[i]);
        }
      }
    }
    if (!faults.isEmpty()) {
      throw new TaskDataException(faults);
    }
    return parts.stream()
        .map(part -> part.stream().mapToInt(Integer::intValue).sorted().toArray())
        .toArray(int[][]::new);
  }

  private static int[][] rowsOfClass(TaskTable table) {
    final int[] counts = table.classCounts();
    final int[][] rows = new int[counts.length][];
    Arrays.setAll(rows, c -> new int[counts[c]]);
    final int[] used = new int[counts.length];
    for (int row = 0; row < table.rows(); row++) {
      final int c = table.label(row);
      rows[c][used[c]++] = row;
    }
    return rows;
  }

  private static int[] ends(int count, double[] shares) {
    final int[] ends = new int[shares.length];
    double sum = 0;
    for (int part = 0; part < shares.length; part++) {
      sum += shares[part];
      ends[part] =
          part == shares.length - 1 ? count : (int) Math.min(count, Math.rint(count * sum));
    }
    return ends;
  }

  private static String faultOrNull(String name, int[] ends, double[] shares, String[] names) {
    for (int part = 0; part < ends.length; part++) {
      if (ends[part] == (part == 0 ? 0 : ends[part - 1])) {
        return String.format(
            java.util.Locale.ROOT,
            "class \"%s\": found %d row%s, of which a share of %.4g %% leaves none for %s;"
                + " every class needs at least one row in each part",
            name,
            ends[ends.length - 1],
            ends[ends.length - 1] == 1 ? "" : "s",
            100 * shares[part],
            names[part]);
      }
    }
    return null;
  }

  private static int[] shuffled(int[] rows, long key) {
    final Integer[] places = new Integer[rows.length];
    Arrays.setAll(places, i -> i);
    final long[] draws = new long[rows.length];
    Arrays.setAll(draws, i -> Streams.bits(key, i));
    Arrays.sort(places, Comparator.comparingLong((Integer i) -> draws[i]).thenComparing(i -> i));
    return Arrays.stream(places).mapToInt(i -> rows[i]).toArray();
  }
}
