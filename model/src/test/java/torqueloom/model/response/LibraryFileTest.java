package torqueloom.model.response;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import torqueloom.model.table.CanonicalJson;
import torqueloom.model.table.CsvFiles;
import torqueloom.model.table.FileContentException;
import torqueloom.model.table.JsonFields;
import torqueloom.model.table.JsonReader;
import torqueloom.model.table.NpyArray;
import torqueloom.model.table.NpyFiles;
import torqueloom.model.work.Progress;
import torqueloom.model.work.RunStore;
import torqueloom.model.work.UnitExecutor;

class LibraryFileTest {
  private static final Calibration CALIBRATION =
      CalibratorTest.calibration(FakeNeuron.NOMINAL, 4, 7);
  private static final ResponseLibrary LIBRARY = FakeNeuron.library(CALIBRATION);

  @TempDir private Path folder;

  @Test
  void readsBackToTheLastBit() throws IOException {
    final Path path = folder.resolve(LibraryFile.NAME);
    LibraryFile.write(path, LIBRARY);
    final ResponseLibrary back = LibraryFile.read(path);
    assertArrayEquals(
        CanonicalJson.bytes(LibraryFile.document(LIBRARY)),
        CanonicalJson.bytes(LibraryFile.document(back)));
    assertEquals(LIBRARY.temperatures(), back.temperatures());
    for (int i = 0; i < LIBRARY.curves().size(); i++) {
      final ResponseCurve wanted = LIBRARY.curves().get(i);
      final ResponseCurve found = back.curves().get(i);
      assertArrayEquals(wanted.drive(), found.drive());
      assertArrayEquals(wanted.latencySeconds(), found.latencySeconds());
      assertArrayEquals(wanted.jitterSeconds(), found.jitterSeconds());
      assertArrayEquals(wanted.counts(), found.counts());
      assertEquals(wanted.halfTurns(), found.halfTurns());
      assertEquals(wanted.previousDrive(), found.previousDrive());
      assertArrayEquals(LIBRARY.instances().get(i).features(), back.instances().get(i).features());
    }
  }

  @Test
  void isReusedOnlyForTheSameCalibration() throws IOException {
    final Path path = folder.resolve(LibraryFile.NAME);
    assertTrue(LibraryFile.reusable(path, LIBRARY.digest()).isEmpty());
    LibraryFile.write(path, LIBRARY);
    assertTrue(LibraryFile.reusable(path, LIBRARY.digest()).isPresent());
    assertTrue(LibraryFile.reusable(path, "other").isEmpty());
    Files.writeString(
        path, Files.readString(path).replaceFirst("\"trials\": \\[128", "\"trials\": [127"));
    assertTrue(LibraryFile.reusable(path, LIBRARY.digest()).isEmpty());
    assertThrows(FileContentException.class, () -> LibraryFile.read(path));
  }

  @Test
  void documentHasTheKeysOfTheContract() throws IOException {
    final String text = CanonicalJson.text(ResponseJson.document(LIBRARY));
    final JsonFields document = JsonFields.of(JsonReader.parse(text, "text"), "text");
    assertEquals(1, document.integer("schema"));
    assertEquals(Set.of("schema", "response"), document.names());
    final List<JsonFields> entries = document.objects("response");
    assertEquals(12, entries.size());
    assertEquals(
        List.of(
            "instance",
            "temperatureKelvin",
            "pulseSeconds",
            "driveUnit",
            "restLevel",
            "previousDrive",
            "drive",
            "trials",
            "countsFrom",
            "counts",
            "halfTurns",
            "latencySeconds",
            "jitterSeconds"),
        List.copyOf(entries.get(0).names()));
    assertEquals("A/m^2", entries.get(0).text("driveUnit"));
    assertTrue(text.contains("\"previousDrive\": null"));
    assertEquals(128, entries.get(0).objects("halfTurns").get(0).integer("0"));
  }

  @Test
  void threadsAndStoreChangeNothing() throws Exception {
    final byte[] wanted = CanonicalJson.bytes(LibraryFile.document(LIBRARY));
    final Calibrator calibrator = new Calibrator(CALIBRATION);
    try (RunStore store = RunStore.open(folder)) {
      final ResponseLibrary first = calibrator.calibrate(new UnitExecutor(2, store, Progress.NONE));
      assertArrayEquals(wanted, CanonicalJson.bytes(LibraryFile.document(first)));
      assertEquals(calibrator.units() + 1, store.size());
      final ResponseLibrary second =
          calibrator.calibrate(
              new UnitExecutor(
                  1,
                  store,
                  (stage, done, total, note) -> assertEquals(total, done, "all were stored")));
      assertArrayEquals(wanted, CanonicalJson.bytes(LibraryFile.document(second)));
    }
  }

  @Test
  void writesTables() throws IOException {
    final Path csv = folder.resolve("response.csv");
    ResponseTables.writeCsv(csv, LIBRARY);
    assertEquals(1 + 12 * 24, Files.readAllLines(csv).size());
    assertTrue(CsvFiles.read(csv).header().containsAll(List.of("meanCount", "p1", "p1Low")));
    final Path npy = folder.resolve("response.npy");
    final Path drives = folder.resolve("response-drives.npy");
    ResponseTables.writeNpy(npy, drives, LIBRARY);
    final NpyArray p = NpyFiles.read(npy);
    assertArrayEquals(new int[] {3, 4, 24}, NpyFiles.read(drives).shape());
    final int width = p.shape()[3];
    double sum = 0;
    for (int n = 0; n < width; n++) {
      sum += p.values()[((2 * 4 + 3) * 24 + 17) * width + n];
    }
    assertEquals(1, sum, 1e-12);
    assertEquals(
        LIBRARY.curves().get(11).probability(17, 1),
        p.values()[((2 * 4 + 3) * 24 + 17) * width + 1]);
  }
}
