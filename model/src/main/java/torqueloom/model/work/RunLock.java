package torqueloom.model.work;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;

/**
 * Keeps a second process, or a second run in this one, out of a run folder. The operating system
 * gives the lock back when the process ends, however it ends, so a file {@code lock} left behind
 * locks nothing.
 */
public final class RunLock implements AutoCloseable {
  /** Name of the file in the run folder. */
  public static final String FILE = "lock";

  private static final int LONGEST_NOTE = 64;

  /**
   * Folders locked by this process. Asked before the file is opened: on POSIX, closing any channel
   * of a file gives back all locks that the process holds on it.
   */
  private static final Set<Path> HELD = ConcurrentHashMap.newKeySet();

  private final Path folder;
  private final FileChannel channel;
  private final FileLock lock;

  private RunLock(Path folder, FileChannel channel, FileLock lock) {
    this.folder = folder;
    this.channel = channel;
    this.lock = lock;
  }

  /** The folder is in use by somebody else. */
  public static final class HeldException extends IOException {
    private static final long serialVersionUID = 1L;

    HeldException(Path folder, String holder) {
      super("the run folder " + folder + " is in use by " + holder);
    }
  }

  /**
   * Locks a folder, which must exist.
   *
   * @throws HeldException if another run holds it
   * @throws IOException if the lock file cannot be written
   */
  public static RunLock acquire(Path folder) throws IOException {
    final Path real = folder.toRealPath();
    if (!HELD.add(real)) {
      throw new HeldException(folder, "another run of this process");
    }
    boolean locked = false;
    try {
      final RunLock lock = lock(folder, real);
      locked = true;
      return lock;
    } finally {
      if (!locked) {
        HELD.remove(real);
      }
    }
  }

  private static RunLock lock(Path folder, Path real) throws IOException {
    final FileChannel channel =
        FileChannel.open(
            real.resolve(FILE),
            StandardOpenOption.CREATE,
            StandardOpenOption.READ,
            StandardOpenOption.WRITE);
    FileLock lock = null;
    try {
      lock = channel.tryLock();
      if (lock == null) {
        throw new HeldException(folder, holder(real));
      }
      note(channel);
      return new RunLock(real, channel, lock);
    } catch (final IOException e) {
      channel.close();
      throw e;
    }
  }

  private static void note(FileChannel channel) throws IOException {
    final String text = "process " + ProcessHandle.current().pid() + "\n";
    channel.truncate(0);
    channel.write(ByteBuffer.wrap(text.getBytes(StandardCharsets.US_ASCII)), 0);
  }

  private static String holder(Path folder) {
    try {
      final String note = Files.readString(folder.resolve(FILE)).strip();
      return note.matches("process [0-9]+") && note.length() < LONGEST_NOTE
          ? note
          : "another process";
    } catch (final IOException e) {
      return "another process";
    }
  }

  /** Gives the folder back; the file stays, since deleting it could split the lock in two. */
  @Override
  public void close() throws IOException {
    try {
      if (channel.isOpen()) {
        lock.release();
      }
      channel.close();
    } finally {
      HELD.remove(folder);
    }
  }
}
