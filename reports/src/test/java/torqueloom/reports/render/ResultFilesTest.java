package torqueloom.reports.render;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import torqueloom.model.provenance.Provenance;
import torqueloom.reports.document.Cell;
import torqueloom.reports.document.Table;
import torqueloom.reports.feasibility.FeasibilityReport;
import torqueloom.reports.feasibility.InventedStudy;
import torqueloom.reports.feasibility.ReportFolder;
import torqueloom.reports.feasibility.RunFacts;
import torqueloom.training.study.StudyResult;

class ResultFilesTest {
  /** The keys that outside scripts rely on stand first and in their fixed order. */
  @Test
  void promisedKeysComeFirstAndInOrder() {
    final Map<String, Object> tree = ResultsTree.of(InventedStudy.met().build());
    assertEquals(
        List.of(
            "schema",
            "study",
            "version",
            "verdict",
            "ideal",
            "baseline",
            "chips",
            "energyPerInferenceJoules",
            "latencySeconds"),
        new ArrayList<>(tree.keySet()).subList(0, 9));
    assertEquals(List.of("name", "seed", "digest"), keys(tree.get("study")));
    assertEquals("accuracy", keys(tree.get("ideal")).get(0));
    assertEquals("accuracy", keys(tree.get("baseline")).get(0));
    final Map<?, ?> chips = (Map<?, ?>) ((List<?>) tree.get("chips")).get(0);
    assertEquals(
        List.of(
            "temperatureKelvin",
            "count",
            "accuracies",
            "median",
            "low",
            "high",
            "yield",
            "yieldOnNewCases"),
        keys(chips).subList(0, 8));
    assertEquals(List.of("estimate", "low", "high"), keys(chips.get("yield")));
    assertEquals(List.of("estimate", "low", "high"), keys(chips.get("yieldOnNewCases")));
  }

  private static List<Object> keys(Object map) {
    return new ArrayList<>(((Map<?, ?>) map).keySet());
  }

  @Test
  void jsonIsTheSameBytesEveryTimeAndEndsWithOneNewline() {
    final String one = ResultFiles.resultsJson(InventedStudy.met().build());
    assertEquals(one, ResultFiles.resultsJson(InventedStudy.met().build()));
    assertTrue(one.endsWith("}\n") && !one.endsWith("\n\n"));
    assertTrue(one.startsWith("{\n  \"schema\": 1,"), one.substring(0, 40));
    assertTrue(one.contains("\"verdict\": \"met\""));
    assertTrue(one.contains("\"temperatureKelvin\": 290,"));
    assertFalse(one.contains("\r") || one.contains("scalar") || one.contains("NaN"));
  }

  @Test
  void formerResultIsKeptOnceAndOnlyWhenItDiffers(@TempDir Path folder) throws Exception {
    final StudyResult first = InventedStudy.met().build();
    ResultFiles.writeResults(folder, first);
    ResultFiles.writeResults(folder, first);
    final Path previous = folder.resolve("results.json.previous");
    assertFalse(Files.exists(previous));
    ResultFiles.writeResults(folder, InventedStudy.notMet().build());
    assertEquals(ResultFiles.resultsJson(first), Files.readString(previous));
    assertTrue(Files.readString(folder.resolve("results.json")).contains("\"not-met\""));
  }

  @Test
  void reportFolderHoldsThePageAndEveryTable(@TempDir Path folder) throws Exception {
    ResultFiles.writeReport(
        folder, FeasibilityReport.of(InventedStudy.notMet().build(), RunFacts.NONE));
    final byte[] page = Files.readAllBytes(folder.resolve("report.html"));
    assertTrue(new String(page, StandardCharsets.UTF_8).startsWith("<!DOCTYPE html>"));
    final List<String> device = Files.readAllLines(folder.resolve("tables/device-table.csv"));
    assertEquals("Quantity,Symbol,Value,SI unit", device.get(0));
    assertTrue(device.contains("threshold torque field,\"BDL,c\",0.00402,T"), device.toString());
    try (Stream<Path> files = Files.list(folder)) {
      assertTrue(files.noneMatch(f -> f.getFileName().toString().endsWith(".part")));
    }
  }

  @Test
  void provenanceAndTimingStandInTheirOwnFiles(@TempDir Path folder) throws Exception {
    final Map<String, String> facts = new LinkedHashMap<>();
    facts.put("java", "17");
    ResultFiles.writeProvenance(folder, facts);
    ResultFiles.writeTiming(
        folder, List.of(new StageTime("device", 0.25), new StageTime("train", 20)));
    assertEquals("{\n  \"java\": \"17\"\n}\n", Files.readString(folder.resolve("provenance.json")));
    final String timing = Files.readString(folder.resolve("timing.json")).replaceAll("\\s", "");
    assertEquals(
        "[{\"name\":\"device\",\"seconds\":0.25},{\"name\":\"train\",\"seconds\":20}]", timing);
  }

  @Test
  void folderOfAFinishedStudyHoldsEverything(@TempDir Path folder) throws Exception {
    final StudyResult result = InventedStudy.met().build();
    final Provenance provenance =
        new Provenance(
            "0.1.0",
            "ab12",
            7,
            "scalar",
            "17.0.15",
            "Invented VM 1",
            "Invented OS 2",
            "amd64",
            "Invented processor",
            2,
            Map.of("OMP_NUM_THREADS", "1"),
            Map.of());
    final Path page = ReportFolder.write(folder, result, provenance, Map.of("train", 1.5));
    final String text = Files.readString(page);
    assertTrue(text.contains("Invented processor, 2 for Java"));
    assertTrue(text.contains("OMP_NUM_THREADS 1"));
    assertFalse(text.contains("<dt>Libraries</dt>"));
    for (final String name : List.of("results.json", "provenance.json", "timing.json")) {
      assertTrue(Files.size(folder.resolve(name)) > 0, name);
    }
  }

  @Test
  void csvHoldsFullNumbersAndDisarmsFormulas() {
    final Table table =
        new Table(
            "sample",
            "A sample.",
            List.of(Table.Column.text("Name"), Table.Column.number("Energy", "J")),
            List.of(
                List.of(Cell.of("=1+1"), Cell.number("1.23 pJ", 1.2345678e-12)),
                List.of(Cell.of("a, \"b\""), Cell.number("unknown", Double.NaN))));
    assertEquals("Name,Energy (J)\n'=1+1,1.2345678e-12\n\"a, \"\"b\"\"\",\n", TableCsv.of(table));
  }
}
