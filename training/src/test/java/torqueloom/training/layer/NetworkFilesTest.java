package torqueloom.training.layer;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.io.ObjectOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import java.util.zip.ZipOutputStream;
import org.deeplearning4j.nn.multilayer.MultiLayerNetwork;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.nd4j.linalg.learning.config.Adam;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.evaluation.NeuronBank;
import torqueloom.training.evaluation.PairLayer;
import torqueloom.training.evaluation.PairWeights;
import torqueloom.training.evaluation.TrainedNetwork;

class NetworkFilesTest {
  private static final NetworkSettings SHAPE =
      new NetworkSettings(new int[] {3}, 4, NetworkSettings.Output.WEIGHTED_SUM, 8, 4);

  @TempDir Path folder;
  private Path file;
  private TrainedNetwork written;

  @BeforeEach
  void writeOne() throws IOException {
    final NeuronBank bank =
        new NeuronBank(1, 3, 1, 10f, new float[] {1f, 0.5f, 0f}, new float[] {0f, 0.5f, 1f});
    final NetworkBuilder builder =
        new NetworkBuilder(
            SHAPE, 2, 2, bank, "abc", 9f, 1f, PairWeights.straight(8), 0.01, 0.1, true, 5);
    final List<PairLayer> start =
        List.of(
            new PairLayer(
                2,
                3,
                new float[] {0f, .1f, .2f, .3f, .4f, .5f},
                new float[] {1f, .9f, .8f, .7f, .6f, .5f},
                new float[] {1f, 2f, 3f}),
            new PairLayer(
                3,
                2,
                new float[] {.5f, .4f, .3f, .2f, .1f, 0f},
                new float[6],
                new float[] {-1f, 1f}));
    final MultiLayerNetwork model = builder.build(start, new Adam(0.01));
    written = NetworkBuilder.plain(model, SHAPE);
    file = folder.resolve("network.zip");
    NetworkFiles.write(file, model, Map.of("note", "x"));
  }

  @Test
  void readsBackWhatWasWritten() throws IOException {
    final NetworkFiles.Content content = NetworkFiles.read(file);
    final TrainedNetwork read = NetworkBuilder.plain(content.model(), SHAPE);
    assertEquals("abc", read.libraryDigest());
    assertEquals("x", content.card().get("note"));
    assertArrayEquals(written.curve(), read.curve());
    for (int layer = 0; layer < 2; layer++) {
      assertArrayEquals(written.layers().get(layer).plus(), read.layers().get(layer).plus());
      assertArrayEquals(written.layers().get(layer).minus(), read.layers().get(layer).minus());
      assertArrayEquals(written.layers().get(layer).offset(), read.layers().get(layer).offset());
    }
    assertArrayEquals(new float[] {1f, 2f, 3f}, read.layers().get(0).offset(), 1e-5f);
  }

  @Test
  void refusesAForeignObjectInAnExtraEntry() throws IOException {
    final Map<String, byte[]> good = entries();
    for (final String name : List.of("preprocessor.bin", "normalizer.bin", "anything.bin")) {
      final ByteArrayOutputStream object = new ByteArrayOutputStream();
      try (ObjectOutputStream out = new ObjectOutputStream(object)) {
        out.writeObject(new java.util.ArrayList<>(List.of("foreign")));
      }
      final Map<String, byte[]> entries = new LinkedHashMap<>(good);
      entries.put(name, object.toByteArray());
      refused(entries, name);
    }
  }

  @Test
  void refusesAnotherClassInTheConfiguration() throws IOException {
    final Map<String, byte[]> entries = entries();
    final String text = new String(entries.get("configuration.json"), StandardCharsets.UTF_8);
    final String foreign = text.replace(CountReadout.class.getName(), "javax.swing.JEditorPane");
    assertTrue(!foreign.equals(text));
    entries.put("configuration.json", foreign.getBytes(StandardCharsets.UTF_8));
    refused(entries, "javax.swing.JEditorPane");
  }

  private static byte[] array(long[] shape, long length, String type, float... values)
      throws IOException {
    final ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (DataOutputStream out = new DataOutputStream(bytes)) {
      out.writeUTF("MIXED_DATA_TYPES");
      out.writeLong(shape.length);
      out.writeUTF("LONG");
      for (final long number : shape) {
        out.writeLong(number);
      }
      out.writeUTF("MIXED_DATA_TYPES");
      out.writeLong(length);
      out.writeUTF(type);
      for (final float value : values) {
        out.writeFloat(value);
      }
    }
    return bytes.toByteArray();
  }

  private int parameters() {
    int count = 0;
    for (final PairLayer layer : written.layers()) {
      count += 2 * layer.plus().length + layer.offset().length;
    }
    return count;
  }

  @Test
  void refusesAnOversizedArrayHeader() throws IOException {
    final Map<String, byte[]> entries = entries();
    final long[] shape = {2, 1, 1L << 40, 1L << 40, 1, 0, 1, 99};
    entries.put("coefficients.bin", array(shape, 1L << 40, "FLOAT"));
    refused(entries, "claims");
    entries.put("coefficients.bin", array(new long[100], parameters(), "FLOAT"));
    refused(entries, "shape");
    entries.put("coefficients.bin", array(shape, parameters(), "DOUBLE"));
    refused(entries, "DOUBLE");
  }

  @Test
  void refusesParametersThatAreNoNumbers() throws IOException {
    final Map<String, byte[]> entries = entries();
    final float[] values = new float[parameters()];
    values[3] = Float.NaN;
    entries.put(
        "coefficients.bin",
        array(new long[] {2, 1, values.length, 1, 1, 0, 1, 99}, values.length, "FLOAT", values));
    refused(entries, "parameter 3");
  }

  /** Strides that point out of the array change nothing: only the bare values are taken. */
  @Test
  void takesNothingButValuesFromTheArray() throws IOException {
    final Map<String, byte[]> entries = entries();
    final float[] values = new float[parameters()];
    java.util.Arrays.fill(values, 0.25f);
    final long[] shape = {2, 1, values.length, -1_000_000_000L, -5, 8192, -1_000_000_000L, 99};
    entries.put("coefficients.bin", array(shape, values.length, "FLOAT", values));
    write(entries);
    final TrainedNetwork read = NetworkBuilder.plain(NetworkFiles.read(file).model(), SHAPE);
    assertArrayEquals(
        new float[] {.25f, .25f, .25f, .25f, .25f, .25f}, read.layers().get(0).plus());
  }

  @Test
  void refusesABombOfZeros() throws IOException {
    final Map<String, byte[]> entries = entries();
    entries.put("coefficients.bin", new byte[64 << 20]);
    refused(entries, "larger than");
  }

  @Test
  void refusesUnsoundFields() throws IOException {
    final Map<String, byte[]> good = entries();
    final String text = new String(good.get("configuration.json"), StandardCharsets.UTF_8);
    final Map<String, String> changes =
        Map.of(
            "\"slots\" : 4", "\"slots\" : -1",
            "\"points\" : 3", "\"points\" : -1",
            "\"maximumCount\" : 1", "\"maximumCount\" : 2147483647",
            "\"clip\" : 9.0", "\"clip\" : 0.0",
            "\"surrogateWidth\" : 1.0", "\"surrogateWidth\" : -1.0",
            "\"nout\" : 3", "\"nout\" : 4");
    for (final Map.Entry<String, String> change : changes.entrySet()) {
      final String changed = text.replace(change.getKey(), change.getValue());
      assertTrue(!changed.equals(text), change.getKey());
      final Map<String, byte[]> entries = new LinkedHashMap<>(good);
      entries.put("configuration.json", changed.getBytes(StandardCharsets.UTF_8));
      refused(entries, "layer");
    }
  }

  @Test
  void refusesTruncatedParametersAndOtherFiles() throws IOException {
    final Map<String, byte[]> entries = entries();
    final byte[] whole = entries.get("coefficients.bin");
    entries.put("coefficients.bin", java.util.Arrays.copyOf(whole, whole.length - 4));
    refused(entries, "bytes");
    Files.writeString(file, "not a zip");
    assertThrows(NetworkFileException.class, () -> NetworkFiles.read(file));
  }

  @Test
  void refusesAFileCutShortAnywhere() throws IOException {
    final byte[] whole = Files.readAllBytes(file);
    for (int length = 0; length < whole.length / 2; length += 97) {
      Files.write(file, java.util.Arrays.copyOf(whole, length));
      assertThrows(NetworkFileException.class, () -> NetworkFiles.read(file), length + " bytes");
    }
  }

  @Test
  void refusesUnsoundSpreadsTablesAndGains() throws IOException {
    for (final Map.Entry<String, String> change :
        Map.of(
                "\"writeError\" : 0.01", "\"writeError\" : -0.01",
                "\"mismatch\" : 0.1", "\"mismatch\" : \"NaN\"",
                "\"gridDrive\" : 10.0", "\"gridDrive\" : \"Infinity\"",
                "\"libraryDigest\" : \"abc\"", "\"libraryDigest\" : null",
                "\"mean\" : [ 0.0", "\"mean\" : [ \"NaN\"")
            .entrySet()) {
      refusedConfiguration(change.getKey(), change.getValue(), "unsound");
    }
  }

  @Test
  void refusesAConfigurationWithoutLayers() throws IOException {
    refusedConfiguration("\"confs\"", "\"others\"", "cannot read");
  }

  /** Ten thousand brackets: a reader that recursed freely would overflow its stack. */
  @Test
  void refusesDeepNesting() throws IOException {
    refusedConfiguration("{", "{\"deep\":" + "[".repeat(10_000) + "]".repeat(10_000) + ",", "JSON");
  }

  @Test
  void anotherShapeIsNotTakenForTheSettings() throws IOException {
    final MultiLayerNetwork model = NetworkFiles.read(file).model();
    for (final NetworkSettings other :
        List.of(
            new NetworkSettings(new int[] {4}, 4, NetworkSettings.Output.WEIGHTED_SUM, 8, 4),
            new NetworkSettings(new int[] {3}, 5, NetworkSettings.Output.WEIGHTED_SUM, 8, 4),
            new NetworkSettings(new int[] {3}, 4, NetworkSettings.Output.DEVICE, 8, 4),
            new NetworkSettings(new int[] {3, 3}, 4, NetworkSettings.Output.WEIGHTED_SUM, 8, 4))) {
      assertThrows(IllegalArgumentException.class, () -> NetworkBuilder.plain(model, other));
    }
  }

  private void refusedConfiguration(String from, String to, String word) throws IOException {
    writeOne();
    final Map<String, byte[]> entries = entries();
    final String text = new String(entries.get("configuration.json"), StandardCharsets.UTF_8);
    final int place = text.indexOf(from);
    assertTrue(place >= 0, from);
    final String changed = text.substring(0, place) + to + text.substring(place + from.length());
    entries.put("configuration.json", changed.getBytes(StandardCharsets.UTF_8));
    refused(entries, word);
  }

  private void write(Map<String, byte[]> entries) throws IOException {
    try (ZipOutputStream zip = new ZipOutputStream(Files.newOutputStream(file))) {
      for (final Map.Entry<String, byte[]> entry : entries.entrySet()) {
        zip.putNextEntry(new ZipEntry(entry.getKey()));
        zip.write(entry.getValue());
        zip.closeEntry();
      }
    }
  }

  private void refused(Map<String, byte[]> entries, String word) throws IOException {
    write(entries);
    final NetworkFileException e =
        assertThrows(NetworkFileException.class, () -> NetworkFiles.read(file));
    assertTrue(e.getMessage().contains(word), e.getMessage());
    assertTrue(e.getMessage().contains("network.zip"), e.getMessage());
  }

  private Map<String, byte[]> entries() throws IOException {
    final Map<String, byte[]> entries = new LinkedHashMap<>();
    try (ZipFile zip = new ZipFile(file.toFile())) {
      for (final ZipEntry entry : java.util.Collections.list(zip.entries())) {
        entries.put(entry.getName(), zip.getInputStream(entry).readAllBytes());
      }
    }
    return entries;
  }
}
