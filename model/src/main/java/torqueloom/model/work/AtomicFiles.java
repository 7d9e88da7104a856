package torqueloom.model.work;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.concurrent.atomic.AtomicLong;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Files that are whole or absent: written beside their name, forced to disk, then moved into place.
 * A reader sees the former content or the new one, never a part.
 */
public final class AtomicFiles {
  private static final AtomicLong COUNTER = new AtomicLong();

  /** {@code .NAME.PROCESS-COUNT.part}; the process number tells leftovers from work in progress. */
  private static final Pattern PART = Pattern.compile("\\..+\\.([0-9]{1,18})-[0-9]+\\.part");

  private AtomicFiles() {}

  /** Writes the content of a file that is being made, such as a zip. */
  @FunctionalInterface
  public interface Content {
    /** Fills {@code file}, which does not exist yet. */
    void writeTo(Path file) throws IOException;
  }

  /**
   * Replaces or creates {@code path}. Its folder must exist.
   *
   * @throws IOException if it cannot be written; {@code path} is then as it was
   */
  public static void write(Path path, byte[] content) throws IOException {
    write(path, part -> Files.write(part, content, StandardOpenOption.CREATE_NEW));
  }

  /** As {@link #write(Path, byte[])}, the text in UTF-8. */
  public static void write(Path path, String text) throws IOException {
    write(path, text.getBytes(StandardCharsets.UTF_8));
  }

  /**
   * Replaces or creates {@code path} with what {@code content} writes into a file beside it.
   *
   * @throws IOException if it cannot be written; {@code path} is then as it was
   */
  public static void write(Path path, Content content) throws IOException {
    final Path target = path.toAbsolutePath();
    final Path part = partBeside(target);
    boolean moved = false;
    try {
      content.writeTo(part);
      force(part);
      move(part, target);
      moved = true;
    } finally {
      if (!moved) {
        Files.deleteIfExists(part);
      }
    }
    forceFolder(target.getParent());
  }

  /**
   * Deletes what a killed process left behind in a folder: regular files named as this class names
   * its parts, whose process is gone. To be called under the folder's {@link RunLock}.
   *
   * @return the number of files deleted
   */
  public static int deleteLeftovers(Path folder) throws IOException {
    int deleted = 0;
    try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, ".*.part")) {
      for (final Path file : files) {
        if (isLeftover(file) && Files.deleteIfExists(file)) {
          deleted++;
        }
      }
    } catch (final DirectoryIteratorException e) {
      throw e.getCause();
    }
    return deleted;
  }

  private static boolean isLeftover(Path file) {
    final Matcher part = PART.matcher(file.getFileName().toString());
    return part.matches()
        && Files.isRegularFile(file, LinkOption.NOFOLLOW_LINKS)
        && ProcessHandle.of(Long.parseLong(part.group(1))).isEmpty();
  }

  private static Path partBeside(Path target) {
    final String name =
        "."
            + target.getFileName()
            + "."
            + ProcessHandle.current().pid()
            + "-"
            + COUNTER.incrementAndGet()
            + ".part";
    return target.resolveSibling(name);
  }

  private static void move(Path from, Path to) throws IOException {
    try {
      Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } catch (final AtomicMoveNotSupportedException e) {
      Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
    }
  }

  private static void force(Path file) throws IOException {
    try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE)) {
      channel.force(true);
    }
  }

  /**
   * Makes the new name itself durable where the platform can open a folder; elsewhere it cannot.
   */
  private static void forceFolder(Path folder) {
    try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
      channel.force(true);
    } catch (final IOException e) {
      // Windows opens no folders; the content is on disk already.
    }
  }
}
