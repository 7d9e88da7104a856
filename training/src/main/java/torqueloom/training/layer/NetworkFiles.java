package torqueloom.training.layer;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.EOFException;
import java.io.IOException;
import java.io.InputStream;
import java.io.ObjectInputFilter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.zip.ZipEntry;
import java.util.zip.ZipException;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;
import org.deeplearning4j.nn.conf.MultiLayerConfiguration;
import org.deeplearning4j.nn.multilayer.MultiLayerNetwork;
import org.deeplearning4j.util.ModelSerializer;
import org.nd4j.linalg.factory.Nd4j;
import torqueloom.model.table.CanonicalJson;
import torqueloom.model.table.JsonReader;
import torqueloom.model.work.AtomicFiles;

/**
 * Network files: the deep-learning library's own zip, plus one entry {@value #CARD} of ours. The
 * only place that reads or writes them.
 *
 * <p>A network file may come from anybody, and the loader would deserialize Java objects that stand
 * in extra entries and follow whatever header an array claims. So reading accepts the known entries
 * only, each once and within a size; checks every class name and field of the configuration; and
 * sets the bare values of the parameters in a network built from the checked configuration. The
 * library's own loader is not called at all. A filter that rejects all Java deserialization in the
 * process stands behind it.
 */
public final class NetworkFiles {
  /** Version of the card. */
  public static final int SCHEMA = 1;

  private static final String CONFIGURATION = "configuration.json";
  private static final String PARAMETERS = "coefficients.bin";
  private static final String CARD = "torqueloom.json";
  private static final Set<String> NAMES = Set.of(CONFIGURATION, PARAMETERS, CARD);

  /** Entries that are read first, with the most bytes each may have. */
  private static final Map<String, Long> DESCRIPTION =
      Map.of(CONFIGURATION, 64L << 20, CARD, 16L << 20);

  private static final long LARGEST_FILE = 512L << 20;

  /** What the library writes. */
  private static final Map<String, Long> LIBRARY =
      Map.of(CONFIGURATION, 64L << 20, PARAMETERS, LARGEST_FILE);

  private NetworkFiles() {}

  /**
   * A network with its card.
   *
   * @param model the network
   * @param card what stands in our entry: {@code schema} and plain values
   */
  public record Content(MultiLayerNetwork model, Map<String, Object> card) {}

  /** Makes the process reject all Java deserialization, unless a filter is in force already. */
  public static synchronized void rejectDeserialization() {
    if (ObjectInputFilter.Config.getSerialFilter() == null) {
      ObjectInputFilter.Config.setSerialFilter(info -> ObjectInputFilter.Status.REJECTED);
    }
  }

  /**
   * Writes a network; the file appears whole or not at all.
   *
   * @param path file
   * @param model network
   * @param card plain values for our entry; {@code schema} is added
   */
  public static void write(Path path, MultiLayerNetwork model, Map<String, Object> card)
      throws IOException {
    final ByteArrayOutputStream library = new ByteArrayOutputStream();
    ModelSerializer.writeModel(model, library, false);
    final Map<String, byte[]> entries = entries(library.toByteArray(), path, LIBRARY);
    final Map<String, Object> full = new LinkedHashMap<>();
    full.put("schema", SCHEMA);
    full.putAll(card);
    entries.put(CARD, CanonicalJson.text(full).getBytes(StandardCharsets.UTF_8));
    AtomicFiles.write(path, zip(entries));
  }

  /**
   * Reads a network.
   *
   * @throws NetworkFileException if the file is not a network file of this program, or holds
   *     anything that a network file does not hold
   */
  public static Content read(Path path) throws IOException {
    rejectDeserialization();
    NativeCheck.ensure();
    final byte[] file = bytes(path);
    final Map<String, byte[]> described = entries(file, path, DESCRIPTION);
    for (final String needed : List.of(CONFIGURATION, CARD)) {
      if (!described.containsKey(needed)) {
        throw new NetworkFileException(path, "the entry " + needed + " is missing");
      }
    }
    final String text = new String(described.get(CONFIGURATION), StandardCharsets.UTF_8);
    ConfigurationCheck.check(text, path);
    final MultiLayerConfiguration configuration = configuration(text, path);
    final int parameters = LayerCheck.check(configuration, path);
    final byte[] array =
        entries(file, path, Map.of(PARAMETERS, 4L * parameters + ParameterCheck.LONGEST_HEADER))
            .get(PARAMETERS);
    if (array == null) {
      throw new NetworkFileException(path, "the entry " + PARAMETERS + " is missing");
    }
    final float[] values = ParameterCheck.values(array, parameters, path);
    return new Content(model(configuration, values, path), card(described.get(CARD), path));
  }

  /** Checked fields may still not fit each other in ways that only the library knows. */
  private static MultiLayerNetwork model(
      MultiLayerConfiguration configuration, float[] values, Path path)
      throws NetworkFileException {
    try {
      final MultiLayerNetwork model = new MultiLayerNetwork(configuration);
      model.init();
      model.setParams(Nd4j.create(values, new long[] {1, values.length}, 'c'));
      return model;
    } catch (RuntimeException e) {
      throw new NetworkFileException(path, "the library cannot build it: " + firstLine(e));
    }
  }

  private static MultiLayerConfiguration configuration(String text, Path path)
      throws NetworkFileException {
    try {
      return MultiLayerConfiguration.fromJson(text);
    } catch (RuntimeException e) {
      throw new NetworkFileException(
          path, "the library cannot read " + CONFIGURATION + ": " + firstLine(e));
    }
  }

  @SuppressWarnings("unchecked")
  private static Map<String, Object> card(byte[] bytes, Path path) throws NetworkFileException {
    final Object value;
    try {
      value = JsonReader.parse(new String(bytes, StandardCharsets.UTF_8), path + "!" + CARD);
    } catch (IOException e) {
      throw new NetworkFileException(path, e.getMessage());
    }
    if (!(value instanceof Map<?, ?> map)
        || !(map.get("schema") instanceof Number schema)
        || schema.longValue() != SCHEMA) {
      throw new NetworkFileException(path, "found another schema than " + SCHEMA + " in " + CARD);
    }
    return (Map<String, Object>) map;
  }

  private static byte[] bytes(Path path) throws IOException {
    if (Files.size(path) > LARGEST_FILE) {
      throw new NetworkFileException(path, "larger than " + LARGEST_FILE + " bytes");
    }
    return Files.readAllBytes(path);
  }

  /**
   * Entries of a file, every one known and only once.
   *
   * @param wanted names of the entries to read, with the most bytes each may have; the others are
   *     passed over without being kept
   */
  private static Map<String, byte[]> entries(byte[] file, Path path, Map<String, Long> wanted)
      throws IOException {
    final Map<String, byte[]> entries = new LinkedHashMap<>();
    final Set<String> seen = new HashSet<>();
    try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(file))) {
      for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
        final String name = entry.getName();
        if (!NAMES.contains(name)) {
          throw new NetworkFileException(
              path, "found the entry " + printable(name) + ", which is not allowed");
        }
        if (!seen.add(name)) {
          throw new NetworkFileException(path, "the entry " + name + " stands there twice");
        }
        final Long limit = wanted.get(name);
        if (limit != null) {
          entries.put(name, within(zip, name, limit, path));
        }
      }
    } catch (ZipException | EOFException | IllegalArgumentException e) {
      // An entry's name that is no text is an illegal argument to Java's own reader.
      throw new NetworkFileException(path, "not a whole zip file: " + e.getMessage());
    }
    if (seen.isEmpty()) {
      throw new NetworkFileException(path, "not a zip file, or an empty one");
    }
    return entries;
  }

  private static byte[] within(InputStream in, String name, long limit, Path path)
      throws IOException {
    final byte[] content = in.readNBytes((int) (limit + 1));
    if (content.length > limit) {
      throw new NetworkFileException(
          path, "the entry " + name + " is larger than " + limit + " bytes");
    }
    return content;
  }

  private static byte[] zip(Map<String, byte[]> entries) throws IOException {
    final ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (ZipOutputStream zip = new ZipOutputStream(bytes)) {
      for (final Map.Entry<String, byte[]> entry : entries.entrySet()) {
        final ZipEntry header = new ZipEntry(entry.getKey());
        header.setTime(0);
        zip.putNextEntry(header);
        zip.write(entry.getValue());
        zip.closeEntry();
      }
    }
    return bytes.toByteArray();
  }

  /** The library appends the text it read, many lines long. */
  private static String firstLine(RuntimeException e) {
    return String.valueOf(e.getMessage()).lines().findFirst().orElse("no reason given");
  }

  private static String printable(String name) {
    final String clean = name.replaceAll("[^\\x20-\\x7e]", "?");
    return "\"" + (clean.length() > 80 ? clean.substring(0, 80) + "..." : clean) + "\"";
  }
}
