package torqueloom.model.provenance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

class ProvenanceTest {

  @Test
  void theBuildFilledInItsVersions() {
    assertTrue(BuildVersions.program().matches("[0-9]+\\.[0-9]+\\.[0-9]+.*"));
    final Map<String, String> dependencies = BuildVersions.dependencies();
    assertEquals(
        List.of("deeplearning4j", "jackson", "javacpp", "openblas"),
        List.copyOf(dependencies.keySet()));
    assertFalse(dependencies.containsValue("unknown"), dependencies.toString());
  }

  @Test
  void describesThisProcess() {
    final Provenance provenance = Provenance.ofThisProcess("ab12", 20261, "scalar");
    assertEquals("ab12", provenance.studyDigest());
    assertEquals(20261, provenance.seed());
    assertEquals("scalar", provenance.kernel());
    assertEquals(System.getProperty("java.version"), provenance.javaVersion());
    assertEquals(System.getProperty("os.arch"), provenance.architecture());
    assertTrue(provenance.processorCount() >= 1);
    assertFalse(provenance.processor().isBlank());
  }

  @Test
  void theMapHoldsEveryFieldUnderItsName() {
    final Provenance provenance = Provenance.ofThisProcess("ab12", 1, "scalar");
    final Map<String, Object> map = provenance.asMap();
    assertEquals(1, map.get("schema"));
    assertEquals(Provenance.class.getRecordComponents().length + 1, map.size());
    for (final var component : Provenance.class.getRecordComponents()) {
      assertTrue(map.containsKey(component.getName()), component.getName());
    }
  }

  @Test
  void onlyVariablesThatChooseKernelsAreKept() {
    assertEquals(
        Map.of("OPENBLAS_CORETYPE", "Haswell"),
        Platform.kernelVariables(
            Map.of("OPENBLAS_CORETYPE", "Haswell", "HOME", "/home/x", "SECRET", "y")));
    assertEquals(Map.of(), Platform.kernelVariables(Map.of()));
  }

  @Test
  void processorModelIsFoundOrUnknown() {
    assertEquals(
        "Some CPU @ 2.0GHz",
        Platform.model(List.of("processor : 0", "model name\t: Some CPU @ 2.0GHz")));
    assertEquals("unknown", Platform.model(List.of("BogoMIPS : 50")));
  }
}
