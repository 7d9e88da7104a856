package torqueloom.model.synapse;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import torqueloom.model.device.DerivedQuantity;
import torqueloom.model.device.DeviceWarning;
import torqueloom.model.tolerance.Spread;

class SynapseModelTest {
  private static final SynapseModel MODEL =
      SynapseModel.of(JunctionSamples.settings(0.6, 32, true, JunctionSamples.DEMO), 300);

  /**
   * One per cent of resistance against a full-scale pair, sqrt(2) G 1 %/ΔG: computed independently
   * with numpy and scipy.special.ive at 300 K.
   */
  @ParameterizedTest
  @CsvSource({"0.6, 0.11154800139486426", "0.1, 0.7465383088773494"})
  void onePerCentOfResistance(double range, double expected) {
    final JunctionParameters junction =
        JunctionSamples.junction(Map.of("resistance-area", new Spread(0, 0.01)));
    final SynapseModel model =
        SynapseModel.of(JunctionSamples.settings(range, 32, true, junction), 300);
    assertEquals(expected, model.pairMismatch(), 1e-5 * expected);
    assertEquals(0, model.chipGainError());
  }

  /** Area goes as the diameter squared, so half the spread of diameter is that of resistance. */
  @Test
  void diameterCountsTwice() {
    final Map<String, Double> parts = MODEL.mismatchParts();
    assertEquals(parts.get("resistance-area"), parts.get("diameter"), 0.01 * parts.get("diameter"));
    final double sum = parts.values().stream().mapToDouble(x -> x * x).sum();
    assertEquals(Math.sqrt(sum), MODEL.pairMismatch(), 1e-15);
  }

  /** Derived here: dG/dB_k over ΔG for a small range is 1/(span), whatever the junction. */
  @Test
  void anisotropyMismatchIsTheFieldOverTheSpan() {
    final JunctionParameters junction =
        JunctionSamples.junction(Map.of("anisotropy-field", new Spread(0, 0.02)));
    final SynapseModel model =
        SynapseModel.of(JunctionSamples.settings(0.05, 32, true, junction), 300);
    assertEquals(Math.sqrt(2) * 0.02 / 0.05, model.pairMismatch(), 1e-3);
  }

  /** Derived here: a resistance common to the chip scales every conductance, so the gain by as much. */
  @Test
  void commonResistanceIsAGainError() {
    final JunctionParameters junction =
        JunctionSamples.junction(Map.of("resistance-area", new Spread(0.03, 0)));
    final SynapseModel model =
        SynapseModel.of(JunctionSamples.settings(0.6, 32, true, junction), 300);
    assertEquals(0.03, model.chipGainError(), 1e-6);
    assertEquals(0, model.pairMismatch());
  }

  @Test
  void quantizesToTheNearestLevel() {
    assertEquals(0, MODEL.quantize(0.4 / 31));
    assertEquals(1.0 / 31, MODEL.quantize(0.6 / 31));
    assertEquals(1, MODEL.quantize(1.2));
    assertEquals(0, MODEL.quantize(-0.1));
    for (int level = 0; level < 32; level++) {
      final double u = level / 31.0;
      assertEquals(u, MODEL.quantize(MODEL.quantize(u)));
    }
  }

  @Test
  void writeVerifyOnlyClips() {
    assertEquals(0.5, MODEL.programmed(0.5, 0.2, 0));
    assertEquals(0.51, MODEL.programmed(0.5, 0.2, 1), 1e-15);
    assertEquals(0.8, MODEL.programmed(1, -0.2, 0), 1e-15);
    assertEquals(-0.8, MODEL.programmed(-1, 0.2, 0), 1e-15);
    assertEquals(0.7, MODEL.programmed(1, 0.9, -0.2, 0), 1e-15);
    assertTrue(MODEL.outOfReach(1, 1, -0.2));
    assertFalse(MODEL.outOfReach(0.5, 1, -0.2));
  }

  @Test
  void blindProgrammingKeepsEveryError() {
    final SynapseModel blind =
        SynapseModel.of(JunctionSamples.settings(0.6, 32, false, JunctionSamples.DEMO), 300);
    assertEquals(1.1 * 0.5 + 0.2 + Math.sqrt(2) * 0.01, blind.programmed(0.5, 1.1, 0.2, 1), 1e-15);
    assertFalse(blind.outOfReach(1, 1, -0.2));
  }

  @Test
  void unlimitedSynapseChangesNothing() {
    final SynapseModel model = SynapseModel.of(JunctionSamples.unlimited(), 300);
    assertEquals(0.123456789, model.quantize(0.123456789));
    assertEquals(0.123456789, model.programmed(0.123456789, 0.5, 3));
    assertEquals(0, model.pairMismatch());
    assertEquals(0, model.readEnergyPerCount());
    assertEquals(0.25, model.weight(0.75, 0.5));
    assertTrue(model.summary(1e-17).warnings().isEmpty());
  }

  /**
   * Derived here by hand for the demo junction: 60 mT of 100 mT is 0.048 mJ/m² (ΔB Ms t/2), 1.6 V
   * over 2 nm at 60 fJ/(V m), at most 0.4 of breakdown.
   */
  @Test
  void summaryStatesTheRange() {
    final List<DerivedQuantity> all = MODEL.summary(2.5e-16).quantities();
    assertEquals(60, number(all, "tuningRangePercent"), 1e-12);
    assertEquals(0.06, number(all, "tuningRangeTesla"), 1e-15);
    assertEquals(4.8e-5, number(all, "tuningRangeJoulesPerSquareMeter"), 1e-17);
    assertEquals(1.6, number(all, "gateSpanVolts"), 1e-12);
    assertEquals(0.4, number(all, "gateFieldOverBreakdown"), 1e-12);
    assertEquals(0.06 / 31, number(all, "levelStepTesla"), 1e-15);
  }

  /** Derived here from G_P = 100.5 uS: 64 x 0.8923 G_P/(0.1131 G_P) and 3.9e10 x 2.5e-16 A over ΔG V. */
  @Test
  void summaryStatesTheLine() {
    final SynapseSummary summary = MODEL.summary(2.5e-16);
    final List<DerivedQuantity> all = summary.quantities();
    assertEquals(64 * 0.89233 / 0.11313, number(all, "commonModeWeights"), 0.05);
    assertEquals(9.75e-6 / (0.11313 * 100.531e-6 * 0.1), number(all, "inputGain"), 1e-3);
    assertEquals(
        List.of("synapse-common-mode", "synapse-line-drop"),
        summary.warnings().stream().map(DeviceWarning::code).toList());
  }

  @Test
  void refusesAnUnknownTolerance() {
    final IllegalArgumentException error =
        assertThrows(
            IllegalArgumentException.class,
            () -> JunctionSamples.junction(Map.of("color", new Spread(0, 0.1))));
    assertTrue(error.getMessage().contains("color"));
  }

  private static double number(List<DerivedQuantity> all, String key) {
    return all.stream()
        .filter(q -> q.key().equals(key))
        .map(q -> (Double) q.value())
        .findFirst()
        .orElseThrow();
  }
}
