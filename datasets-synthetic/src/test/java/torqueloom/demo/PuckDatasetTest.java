package torqueloom.demo;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PuckDatasetTest {
  private static final Path FILE = Path.of("demo", "puck.csv");

  @TempDir Path folder;

  @Test
  void theFileOfTheDemoIsWhatTheSeedGives() throws IOException {
    final Path again = folder.resolve("again.csv");
    PuckDataset.write(again);
    assertEquals(-1, Files.mismatch(FILE, again), "first byte that differs from " + FILE);
    try (Stream<Path> files = Files.list(folder)) {
      assertEquals(List.of(again), files.toList());
    }
  }

  @Test
  void everyStateHasItsRowsAndTheFileStaysSmall() throws IOException {
    final List<String> lines = Files.readAllLines(FILE, StandardCharsets.US_ASCII);
    assertEquals(PuckDataset.ROWS + 1, lines.size());
    for (final MachineState state : MachineState.values()) {
      final long rows = lines.stream().filter(line -> line.endsWith("," + state.label())).count();
      assertEquals(state.rows(), rows, state.label());
    }
    assertTrue(Files.size(FILE) < 2_000_000, Files.size(FILE) + " bytes");
  }

  /**
   * Physics that the features must show: each bearing defect raises the line of its own order above
   * that of a healthy bearing by at least 6 dB in the median, and hardly any other defect's line.
   */
  @Test
  void eachDefectRaisesItsOwnLine() throws IOException {
    assertTrue(lift("line_outer", MachineState.OUTER_RACE) > 6);
    assertTrue(lift("line_inner", MachineState.INNER_RACE) > 6);
    assertTrue(lift("line_ball", MachineState.ROLLING_ELEMENT) > 6);
    assertTrue(lift("line_inner", MachineState.OUTER_RACE) < 2);
    assertTrue(lift("line_outer", MachineState.STATIC_UNBALANCE) < 2);
  }

  /** In phase means a positive product of the two bearings' directions, in opposite phase negative. */
  @Test
  void phasesTellStaticFromCoupleUnbalance() throws IOException {
    assertTrue(medianPhaseProduct(MachineState.STATIC_UNBALANCE) > 0.8);
    assertTrue(medianPhaseProduct(MachineState.COUPLE_UNBALANCE) < -0.8);
  }

  private static double lift(String feature, MachineState state) throws IOException {
    return median(column(feature, state)) - median(column(feature, MachineState.HEALTHY));
  }

  private static double medianPhaseProduct(MachineState state) throws IOException {
    final double[] product = new double[state.rows()];
    for (final String part : List.of("cos", "sin")) {
      final double[] first = column(part + "_1h", state);
      final double[] second = column(part + "_2h", state);
      for (int i = 0; i < product.length; i++) {
        product[i] += first[i] * second[i];
      }
    }
    return median(product);
  }

  private static double[] column(String feature, MachineState state) throws IOException {
    final int index = PuckFeatures.NAMES.indexOf(feature);
    try (Stream<String> lines = Files.lines(FILE)) {
      return lines
          .filter(line -> line.endsWith("," + state.label()))
          .mapToDouble(line -> Double.parseDouble(line.split(",")[index]))
          .toArray();
    }
  }

  private static double median(double[] values) {
    final double[] sorted = values.clone();
    Arrays.sort(sorted);
    return sorted[sorted.length / 2];
  }
}
