package torqueloom.model.work;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class AtomicFilesTest {
  @TempDir Path folder;

  @Test
  void createsAndReplaces() throws IOException {
    final Path file = folder.resolve("r.json");
    AtomicFiles.write(file, "one");
    assertEquals("one", Files.readString(file));
    AtomicFiles.write(file, "two");
    assertEquals("two", Files.readString(file));
    assertEquals(List.of("r.json"), names());
  }

  @Test
  void leavesTheFormerFileWhenWritingFails() throws IOException {
    final Path file = folder.resolve("r.zip");
    AtomicFiles.write(file, "former");
    assertThrows(
        IOException.class,
        () ->
            AtomicFiles.write(
                file,
                part -> {
                  Files.writeString(part, "half");
                  throw new IOException("disk full");
                }));
    assertEquals("former", Files.readString(file));
    assertEquals(List.of("r.zip"), names());
  }

  @Test
  void leavesNoPartWhenTheTargetCannotBeReplaced() throws IOException {
    final Path occupied = Files.createDirectory(folder.resolve("taken"));
    Files.createFile(occupied.resolve("inside"));
    assertThrows(IOException.class, () -> AtomicFiles.write(occupied, "text"));
    assertEquals(List.of("taken"), names());
    assertThrows(
        IOException.class, () -> AtomicFiles.write(folder.resolve("none").resolve("f"), "text"));
  }

  @Test
  void deletesOnlyPartsOfProcessesThatAreGone() throws IOException, InterruptedException {
    final Process gone = new ProcessBuilder("true").start();
    gone.waitFor();
    final long own = ProcessHandle.current().pid();
    final Path leftover = Files.createFile(folder.resolve(".r.json." + gone.pid() + "-1.part"));
    final Path busy = Files.createFile(folder.resolve(".r.json." + own + "-99.part"));
    final Path other = Files.createFile(folder.resolve(".mine.part"));
    final Path nested = Files.createDirectory(folder.resolve(".d." + gone.pid() + "-2.part"));
    assertEquals(1, AtomicFiles.deleteLeftovers(folder));
    assertFalse(Files.exists(leftover));
    assertTrue(Files.exists(busy) && Files.exists(other) && Files.exists(nested));
  }

  private List<String> names() throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.map(file -> file.getFileName().toString()).sorted().toList();
    }
  }
}
