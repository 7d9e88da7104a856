package torqueloom.training.layer;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.ObjectInputFilter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;
import org.deeplearning4j.nn.conf.MultiLayerConfiguration;
import org.deeplearning4j.nn.multilayer.MultiLayerNetwork;
import org.deeplearning4j.util.ModelSerializer;
import torqueloom.model.table.CanonicalJson;
import torqueloom.model.table.JsonReader;
import torqueloom.model.work.AtomicFiles;

/**
 * Network files: the deep-learning library's own zip, plus one entry {@value #CARD} of ours. The
 * only caller of the library's loader.
 *
 * <p>A network file may come from anybody, and the loader would deserialize Java objects that stand
 * in extra entries. So reading accepts the known entries only, each once and within a size; checks
 * every class name in the configuration and the header of the parameter array; and hands the loader
 * a copy that holds nothing else. A filter that rejects all Java deserialization in the process
 * stands behind it.
 */
public final class NetworkFiles {
  /** Version of the card. */
  public static final int SCHEMA = 1;

  private static final String CONFIGURATION = "configuration.json";
  private static final String PARAMETERS = "coefficients.bin";
  private static final String CARD = "torqueloom.json";
  private static final Map<String, Long> LIMITS =
      Map.of(CONFIGURATION, 256L << 20, PARAMETERS, 1L << 30, CARD, 16L << 20);

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
    final Map<String, byte[]> entries = entries(library.toByteArray(), path);
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
    final Map<String, byte[]> entries = entries(Files.readAllBytes(path), path);
    for (final String needed : LIMITS.keySet()) {
      if (!entries.containsKey(needed)) {
        throw new NetworkFileException(path, "the entry " + needed + " is missing");
      }
    }
    final String text = new String(entries.get(CONFIGURATION), StandardCharsets.UTF_8);
    ConfigurationCheck.check(text, path);
    final Map<String, Object> card = card(entries.remove(CARD), path);
    final MultiLayerConfiguration configuration = configuration(text, path);
    ParameterCheck.check(entries.get(PARAMETERS), parameters(configuration), path);
    try (InputStream copy = new ByteArrayInputStream(zip(entries))) {
      return new Content(ModelSerializer.restoreMultiLayerNetwork(copy, false), card);
    } catch (RuntimeException e) {
      throw new NetworkFileException(path, "the library cannot read it: " + e.getMessage());
    }
  }

  private static MultiLayerConfiguration configuration(String text, Path path)
      throws NetworkFileException {
    try {
      return MultiLayerConfiguration.fromJson(text);
    } catch (RuntimeException e) {
      throw new NetworkFileException(
          path, "the library cannot read " + CONFIGURATION + ": " + e.getMessage());
    }
  }

  private static long parameters(MultiLayerConfiguration configuration) {
    return configuration.getConfs().stream()
        .mapToLong(c -> c.getLayer().initializer().numParams(c))
        .sum();
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
      throw new NetworkFileException(
          path, "found another schema than " + SCHEMA + " in " + CARD);
    }
    return (Map<String, Object>) map;
  }

  /** All entries, each known, once and within its size. */
  private static Map<String, byte[]> entries(byte[] file, Path path) throws IOException {
    final Map<String, byte[]> entries = new LinkedHashMap<>();
    try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(file))) {
      for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
        final Long limit = LIMITS.get(entry.getName());
        if (limit == null) {
          throw new NetworkFileException(
              path, "found the entry " + printable(entry.getName()) + ", which is not allowed");
        }
        final byte[] content = zip.readNBytes((int) (limit + 1));
        if (content.length > limit) {
          throw new NetworkFileException(
              path, "the entry " + entry.getName() + " is larger than " + limit + " bytes");
        }
        if (entries.put(entry.getName(), content) != null) {
          throw new NetworkFileException(
              path, "the entry " + entry.getName() + " stands there twice");
        }
      }
    } catch (java.util.zip.ZipException e) {
      throw new NetworkFileException(path, "not a zip file: " + e.getMessage());
    }
    if (entries.isEmpty()) {
      throw new NetworkFileException(path, "not a zip file, or an empty one");
    }
    return entries;
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

  private static String printable(String name) {
    final String clean = name.replaceAll("[^\\x20-\\x7e]", "?");
    return "\"" + (clean.length() > 80 ? clean.substring(0, 80) + "..." : clean) + "\"";
  }
}
