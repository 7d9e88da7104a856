package torqueloom.training.study;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import torqueloom.model.work.AtomicFiles;
import torqueloom.model.work.RunLock;
import torqueloom.model.work.RunStore;

/** A run's folder, held by this process alone, with its store of work done. */
public final class RunFolder implements AutoCloseable {
  private final Path path;
  private final RunLock lock;
  private final RunStore store;

  private RunFolder(Path path, RunLock lock, RunStore store) {
    this.path = path;
    this.lock = lock;
    this.store = store;
  }

  /**
   * Opens a folder, made if needed, and clears what a killed run left half-written.
   *
   * @throws RunLock.HeldException if another process works in it
   * @throws IOException if it cannot be written
   */
  public static RunFolder open(Path path) throws IOException {
    Files.createDirectories(path);
    final RunLock lock = RunLock.acquire(path);
    try {
      AtomicFiles.deleteLeftovers(path);
      return new RunFolder(path, lock, RunStore.open(path));
    } catch (IOException | RuntimeException e) {
      lock.close();
      throw e;
    }
  }

  /** The folder. */
  public Path path() {
    return path;
  }

  /** A file in it. */
  public Path file(String name) {
    return path.resolve(name);
  }

  /** Work done. */
  public RunStore store() {
    return store;
  }

  @Override
  public void close() throws IOException {
    try {
      store.close();
    } finally {
      lock.close();
    }
  }
}
