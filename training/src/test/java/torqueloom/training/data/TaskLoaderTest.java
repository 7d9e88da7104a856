package torqueloom.training.data;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TaskLoaderTest {
  private static final long SEED = 20261;

  @TempDir Path folder;

  private Path write(String name, String text) throws IOException {
    return Files.writeString(folder.resolve(name), text);
  }

  /** Rows whose only feature is their number; class k has counts[k] rows. */
  private static String rows(int first, int... counts) {
    final StringBuilder text = new StringBuilder("x,label\n");
    int row = first;
    for (int c = 0; c < counts.length; c++) {
      for (int i = 0; i < counts[c]; i++) {
        text.append(row++).append(",c").append(c).append('\n');
      }
    }
    return text.toString();
  }

  private TaskSplit load(String text) throws IOException {
    return TaskLoader.load(TaskSettings.csv(write("t.csv", text), null, 0.6, 0.2, 0.2), SEED);
  }

  @Test
  void keepsEveryRowOnceAndTheProportionsOfTheClasses() throws IOException {
    final TaskSplit split = load(rows(0, 50, 101, 7));
    final BitSet seen = new BitSet();
    for (final TaskTable part : List.of(split.train(), split.validation(), split.test())) {
      for (int row = 0; row < part.rows(); row++) {
        final int number = (int) part.feature(row, 0);
        assertFalse(seen.get(number), "row " + number + " is in two parts");
        seen.set(number);
        assertEquals(number < 50 ? 0 : number < 151 ? 1 : 2, part.label(row));
      }
    }
    assertEquals(158, seen.cardinality());
    assertArrayEquals(new int[] {30, 61, 4}, split.train().classCounts());
    assertArrayEquals(new int[] {10, 20, 2}, split.validation().classCounts());
    assertArrayEquals(new int[] {10, 20, 1}, split.test().classCounts());
  }

  @Test
  void sameSeedSameSplitAndOtherSeedOtherSplit() throws IOException {
    final TaskSettings settings =
        TaskSettings.csv(write("t.csv", rows(0, 50, 50)), null, 0.6, 0.2, 0.2);
    final float[] first = TaskLoader.load(settings, SEED).test().features();
    assertArrayEquals(first, TaskLoader.load(settings, SEED).test().features());
    assertFalse(Arrays.equals(first, TaskLoader.load(settings, SEED + 1).test().features()));
  }

  /** Ten rows more in a class of 1000 move about as many others over each border, not hundreds. */
  @Test
  void appendedRowsMoveFewOthers() throws IOException {
    final TaskTable before = load(rows(0, 1000, 20)).test();
    final String more = rows(0, 1000, 20) + rows(2000, 10).replace("x,label\n", "");
    final TaskTable after = load(more).test();
    final BitSet old = numbers(before);
    final BitSet both = numbers(after);
    both.and(old);
    assertTrue(old.cardinality() - both.cardinality() <= 10, old + " / " + both);
  }

  private static BitSet numbers(TaskTable table) {
    final BitSet set = new BitSet();
    for (int row = 0; row < table.rows(); row++) {
      set.set((int) table.feature(row, 0));
    }
    return set;
  }

  @Test
  void refusesClassesTooSmallForThreeParts() {
    final TaskDataException e =
        assertThrows(TaskDataException.class, () -> load(rows(0, 50, 2, 1)));
    assertEquals(2, e.faults().size(), e.getMessage());
    assertTrue(e.faults().get(0).contains("class \"c1\": found 2 rows"), e.getMessage());
    assertTrue(e.faults().get(1).contains("class \"c2\": found 1 row,"), e.getMessage());
  }

  @Test
  void refusesOneClassOnly() {
    final String message =
        assertThrows(TaskDataException.class, () -> load(rows(0, 50))).getMessage();
    assertTrue(message.contains("one class only, \"c0\""), message);
  }

  @Test
  void takesValidationFromTheFixedTrainingFile() throws IOException {
    final Path train = write("train.csv", rows(0, 50, 100));
    final Path test = write("test.csv", rows(500, 0, 3));
    final TaskSplit split = TaskLoader.load(TaskSettings.fixed(train, test, "label"), SEED);
    assertArrayEquals(new int[] {40, 80}, split.train().classCounts());
    assertArrayEquals(new int[] {10, 20}, split.validation().classCounts());
    assertArrayEquals(new int[] {0, 3}, split.test().classCounts());
    assertArrayEquals(new float[] {500, 501, 502}, split.test().features());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "x,label\\n1,c9\\n           | test.csv: found class \"c9\"",
        "y,label\\n1,c0\\n           | test.csv: found feature column \"y\"",
        "x,y,label\\n1,2,c0\\n       | test.csv: found 2 feature columns",
      })
  void refusesATestFileThatDoesNotMatch(String text, String words) throws IOException {
    final TaskSettings settings =
        TaskSettings.fixed(
            write("train.csv", rows(0, 9, 9)), write("test.csv", text.replace("\\n", "\n")), null);
    final String message =
        assertThrows(TaskDataException.class, () -> TaskLoader.load(settings, SEED)).getMessage();
    assertTrue(message.contains(words), message);
  }

  /** SHA-256 of the three bytes "abc": FIPS 180-4, example of one block (from memory). */
  @Test
  void digestsTheBytesThatWereRead() throws IOException {
    assertEquals(
        "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad",
        DataFile.read(write("abc", "abc")).digest("data", 1).sha256());
    final List<DataDigest> digests = load(rows(0, 5, 5)).digests();
    assertEquals(
        List.of("data", "t.csv"), List.of(digests.get(0).role(), digests.get(0).fileName()));
    assertEquals(10, digests.get(0).rows());
  }

  @Test
  void settingsAreChecked() {
    final Path path = Path.of("a.csv");
    assertSettings("add up to 90", () -> TaskSettings.csv(path, null, 0.5, 0.2, 0.2));
    assertSettings("task.split.train", () -> TaskSettings.csv(path, null, Double.NaN, 0.2, 0.2));
    assertSettings("task.split.test", () -> TaskSettings.csv(path, null, 0.8, 0.2, 0));
    final Optional<Path> none = Optional.empty();
    final Optional<Path> file = Optional.of(path);
    assertSettings(
        "found 0 of data",
        () -> new TaskSettings(none, none, none, none, none, null, 0.6, 0.2, 0.2));
    assertSettings(
        "found 2 of data",
        () -> new TaskSettings(file, none, none, file, file, null, 0.6, 0.2, 0.2));
    assertSettings(
        "train without test",
        () -> new TaskSettings(none, none, none, file, none, null, 0.6, 0.2, 0.2));
    assertSettings(
        "labels without features",
        () -> new TaskSettings(none, none, file, none, none, null, 0.6, 0.2, 0.2));
  }

  private static void assertSettings(String words, Runnable settings) {
    final String message = assertThrows(IllegalArgumentException.class, settings::run).getMessage();
    assertTrue(message.contains(words), message);
  }
}
