package torqueloom.model.work;

import java.io.BufferedInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.RandomAccessFile;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The results of a run's units, one JSON line each, in the file {@code units.jsonl} of the run
 * folder. Lines are only added; a batch is one write and one force to disk, and once {@link
 * #append} has returned its results survive a crash. A last line cut short by a crash is dropped on
 * opening, a damaged line elsewhere is passed over: its unit is computed anew.
 *
 * <p>Safe for use by several threads; a {@link RunLock} keeps other processes out.
 */
public final class RunStore implements AutoCloseable {
  /** Name of the file in the run folder. */
  public static final String FILE = "units.jsonl";

  private static final byte[] HEADER =
      "{\"schema\":1,\"file\":\"torqueloom-units\"}\n".getBytes(StandardCharsets.UTF_8);

  private final Path path;
  private final Map<Id, Place> places = new LinkedHashMap<>();

  // Not a FileChannel: an interrupt (Ctrl-C) in the middle of a write would close it.
  private RandomAccessFile file;
  private long end;

  private record Id(String stage, String digest, String key) {}

  private record Place(long offset, int length) {}

  private RunStore(Path path) {
    this.path = path;
  }

  /**
   * Opens the store of a run folder, which must exist; a missing file is made.
   *
   * @throws IOException if the file cannot be read or written, or is no store of this version
   */
  public static RunStore open(Path folder) throws IOException {
    final RunStore store = new RunStore(folder.resolve(FILE));
    store.load();
    return store;
  }

  /** The number of results, stale ones included. */
  public synchronized int size() {
    return places.size();
  }

  /**
   * The payload of a unit, if it is stored with this digest.
   *
   * @throws IOException if the file cannot be read
   */
  public synchronized Optional<String> find(String stage, String digest, String key)
      throws IOException {
    final Place place = places.get(new Id(stage, digest, key));
    if (place == null) {
      return Optional.empty();
    }
    final byte[] line = bytes(place);
    return StoreLines.decode(line, line.length - 1).map(StoredUnit::payload);
  }

  /**
   * Adds a batch: one write, one force. A result stored before under the same stage, digest and key
   * is replaced.
   *
   * @throws IOException if it cannot be written; the file is then as it was
   */
  public synchronized void append(List<StoredUnit> batch) throws IOException {
    if (batch.isEmpty()) {
      return;
    }
    final ByteArrayOutputStream lines = new ByteArrayOutputStream();
    final Map<Id, Place> added = new LinkedHashMap<>();
    for (final StoredUnit unit : batch) {
      final byte[] line = StoreLines.encode(unit);
      added.put(idOf(unit), new Place(end + lines.size(), line.length));
      lines.writeBytes(line);
    }
    appendBytes(lines.toByteArray());
    places.putAll(added);
  }

  /**
   * Drops what is stale: results of the named stages whose digest is not the current one, and
   * damaged or replaced lines. Results of stages that are not named stay.
   *
   * @param currentDigests stage name to digest
   * @return the number of results dropped
   * @throws IOException if the file cannot be rewritten; it is then as it was
   */
  public synchronized int compact(Map<String, String> currentDigests) throws IOException {
    final List<Place> kept = new ArrayList<>();
    for (final Map.Entry<Id, Place> entry : places.entrySet()) {
      final String current = currentDigests.get(entry.getKey().stage());
      if (current == null || current.equals(entry.getKey().digest())) {
        kept.add(entry.getValue());
      }
    }
    final int dropped = places.size() - kept.size();
    AtomicFiles.write(path, part -> copy(kept, part));
    file.close();
    load();
    return dropped;
  }

  @Override
  public synchronized void close() throws IOException {
    file.close();
  }

  private void copy(List<Place> kept, Path part) throws IOException {
    try (OutputStream out = Files.newOutputStream(part)) {
      out.write(HEADER);
      for (final Place place : kept) {
        out.write(bytes(place));
      }
    }
  }

  private byte[] bytes(Place place) throws IOException {
    final byte[] line = new byte[place.length()];
    file.seek(place.offset());
    file.readFully(line);
    return line;
  }

  private void appendBytes(byte[] bytes) throws IOException {
    try {
      file.seek(end);
      file.write(bytes);
      file.getFD().sync();
    } catch (final IOException e) {
      dropAfter(end, e);
      throw e;
    }
    end += bytes.length;
  }

  private void dropAfter(long length, IOException cause) {
    try {
      file.setLength(length);
    } catch (final IOException e) {
      cause.addSuppressed(e);
    }
  }

  private void load() throws IOException {
    places.clear();
    file = new RandomAccessFile(path.toFile(), "rw");
    boolean loaded = false;
    try {
      end = scan();
      if (end == 0) {
        refuseForeignStart();
      }
      if (file.length() > end) {
        file.setLength(end);
      }
      if (end == 0) {
        appendBytes(HEADER);
      }
      loaded = true;
    } finally {
      if (!loaded) {
        file.close();
      }
    }
  }

  /** Reads all complete lines and returns where the last of them ends. */
  private long scan() throws IOException {
    final ByteArrayOutputStream line = new ByteArrayOutputStream();
    long start = 0;
    try (InputStream in = new BufferedInputStream(Files.newInputStream(path), 1 << 16)) {
      for (int b = in.read(); b >= 0; b = in.read()) {
        line.write(b);
        if (b == '\n') {
          take(line.toByteArray(), start);
          start += line.size();
          line.reset();
        }
      }
    }
    return start;
  }

  private void take(byte[] line, long start) throws IOException {
    if (start == 0) {
      if (!Arrays.equals(line, HEADER)) {
        throw foreign();
      }
      return;
    }
    StoreLines.decode(line, line.length - 1)
        .ifPresent(unit -> places.put(idOf(unit), new Place(start, line.length)));
  }

  /** A file without a complete line may be a header cut short, and nothing else. */
  private void refuseForeignStart() throws IOException {
    final byte[] start = Files.readAllBytes(path);
    if (!Arrays.equals(start, Arrays.copyOf(HEADER, Math.min(start.length, HEADER.length)))) {
      throw foreign();
    }
  }

  private IOException foreign() {
    return new IOException(
        path + " is no store of this version; move it away to compute its results anew");
  }

  private static Id idOf(StoredUnit unit) {
    return new Id(unit.stage(), unit.digest(), unit.key());
  }
}
