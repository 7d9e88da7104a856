package torqueloom.training.encoding;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import torqueloom.training.data.TaskTable;

class AmplitudeEncoderTest {
  private static TaskTable column(float... values) {
    return TaskTable.of(values, new int[values.length], List.of("x"), List.of("a"));
  }

  private static TaskTable squares(int rows) {
    final float[] values = new float[rows];
    for (int i = 0; i < rows; i++) {
      values[i] = (float) i * i;
    }
    return column(values);
  }

  /** numpy.percentile(numpy.arange(50)**2, [1, 99]) = 0.49, 2353.47 (numpy 2.4.6). */
  @Test
  void scalesBetweenPercentilesOfTheTrainingRows() {
    final AmplitudeEncoder encoder = AmplitudeEncoder.fit(squares(50), AmplitudeEncoder.CONTINUOUS);
    assertEquals(0.49f, encoder.lower()[0], 1e-6f);
    assertEquals(2353.47f, encoder.upper()[0], 1e-3f);
    final float[] levels = encoder.encode(column(-5, 0.49f, 1000, 2353.47f, 1e30f), 8);
    assertArrayEquals(new float[] {0, 0, 999.51f / 2352.98f, 1, 1}, levels, 1e-6f);
  }

  @Test
  void roundsToEquallySpacedLevels() {
    final AmplitudeEncoder encoder = AmplitudeEncoder.of(new float[] {0}, new float[] {1}, 5);
    assertArrayEquals(
        new float[] {0, 0, 0.25f, 0.25f, 0.5f, 1},
        encoder.encode(column(0, 0.124f, 0.126f, 0.374f, 0.376f, 0.9f), 1));
  }

  @Test
  void holdsAConstantFeatureAtZeroAndSaysSo() {
    final List<String> names = new ArrayList<>(List.of("flat", "live"));
    final TaskTable table =
        TaskTable.of(new float[] {3, 0, 3, 1, 3, 2}, new int[3], names, List.of("a"));
    final AmplitudeEncoder encoder = AmplitudeEncoder.fit(table, 3);
    final float[] levels = encoder.encode(table, 2);
    assertArrayEquals(new float[] {0, 0, 0, 0.5f, 0, 1}, levels);
    assertEquals(1, encoder.notes().size());
    assertTrue(encoder.notes().get(0).endsWith("level 0: flat"), encoder.notes().get(0));
    assertTrue(encoder.constantOverSlots());
    assertEquals(2, encoder.inputs());
  }

  @Test
  void storedScalingGivesTheSameLevels() {
    final AmplitudeEncoder encoder = AmplitudeEncoder.fit(squares(200), 16);
    final AmplitudeEncoder stored =
        AmplitudeEncoder.of(encoder.lower(), encoder.upper(), encoder.levels());
    assertArrayEquals(encoder.encode(squares(90), 4), stored.encode(squares(90), 4));
  }

  @Test
  void refusesWhatCannotServe() {
    final TaskTable one = column(1, 2);
    assertThrows(IllegalArgumentException.class, () -> AmplitudeEncoder.fit(one, 1));
    assertThrows(IllegalArgumentException.class, () -> AmplitudeEncoder.fit(column(), 4));
    assertThrows(
        IllegalArgumentException.class,
        () -> AmplitudeEncoder.of(new float[] {1}, new float[] {0}, 4));
    final AmplitudeEncoder two = AmplitudeEncoder.of(new float[2], new float[] {1, 1}, 4);
    assertThrows(IllegalArgumentException.class, () -> two.encode(one, 4));
  }
}
