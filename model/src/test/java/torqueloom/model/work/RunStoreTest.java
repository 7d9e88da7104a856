package torqueloom.model.work;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RunStoreTest {
  private static final StoredUnit ONE = new StoredUnit("chips", "d1", "chip=1", "{\"x\":[1,2]}");
  private static final StoredUnit TWO =
      new StoredUnit("chips", "d1", "chip=2", "\u00B5\n\"\\\u0000");
  private static final StoredUnit STALE = new StoredUnit("chips", "d0", "chip=1", "old");
  private static final StoredUnit OTHER = new StoredUnit("calibrate", "c1", "instance=0", "r");

  @TempDir Path folder;
  private Path file;

  @BeforeEach
  void nameFile() {
    file = folder.resolve(RunStore.FILE);
  }

  @Test
  void findsWhatWasStoredAlsoAfterReopening() throws IOException {
    try (RunStore store = RunStore.open(folder)) {
      assertEquals(Optional.empty(), find(store, ONE));
      store.append(List.of(ONE, TWO));
      store.append(List.of(STALE, OTHER));
      store.append(List.of());
      assertAllFound(store, ONE, TWO, STALE, OTHER);
    }
    try (RunStore store = RunStore.open(folder)) {
      assertEquals(4, store.size());
      assertAllFound(store, ONE, TWO, STALE, OTHER);
    }
    assertEquals(
        "{\"stage\":\"chips\",\"digest\":\"d1\",\"key\":\"chip=1\","
            + "\"payload\":\"{\\\"x\\\":[1,2]}\"}",
        Files.readAllLines(file).get(1));
  }

  @Test
  void theLastOfTwoWins() throws IOException {
    final StoredUnit again = new StoredUnit("chips", "d1", "chip=1", "new");
    try (RunStore store = RunStore.open(folder)) {
      store.append(List.of(ONE));
      store.append(List.of(again));
      assertAllFound(store, again);
    }
    try (RunStore store = RunStore.open(folder)) {
      assertEquals(1, store.size());
      assertAllFound(store, again);
    }
  }

  /** Whatever the byte at which a write was cut, whole lines stay and new ones can follow. */
  @Test
  void dropsALineCutShortAtAnyByte() throws IOException {
    try (RunStore store = RunStore.open(folder)) {
      store.append(List.of(ONE));
      store.append(List.of(TWO));
    }
    final byte[] whole = Files.readAllBytes(file);
    final int first = whole.length - StoreLines.encode(TWO).length;
    for (int length = 0; length < whole.length; length++) {
      Files.write(file, Arrays.copyOf(whole, length));
      try (RunStore store = RunStore.open(folder)) {
        assertEquals(length >= first ? 1 : 0, store.size(), "cut at " + length);
        store.append(List.of(ONE, TWO));
        assertAllFound(store, ONE, TWO);
      }
      try (RunStore store = RunStore.open(folder)) {
        assertEquals(2, store.size(), "cut at " + length);
      }
    }
  }

  @Test
  void passesOverDamagedLines() throws IOException {
    try (RunStore store = RunStore.open(folder)) {
      store.append(List.of(ONE));
    }
    Files.writeString(
        file, "garbage\n{\"stage\":1}\n{\"stage\":\"s\"}\n[]\n\n", StandardOpenOption.APPEND);
    try (RunStore store = RunStore.open(folder)) {
      assertEquals(1, store.size());
      store.append(List.of(TWO));
      assertAllFound(store, ONE, TWO);
      assertEquals(0, store.compact(Map.of()));
    }
    assertEquals(3, Files.readAllLines(file).size());
  }

  @Test
  void compactionDropsStaleResultsOfTheNamedStages() throws IOException {
    try (RunStore store = RunStore.open(folder)) {
      store.append(List.of(STALE, OTHER, ONE));
      assertEquals(1, store.compact(Map.of("chips", "d1")));
      assertEquals(Optional.empty(), find(store, STALE));
      store.append(List.of(TWO));
      assertAllFound(store, ONE, OTHER, TWO);
    }
    try (RunStore store = RunStore.open(folder)) {
      assertEquals(3, store.size());
      assertAllFound(store, ONE, OTHER, TWO);
    }
    assertEquals(1, folder.toFile().list().length);
  }

  @Test
  void leavesForeignFilesAlone() throws IOException {
    for (final String content : List.of("my notes", "my notes\nmore\n", "{\"schema\":2}\n")) {
      Files.writeString(file, content);
      final IOException refusal = assertThrows(IOException.class, () -> RunStore.open(folder));
      assertTrue(refusal.getMessage().contains(RunStore.FILE), refusal.getMessage());
      assertEquals(content, Files.readString(file));
    }
  }

  @Test
  void needsItsFolder() {
    final Path missing = folder.resolve("none");
    assertThrows(IOException.class, () -> RunStore.open(missing));
    assertFalse(Files.exists(missing));
  }

  private static void assertAllFound(RunStore store, StoredUnit... units) throws IOException {
    for (final StoredUnit unit : units) {
      assertEquals(Optional.of(unit.payload()), find(store, unit));
    }
  }

  private static Optional<String> find(RunStore store, StoredUnit unit) throws IOException {
    return store.find(unit.stage(), unit.digest(), unit.key());
  }
}
