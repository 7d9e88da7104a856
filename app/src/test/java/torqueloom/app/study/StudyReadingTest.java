package torqueloom.app.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import torqueloom.model.device.EasyPlaneFerromagnet;
import torqueloom.model.synapse.SynapseSettings;
import torqueloom.model.tolerance.Spread;
import torqueloom.training.study.StudyPlan;

/** What a good study yields. */
class StudyReadingTest {
  private static final String SMALL =
      """
      torqueloom: 1
      device:
        kind: easy-plane-ferromagnet
        film: {saturation-magnetization: 0.8 MA/m, thickness: 4 nm, damping: 0.1}
        outline: {shape: rectangle, length: 200 nm, width: 50 nm}
        drive: {spin-hall-angle: 0.25}
      protocol: {maximum-drive: 7.8e11 A/m^2, pulse: 0.5 ns, slot: 10 ns}
      """;

  @TempDir Path folder;

  /** Without this, a key could be in the schema and yet be refused by the reader. */
  @Test
  void everyKeyOfTheSchemaStandsInTheFullStudy() throws Exception {
    final Faults faults = new Faults("full");
    final Values values = new Values();
    final Path file = Studies.write(folder, Studies.full());
    new SchemaReader(Use.CHIPS, faults, values).read(YamlSource.read(file, "full"));
    faults.raise();
    final List<String> missing = new ArrayList<>();
    StudySchema.walk(
        (path, key) -> {
          final boolean otherForm =
              path.startsWith("task.data.") || List.of("task.train", "task.test").contains(path);
          if (!otherForm && !values.isWritten(path)) {
            missing.add(path);
          }
        });
    assertEquals(List.of(), missing);
  }

  @Test
  void fullStudyBecomesPlainValuesInSi() throws Exception {
    final StudyPlan plan = Studies.read(folder, Studies.full()).plan();
    final EasyPlaneFerromagnet device = (EasyPlaneFerromagnet) plan.device();
    assertEquals("Every key once", plan.name());
    assertEquals(42, plan.seed());
    assertEquals(8e5, device.film().saturationMagnetization());
    assertEquals(1.379e-3, device.film().interfaceAnisotropy());
    assertEquals(1.5e-6, device.film().resistivity());
    assertEquals(4e-3, device.biasField());
    assertEquals(0.25, device.drive().spinHallAngle());
    assertEquals(1e9, device.gate().breakdownField());
    assertEquals(5e-10, plan.protocol().pulse());
    assertEquals(new Spread(0.003, 0.001), plan.tolerances().spreads().get("thickness"));
    assertEquals(3e-5, plan.trim().orElseThrow().range());
    assertEquals(SynapseSettings.Kind.JUNCTION, plan.synapse().kind());
    assertEquals(List.of(290.0, 300.0, 310.0), plan.evaluation().temperatures());
    assertEquals(folder.resolve("task.csv"), plan.task().orElseThrow().data().orElseThrow());
    assertEquals(0.95, plan.targets().confidence());
  }

  /** 4 mT and 2 mT of 100 mT. */
  @Test
  void deviationsMayBeGivenInTheParametersUnit() throws Exception {
    final StudyPlan plan = Studies.read(folder, Studies.full()).plan();
    final Spread spread =
        plan.synapse().junction().orElseThrow().tolerances().get("anisotropy-field");
    assertEquals(0.04, spread.chip(), 1e-15);
    assertEquals(0.02, spread.device(), 1e-15);
  }

  @Test
  void toleranceKeysAreThoseOfTheDevice() throws Exception {
    final StudyPlan plan = Studies.read(folder, Studies.full()).plan();
    final List<String> keys =
        StudySchema.inner(StudySchema.find("tolerances").orElseThrow().type()).stream()
            .map(Key::name)
            .sorted()
            .toList();
    assertEquals(plan.device().toleranceParameters().stream().sorted().toList(), keys);
  }

  @Test
  void laterKeysAreNamed() throws Exception {
    final List<String> notices = Studies.read(folder, Studies.full()).notices();
    for (final String key :
        List.of("synapse.island", "evaluation.faults", "range", "budget", "replay")) {
      assertTrue(
          notices.contains(key + " is not used by this version yet"), key + " in " + notices);
    }
  }

  @Test
  void defectsThatAreAskedForButNotDrawnAreSaid() throws Exception {
    final Study study = Studies.read(folder, Studies.full().replace("dead: 0 %", "dead: 1 %"));
    assertTrue(study.notices().stream().anyMatch(n -> n.contains("drawn without defects")));
  }

  @Test
  void earlyStagesNeedOnlyTheirBlocks() throws Exception {
    final Path file = Studies.write(folder, SMALL);
    final Study study = StudyFile.read(file, Use.DEVICE, OptionalLong.empty());
    assertEquals("study", study.name());
    assertEquals(1, study.seed());
    assertEquals(folder.resolve("study.run"), study.defaultRunFolder());
    final StudyException e =
        assertThrows(
            StudyException.class, () -> StudyFile.read(file, Use.CHIPS, OptionalLong.empty()));
    assertEquals(
        List.of("network", "synapse", "targets", "task"),
        e.problems().stream().map(Problem::field).sorted().toList());
  }

  @Test
  void stripTakesTheOutlineAndTemperaturesTheDeviceAsDefault() throws Exception {
    final Study study =
        StudyFile.read(Studies.write(folder, SMALL + rest()), Use.CHIPS, OptionalLong.of(7));
    final EasyPlaneFerromagnet device = (EasyPlaneFerromagnet) study.device();
    assertEquals(200e-9, device.drive().stripLength());
    assertEquals(50e-9, device.drive().stripWidth());
    assertEquals(List.of(300.0), study.plan().evaluation().temperatures());
    assertEquals(7, study.seed());
  }

  private static String rest() {
    return """
    synapse: {unit-drive: 3.9e10 A/m^2}
    task: {data: task.csv, label: state}
    network: {hidden: [4]}
    targets: {accuracy: 90 %, yield: 0.9}
    """;
  }

  @ParameterizedTest
  @CsvSource({
    "0.8 MA/m, 800 kA/m",
    "0.8 MA/m, 8e5 A/m",
    "0.8 MA/m, '0.8e6 A m^-1'",
    "4 mT, 40 Oe",
    "4 mT, 0.004 T",
    "1.379 mJ/m^2, 1.379 mJ/m²",
    "1.379 mJ/m^2, 1.379 mJ/m2",
    "150 uohm cm, 150 µΩ cm",
    "150 uohm cm, 1.5e-6 ohm m",
    "10 ns, 10000 ps",
    "2 %, 0.02"
  })
  void spellingsOfOneValueGiveOneDigest(String first, String second) throws Exception {
    final String text =
        Studies.full()
            .replace("40 Oe", "4 mT")
            .replace("mJ/m²", "mJ/m^2")
            .replace("µΩ", "uohm")
            .replace("800 kA/m", "0.8 MA/m");
    assertTrue(text.contains(first), first);
    assertEquals(
        Studies.read(folder, text).digest(),
        Studies.read(folder, text.replace(first, second)).digest());
  }

  @Test
  void trainAndTestFilesStandInsteadOfData() throws IOException, StudyException {
    final String text =
        Studies.full().replace("data: task.csv", "train: task.csv\n  test: task.csv");
    final StudyPlan plan = Studies.read(folder, text).plan();
    assertTrue(plan.task().orElseThrow().data().isEmpty());
    assertEquals(plan.task().orElseThrow().train(), plan.task().orElseThrow().test());
  }
}
