package torqueloom.reports.feasibility;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.StringReader;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import javax.xml.parsers.DocumentBuilder;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Attr;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NamedNodeMap;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;
import torqueloom.reports.document.Table;
import torqueloom.reports.render.HtmlPage;
import torqueloom.reports.render.StageTime;
import torqueloom.training.study.StudyResult;
import torqueloom.training.study.TemperatureOutcome;

class FeasibilityReportTest {
  static List<StudyResult> studies() {
    return List.of(
        InventedStudy.met().build(),
        InventedStudy.notMet().build(),
        InventedStudy.undecided().build(),
        InventedStudy.met().ideal(0.85).smeared().build(),
        InventedStudy.met().temperatures(List.of(300.0)).build(),
        InventedStudy.met().temperatures(List.of()).build(),
        InventedStudy.met().chips(0).build());
  }

  private static RunFacts run() {
    final Map<String, String> facts = new LinkedHashMap<>();
    facts.put("Java", "17.0.15");
    facts.put("Platform", "Linux x86-64, 2 threads");
    return new RunFacts(
        facts, List.of(new StageTime("calibrate", 41.26), new StageTime("train", 20)));
  }

  private static String page(StudyResult result) {
    return HtmlPage.of(FeasibilityReport.of(result, run()));
  }

  private static Document parse(String page) throws Exception {
    final DocumentBuilder builder = DocumentBuilderFactory.newInstance().newDocumentBuilder();
    builder.setErrorHandler(null);
    return builder.parse(new InputSource(new StringReader(page)));
  }

  private static List<Element> elements(Document document) {
    final NodeList all = document.getElementsByTagName("*");
    return java.util.stream.IntStream.range(0, all.getLength())
        .mapToObj(i -> (Element) all.item(i))
        .toList();
  }

  @ParameterizedTest
  @MethodSource("studies")
  void pageIsWellFormedAndAsksNothingOfTheNetwork(StudyResult result) throws Exception {
    final String page = page(result);
    for (final Element element : elements(parse(page))) {
      assertFalse(
          Set.of("script", "link", "iframe", "img", "object", "embed", "base")
              .contains(element.getTagName()),
          element.getTagName());
      final NamedNodeMap attributes = element.getAttributes();
      for (int i = 0; i < attributes.getLength(); i++) {
        final Attr attribute = (Attr) attributes.item(i);
        assertFalse(attribute.getName().startsWith("on"), attribute.getName());
        if (attribute.getName().equals("href") || attribute.getName().equals("src")) {
          assertTrue(attribute.getValue().startsWith("#"), attribute.getValue());
        }
      }
    }
    assertFalse(page.contains("@import"));
    assertFalse(page.matches("(?s).*url\\((?!#).*"));
  }

  @ParameterizedTest
  @MethodSource("studies")
  void everyNameIsUniqueAndEveryReferenceResolves(StudyResult result) throws Exception {
    final Set<String> ids = new HashSet<>();
    final List<Element> elements = elements(parse(page(result)));
    for (final Element element : elements) {
      if (element.hasAttribute("id")) {
        assertTrue(ids.add(element.getAttribute("id")), element.getAttribute("id"));
      }
    }
    for (final Element element : elements) {
      for (final String id : element.getAttribute("aria-labelledby").split(" ")) {
        assertTrue(id.isEmpty() || ids.contains(id), id);
      }
      final String href = element.getAttribute("href");
      assertTrue(href.isEmpty() || ids.contains(href.substring(1)), href);
    }
  }

  @ParameterizedTest
  @MethodSource("studies")
  void headingsNeverSkipALevel(StudyResult result) throws Exception {
    int before = 0;
    int first = 0;
    for (final Element element : elements(parse(page(result)))) {
      if (element.getTagName().matches("h[1-6]")) {
        final int level = element.getTagName().charAt(1) - '0';
        assertTrue(level <= before + 1, "h" + level + " after h" + before);
        first += level == 1 ? 1 : 0;
        before = level;
      }
    }
    assertEquals(1, first);
  }

  @ParameterizedTest
  @MethodSource("studies")
  void picturesAreNamedAndHoldNoBrokenNumber(StudyResult result) throws Exception {
    int pictures = 0;
    for (final Element element : elements(parse(page(result)))) {
      if (element.getAttribute("role").equals("img")) {
        pictures++;
        assertEquals(1, element.getElementsByTagName("desc").getLength());
      }
      for (final String name : List.of("d", "x", "y", "x1", "y1", "cx", "cy", "width", "height")) {
        final String value = element.getAttribute(name);
        assertFalse(value.contains("NaN") || value.contains("Infinity"), value);
      }
    }
    assertTrue(pictures >= 6, "pictures: " + pictures);
  }

  @ParameterizedTest
  @MethodSource("studies")
  void sameResultGivesTheSameCharacters(StudyResult result) {
    assertEquals(page(result), page(result));
  }

  @Test
  void hostileNamesAreOnlyShown() throws Exception {
    final String hostile = "<script>alert('x')</script>\" onload=\"y & \u0001\uD800";
    final String page = page(InventedStudy.met().named(hostile).build());
    final Document document = parse(page);
    assertEquals(0, document.getElementsByTagName("script").getLength());
    final String heading = document.getElementsByTagName("h1").item(0).getTextContent();
    assertEquals("<script>alert('x')</script>\" onload=\"y & \uFFFD\uFFFD", heading);
  }

  @Test
  void numbersOfTheTablesComeFromTheResult() {
    final StudyResult result = InventedStudy.undecided().build();
    final List<Table> tables = FeasibilityReport.of(result, run()).tables();
    final Table answer = table(tables, "answer-table");
    for (int i = 0; i < result.chips().size(); i++) {
      final TemperatureOutcome outcome = result.chips().get(i);
      assertEquals(outcome.temperatureKelvin(), answer.rows().get(i).get(0).value());
      assertEquals(outcome.accuracies().length, answer.rows().get(i).get(1).value());
      assertEquals(outcome.median().estimate(), answer.rows().get(i).get(2).value());
      assertEquals(outcome.yield().estimate(), answer.rows().get(i).get(3).value());
      assertEquals("92.0 to 96.0 %", answer.rows().get(i).get(4).text().plain());
      assertEquals("82.0 to 100.0 %", answer.rows().get(i).get(5).text().plain());
    }
    final Table cost = table(tables, "cost-table");
    double sum = 0;
    for (int i = 0; i < 6; i++) {
      sum += cost.rows().get(i).get(1).value().doubleValue();
    }
    assertEquals(result.cost().totalJoules(), sum, 1e-12 * sum);
    assertEquals(result.cost().totalJoules(), cost.rows().get(6).get(1).value());
    assertEquals(41.26, table(tables, "time-table").rows().get(0).get(1).value());
    final Table device = table(tables, "device-table");
    assertEquals("4.02 mT", device.rows().get(3).get(2).text().plain());
    assertEquals("1.57×10¹¹ A/m²", device.rows().get(4).get(2).text().plain());
  }

  private static Table table(List<Table> tables, String id) {
    final Table found = tables.stream().filter(t -> t.id().equals(id)).findFirst().orElse(null);
    assertNotNull(found, id);
    return found;
  }
}
