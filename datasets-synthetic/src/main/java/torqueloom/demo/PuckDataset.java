package torqueloom.demo;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.Arrays;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

/**
 * The demo's task data: {@value #ROWS} labeled records of a machine with two bearings, as CSV with
 * a header and the label column {@value #LABEL}. Row and value depend on the seed and the row
 * number only.
 */
public final class PuckDataset {
  /** Seed of the file that stands in the demo folder. */
  public static final long SEED = 20261;

  /** Number of rows. */
  public static final int ROWS = 10500;

  /** Name of the label column. */
  public static final String LABEL = "state";

  /** Four digits are finer than any input level and keep the file below 2 MB. */
  private static final MathContext DIGITS = new MathContext(4);

  private PuckDataset() {}

  /**
   * Writes the data set of {@link #SEED}.
   *
   * @param file written beside its name, forced and moved into place
   * @throws IOException if it cannot be written; a former file then stays as it was
   */
  public static void write(Path file) throws IOException {
    final Path part = file.resolveSibling(file.getFileName() + ".part");
    final ByteBuffer text = ByteBuffer.wrap(csv(SEED).getBytes(StandardCharsets.UTF_8));
    try {
      try (FileChannel channel =
          FileChannel.open(part, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
        while (text.hasRemaining()) {
          channel.write(text);
        }
        channel.force(true);
      }
      Files.move(part, file, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } finally {
      Files.deleteIfExists(part);
    }
  }

  /**
   * Regenerates the data file.
   *
   * @param arguments the file to write
   * @throws IOException if it cannot be written
   */
  public static void main(String[] arguments) throws IOException {
    if (arguments.length != 1) {
      throw new IllegalArgumentException("usage: PuckDataset FILE");
    }
    write(Path.of(arguments[0]));
  }

  /** Text of the data set of a seed; lines end with a line feed. */
  static String csv(long seed) {
    return csv(seed, ROWS);
  }

  /**
   * Text of the first rows of a seed's data set, header included; the states are mixed throughout.
   *
   * @param seed of the whole set
   * @param rows number of rows, 1 to {@value #ROWS}
   * @throws IllegalArgumentException if rows is out of range
   */
  public static String csv(long seed, int rows) {
    if (rows < 1 || rows > ROWS) {
      throw new IllegalArgumentException("rows must be from 1 to " + ROWS + ", got " + rows);
    }
    final MachineState[] states = states(seed);
    return IntStream.range(0, rows)
        .parallel()
        .mapToObj(row -> line(seed, row, states[row]))
        .collect(Collectors.joining("\n", header() + "\n", "\n"));
  }

  private static String header() {
    return String.join(",", PuckFeatures.NAMES) + "," + LABEL;
  }

  private static MachineState[] states(long seed) {
    final int[] order = Streams.permutation(Streams.key(seed, Purpose.TASK_DATA), ROWS);
    final MachineState[] states = new MachineState[ROWS];
    int next = 0;
    for (final MachineState state : MachineState.values()) {
      for (int i = 0; i < state.rows(); i++) {
        states[order[next++]] = state;
      }
    }
    return states;
  }

  private static String line(long seed, int row, MachineState state) {
    final double[] values = PuckFeatures.of(BearingGeometry.DEEP_GROOVE_6205, seed, row, state);
    return Arrays.stream(values).mapToObj(PuckDataset::digits).collect(Collectors.joining(","))
        + ","
        + state.label();
  }

  private static String digits(double value) {
    final BigDecimal rounded = new BigDecimal(value).round(DIGITS);
    // Cosines near zero would otherwise carry digits nobody measures.
    final BigDecimal kept =
        rounded.scale() > 4 ? rounded.setScale(4, RoundingMode.HALF_EVEN) : rounded;
    return kept.signum() == 0 ? "0" : kept.stripTrailingZeros().toPlainString();
  }
}
