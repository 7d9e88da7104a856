package torqueloom.reports.feasibility;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import torqueloom.reports.document.Span;
import torqueloom.training.study.StudyResult;

class VerdictTextTest {
  @Test
  void metNamesTheTargetsAndTheWorstTemperature() {
    final List<String> lines = VerdictText.lines(InventedStudy.met().build());
    assertEquals(3, lines.size());
    assertEquals(
        "Targets met: at every temperature at least 90 % of the chips reach an accuracy of 90 %, at "
            + "95 % confidence.",
        lines.get(0));
    assertTrue(lines.get(1).contains("98.5 % (97.3 to 99.7 %) on this test set"), lines.get(1));
    assertTrue(lines.get(1).contains("on new cases"), lines.get(1));
    assertTrue(lines.get(1).contains("logistic regression 87.1 %"), lines.get(1));
    lines.forEach(line -> assertFalse(line.contains("\n"), line));
  }

  @Test
  void notMetNamesTolerancesImbalanceAndWhatAnAssumedTrimWouldChange() {
    final StudyResult result = InventedStudy.notMet().build();
    final List<String> lines = VerdictText.lines(result);
    assertTrue(lines.get(0).startsWith("Targets not met: "), lines.get(0));
    assertTrue(lines.get(0).contains("290 K, 300 K and 310 K"), lines.get(0));
    assertTrue(lines.get(2).contains("15.0 points"), lines.get(2));
    final List<String> causes = Diagnosis.causes(new StudyFacts(result));
    assertTrue(causes.get(1).contains("imbalance D = B_z − B_x"), causes.get(1));
    assertTrue(causes.get(2).contains("34.0 %"), causes.get(2));
    final String trim = TrimWords.sentence(result);
    assertTrue(trim.startsWith("Trim is not part of this proposal"), trim);
    assertTrue(trim.contains("92.8 % instead of 78.0 %"), trim);
    assertTrue(trim.contains("±30.0 µJ/m² in 64 levels"), trim);
  }

  @Test
  void toleranceLossThatDoesNotShowIsNotCalledACost() {
    final List<String> causes =
        Diagnosis.causes(new StudyFacts(InventedStudy.met().loss(-0.001).build()));
    assertTrue(causes.get(1).contains("cost no accuracy that shows"), causes.get(1));
    assertTrue(causes.get(1).contains("−0.1 points, −0.5 to 0.3"), causes.get(1));
  }

  @Test
  void idealNetworkBelowTheTargetIsTheCause() {
    final List<String> causes =
        Diagnosis.causes(new StudyFacts(InventedStudy.notMet().ideal(0.86).build()));
    assertTrue(causes.get(0).contains("network reaches only 86.0 %"), causes.get(0));
    assertTrue(causes.get(0).contains("learned on devices drawn"), causes.get(0));
    assertTrue(causes.get(1).contains("15.0 points"), causes.get(1));
  }

  @Test
  void missingPlateauIsNamed() {
    final List<String> causes =
        Diagnosis.causes(new StudyFacts(InventedStudy.notMet().smeared().build()));
    assertTrue(
        causes.stream().anyMatch(c -> c.contains("no clean one-count window")), causes.toString());
  }

  @Test
  void undecidedPassesOnWhatWouldDecide() {
    final StudyResult result = InventedStudy.undecided().build();
    final List<String> lines = VerdictText.lines(result);
    assertTrue(lines.get(0).startsWith("Undecided: whether at least 90 %"), lines.get(0));
    assertEquals("Invented advice.", lines.get(2));
    assertEquals(List.of(), new StudyFacts(InventedStudy.notMet().build()).advice());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "B_DL,c | B[DL,c]", "beta_c | β[c]", "Delta | Δ", "B_x, B_y, B_z | B[x], B[y], B[z]",
        "kT/(M_s V) | kT/(M[s] V)", "m_0 | m[0]", "t* | t*", "ΔK_i | ΔK[i]"
      })
  void symbolsAreSetWithTheirSubscripts(String typed, String printed) {
    final StringBuilder out = new StringBuilder();
    for (final Span span : Words.symbol(typed).spans()) {
      out.append(span.style() == Span.Style.SUBSCRIPT ? "[" + span.text() + "]" : span.text());
    }
    assertEquals(printed, out.toString());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "100 ohm um^2 | 100 Ω µm²",
        "7.8e11 A/m^2 | 7.8×10¹¹ A/m²",
        "3.2e6 K/W | 3.2×10⁶ K/W",
        "2.61 kohm | 2.61 kΩ",
        "20 uohm cm | 20 µΩ cm",
        "30.0 uJ/m^2 | 30.0 µJ/m²",
        "-200 uT | −200 µT",
        "2.5e-3 V/nm | 2.5×10⁻³ V/nm"
      })
  void typedUnitsBecomePrintedOnes(String typed, String printed) {
    assertEquals(printed, Words.pretty(typed));
  }
}
