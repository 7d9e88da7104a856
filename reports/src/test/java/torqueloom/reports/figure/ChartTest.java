package torqueloom.reports.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.StringReader;
import java.util.List;
import java.util.Locale;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Document;
import org.xml.sax.InputSource;

class ChartTest {
  private static final double NAN = Double.NaN;
  private static final Style STYLE = Palette.series(0);

  static List<Mark> awkwardMarks() {
    final double[] none = {};
    final double[] nan = {NAN, NAN};
    final double[] mixed = {0, NAN, 1, Double.POSITIVE_INFINITY, -2};
    return List.of(
        LineMark.curve("none", none, none, STYLE),
        LineMark.curve("nan", nan, nan, STYLE),
        LineMark.curve("mixed", mixed, mixed, STYLE),
        new LineMark("bars", mixed, mixed, mixed, mixed, true, Palette.series(1)),
        new BandMark("none", none, none, none, STYLE),
        new BandMark("mixed", mixed, mixed, mixed, STYLE),
        new StepMark("none", new double[] {0}, none, true, STYLE),
        new StepMark("nan", new double[] {0, 1, 2}, nan, true, STYLE),
        new StepMark("open", new double[] {0, 1, 2}, new double[] {1, 3}, false, STYLE),
        new SwarmMark("none", 0, 1, none, STYLE),
        new SwarmMark("mixed", 0, 1, mixed, STYLE),
        new SwarmMark("equal", 0, 1, new double[400], STYLE),
        BoxMark.of("none", 0, 1, none, STYLE),
        BoxMark.of("one", 0, 1, new double[] {0.5}, STYLE),
        new RuleMark("nan", NAN, false, STYLE),
        new RuleMark("upright", 3, true, STYLE),
        new BarMark("nan", new double[] {0, 1}, nan, new String[] {"a", "b"}, STYLE),
        new HeatMark("none", "%", new double[0][], 0, 1),
        new HeatMark("mixed", "%", new double[][] {{0, NAN}, {0.5, 2}}, 0, 1));
  }

  private static Document parse(String svg) throws Exception {
    return DocumentBuilderFactory.newInstance()
        .newDocumentBuilder()
        .parse(new InputSource(new StringReader(svg)));
  }

  @ParameterizedTest
  @MethodSource("awkwardMarks")
  void awkwardDataBreakNeitherAxis(Mark mark) throws Exception {
    for (final Axis x : List.of(Axis.linear("x", "m"), Axis.logarithmic("x", "m"))) {
      for (final Axis y : List.of(Axis.linear("y", "s"), Axis.logarithmic("y", ""))) {
        final String svg = Chart.of("t", "d", x, y, List.of(mark)).svg("c");
        parse(svg);
        assertFalse(svg.contains("NaN") || svg.contains("Infinity"), svg);
      }
    }
  }

  @Test
  void chartWithoutMarksSaysSo() throws Exception {
    final Chart chart =
        Chart.of("t", "d", Axis.categories("", List.of()), Axis.linear("y", ""), List.of());
    assertTrue(parse(chart.svg("c")).getDocumentElement().getTextContent().contains("no data"));
  }

  @Test
  void namesAreEscapedAndMarksCarryTooltips() throws Exception {
    final double[] x = {1, 2};
    final Chart chart =
        Chart.of(
            "<b>&",
            "\"d\"",
            Axis.linear("drive", "mT"),
            Axis.linear("count", ""),
            List.of(LineMark.curve("</svg><script>", x, x, STYLE)));
    final Document svg = parse(chart.svg("c"));
    assertEquals(0, svg.getElementsByTagName("script").getLength());
    assertEquals("<b>&", svg.getElementsByTagName("title").item(0).getTextContent());
    assertEquals(
        "</svg><script>: drive 1 mT, count 1",
        svg.getElementsByTagName("circle").item(0).getFirstChild().getTextContent());
    assertEquals("img", svg.getDocumentElement().getAttribute("role"));
  }

  @Test
  void charactersDoNotDependOnTheLocale() {
    final double[] x = {0.5, 1234.5};
    final Chart chart =
        Chart.of(
            "t",
            "d",
            Axis.linear("x", "m"),
            Axis.linear("y", ""),
            List.of(LineMark.curve("c", x, x, STYLE)));
    final Locale before = Locale.getDefault();
    final String plain = chart.svg("c");
    try {
      Locale.setDefault(Locale.forLanguageTag("ar-EG"));
      assertEquals(plain, chart.svg("c"));
      Locale.setDefault(Locale.GERMANY);
      assertEquals(plain, chart.svg("c"));
    } finally {
      Locale.setDefault(before);
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "0 | 1 | 5 | 0.0 0.2 0.4 0.6 0.8 1.0",
        "0 | 7.8 | 8 | 0 1 2 3 4 5 6 7",
        "-0.3 | 0.3 | 4 | −0.2 0.0 0.2",
        "88.2 | 97.1 | 4 | 90.0 92.5 95.0",
        "0 | 1e-9 | 2 | 0 5×10⁻¹⁰ 1×10⁻⁹"
      })
  void linearTicksAreRoundNumbers(double low, double high, int most, String labels) {
    assertEquals(
        labels,
        String.join(" ", Ticks.linear(low, high, most).stream().map(Ticks.Tick::label).toList()));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "1 | 100 | 1 2 5 10 20 50 100",
        "1e-15 | 1e-9 | 10⁻¹⁵ 10⁻¹⁴ 10⁻¹³ 10⁻¹² 10⁻¹¹ 10⁻¹⁰ 10⁻⁹"
      })
  void logarithmicTicksAreDecades(double low, double high, String labels) {
    assertEquals(
        labels,
        String.join(" ", Ticks.logarithmic(low, high, 8).stream().map(Ticks.Tick::label).toList()));
  }

  @ParameterizedTest
  @CsvSource({"0.5, 3, 0.5", "1234567, 3, 1.23×10⁶", "-0.00012, 2, −1.2×10⁻⁴", "99.96, 3, 100"})
  void numbersKeepTheirSignificantDigits(double value, int digits, String text) {
    assertEquals(text, Numbers.significant(value, digits));
  }

  /** Neighbors of the ordered ramp must differ in lightness, whatever the reader sees of the hue. */
  @Test
  void orderedColorsGrowLighterStepByStep() {
    double before = -1;
    for (int i = 0; i <= 10; i++) {
      final double lightness = lightness(Palette.ramp(i / 10.0));
      assertTrue(lightness > before + 3, "step " + i + ": " + lightness + " after " + before);
      before = lightness;
    }
  }

  /** CIE lightness L* of a color (IEC 61966-2-1 for the transfer curve, CIE 15 for L*; from memory). */
  private static double lightness(String color) {
    final double[] weights = {0.2126, 0.7152, 0.0722};
    double y = 0;
    for (int c = 0; c < 3; c++) {
      final double s = Integer.parseInt(color.substring(1 + 2 * c, 3 + 2 * c), 16) / 255.0;
      y += weights[c] * (s <= 0.04045 ? s / 12.92 : Math.pow((s + 0.055) / 1.055, 2.4));
    }
    return y > 0.008856 ? 116 * Math.cbrt(y) - 16 : 903.3 * y;
  }
}
