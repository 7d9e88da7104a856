package torqueloom.app.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Every fault is found, stands where it is, and says what would be right. */
class BadStudyTest {
  @TempDir Path folder;

  private List<Problem> problems(String text) throws IOException {
    return assertThrows(StudyException.class, () -> Studies.read(folder, text)).problems();
  }

  /** One change to a good study gives one fault of one field, whose text has the given words. */
  @ParameterizedTest(name = "{1}")
  @CsvSource(
      delimiter = '|',
      value = {
        "thickness: 4 nm | thickness: 1.3 | device.film.thickness | found \"1.3\"|1.3 nm",
        "thickness: 4 nm | thickness: -4 nm | device.film.thickness | found -4 nm|at least 0.1 nm",
        "thickness: 4 nm | thickness: 0 nm | device.film.thickness | found 0 nm|at least 0.1 nm",
        "thickness: 4 nm | thickness: 4 ns | device.film.thickness | unit of a time|a length",
        "thickness: 4 nm | thickness: 4 nmm | device.film.thickness | found \"4 nmm\"|length",
        "thickness: 4 nm | thickness: 1,5 nm | device.film.thickness | found \"1,5 nm\"|length",
        "thickness: 4 nm | thickness: NaN nm | device.film.thickness | not finite|length",
        "thickness: 4 nm | thickness: [4 nm] | device.film.thickness | found a list|length",
        "thickness: 4 nm | thickness: {a: 1} | device.film.thickness | found a block|length",
        "thickness: 4 nm | thickness: | device.film.thickness | found nothing|length",
        "damping: 0.1 | damping: 0 | device.film.damping | found 0|more than 0",
        "damping: 0.1 | damping: 1.1 | device.film.damping | found 1.1|at most 1",
        "damping: 0.1 | damping: .nan | device.film.damping | .nan|not finite",
        "damping: 0.1 | damping: .inf | device.film.damping | .inf|not finite",
        "damping: 0.1 | damping: 1e999 | device.film.damping | 1e999|double precision",
        "damping: 0.1 | dampng: 0.1 | device.film.dampng | unknown key|nearest known key: damping",
        "chips: 1000 | Chips: 1000 | evaluation.Chips | unknown key|nearest known key: chips",
        "slots: 8 | 'slots: 8\n  slots: 9' | network.slots | duplicate key|first in line",
        "slots: 8 | slots: 2.5 | network.slots | found \"2.5\"|a whole number",
        "slots: 8 | slots: 0 | network.slots | found 0|from 1",
        "hidden: [48, 12] | hidden: [48, x] | network.hidden[1] | found \"x\"|a whole number",
        "hidden: [48, 12] | hidden: [] | network.hidden | a list of 0|a list",
        "hidden: [48, 12] | hidden: 48 | network.hidden | found \"48\"|a list",
        "retrim: true | retrim: yes | trim.retrim | found \"yes\"|true or false",
        "shape: rectangle | shape: rectangl | device.outline.shape | one of rectangle|nearest",
        "slot: 10 ns | slot: 0.4 ns | protocol.slot | found 400 ps|at least the pulse, 500 ps",
        "count-high: 0.3 | count-high: -0.5 | device.readout.count-high | -0.5|more than count-low",
        "train: 60 % | train: 70 % | task.split | 110 %|100 % is needed",
        "seed: 42 | seed: 9007199254740992 | seed | found 9007199254740992|to 9007199254740991",
        "seed: 42 | seed: -1 | seed | found -1|from 0",
        "curie-temperature: 1100 K | curie-temperature: 305 K | device.film.temperature-law.curie-temperature | 305 K|310 K",
        "temperatures: [290 K, 300 K, 310 K] | temperatures: [300 K, 300 K] | evaluation.temperatures | twice|different",
        "unit-drive: 3.9e10 A/m^2 | unit-drive: 8e11 A/m^2 | synapse.unit-drive | found 8|maximum-drive",
        "spin-hall-angle: 25 % | spin-hall-angle: 0 | device.drive.spin-hall-angle | found 0|another",
        "magnetization: 800 kA/m | magnetization: 8 kA/m | device.film.interface-anisotropy | 86.2 T|20.0 T",
        "maximum-drive: 7.8e11 | maximum-drive: 9e14 | protocol.maximum-drive | found 9e14|at most 1e14",
        "levels: 32 | levels: 1 | synapse.levels | found 1|from 2",
        "accuracy: 90 % | accuracy: 100 % | targets.accuracy | found 100 %|less than 100 %",
        "input-levels: 0 | input-levels: 1 | network.input-levels | found 1|at least 2",
        "chip: 4 mT | chip: 140 mT | synapse.junction.tolerances.anisotropy-field.chip | 140 mT|0 to 100 %",
        "chip: 4 mT | chip: -1 % | synapse.junction.tolerances.anisotropy-field.chip | -1 %|0 to 100 %",
        "torqueloom: 1 | torqueloom: 2 | torqueloom | found 2|the number 1",
        "data: task.csv | data: gone.csv | task.data | gone.csv|no such file",
        "data: task.csv | data: . | task.data | not a file|can be read",
        "data: task.csv | train: task.csv | task.train | without test|both",
      })
  void oneFault(String before, String after, String field, String words) throws IOException {
    check(before, after, field, words.split("\\|"));
  }

  private void check(String before, String after, String field, String... words)
      throws IOException {
    final String text = Studies.full();
    assertTrue(text.contains(before), "the good study lacks " + before);
    final List<Problem> problems = problems(text.replace(before, after));
    assertEquals(1, problems.size(), problems.toString());
    assertEquals(field, problems.get(0).field());
    for (final String word : words) {
      assertTrue(problems.get(0).text().contains(word), word + " in: " + problems.get(0).text());
    }
  }

  /** What would change the meaning of a result is refused, with what this version computes. */
  @ParameterizedTest
  @CsvSource({
    "kind: easy-plane-ferromagnet, kind: josephson-junction, device.kind, easy-plane-ferromagnet",
    "kind: junction, kind: island, synapse.kind, junction",
    "kind: feed-forward, kind: reservoir, network.kind, feed-forward",
    "encoder: amplitude, encoder: rate, network.encoder, amplitude",
    "polarity: unipolar, polarity: bipolar, protocol.polarity, unipolar",
    "surrogate: response, surrogate: arctan, training.surrogate, response",
    "method: surrogate-gradient, method: stdp, training.method, surrogate-gradient"
  })
  void laterChoicesAreRefused(String before, String after, String field, String computed)
      throws IOException {
    final List<Problem> problems = problems(Studies.full().replace("  " + before, "  " + after));
    assertEquals(1, problems.size(), problems.toString());
    assertEquals(field, problems.get(0).field());
    assertTrue(problems.get(0).text().contains("does not compute yet; it computes " + computed));
  }

  @Test
  void severalTemperaturesNeedALaw() throws IOException {
    check(
        "{magnetization: bloch, curie-temperature: 1100 K, anisotropy-exponent: 2.2}",
        "none",
        "device.film.temperature-law",
        "290 K, 300 K, 310 K",
        "law");
  }

  @Test
  void allFaultsComeAtOnceInTheOrderOfTheFileWithTheirPlaces() throws IOException {
    final List<Problem> problems =
        problems(
            Studies.full()
                .replace("thickness: 4 nm", "thickness: 1.3")
                .replace("damping: 0.1\n", "dampng: 0.1\n")
                .replace("slot: 10 ns", "slot: 0.4 ns"));
    assertEquals(3, problems.size(), problems.toString());
    assertEquals(
        List.of("device.film.thickness", "device.film.dampng", "protocol.slot"),
        problems.stream().map(Problem::field).toList());
    assertEquals(10, problems.get(0).line());
    assertEquals(16, problems.get(0).column());
    assertEquals(12, problems.get(1).line());
    assertEquals(5, problems.get(1).column());
    assertTrue(
        problems
            .get(0)
            .format()
            .matches("(?s).*study\\.yaml:10:16  device\\.film\\.thickness\\n    .*"));
  }

  @Test
  void keyInTheWrongBlockIsSentToItsOwn() throws IOException {
    final List<Problem> problems =
        problems(
            Studies.full()
                .replace("  bias-field: 40 Oe", "  bias-field: 40 Oe\n  resistivity: 1 ohm m"));
    assertEquals(1, problems.size());
    assertTrue(problems.get(0).text().contains("belongs under device.film"), problems.toString());
  }

  @Test
  void missingRequiredKeyStandsAtItsBlock() throws IOException {
    final List<Problem> problems = problems(Studies.full().replace("    thickness: 4 nm\n", ""));
    assertEquals(1, problems.size());
    assertEquals("device.film.thickness", problems.get(0).field());
    assertEquals(8, problems.get(0).line());
    assertTrue(problems.get(0).text().contains("missing"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        " \n\n",
        "# only a comment\n",
        "just text",
        "- a\n- b\n",
        "a: [1, 2",
        "a: b: c",
        "a: \"open",
        "\tx: 1",
        "a: &x 1\nb: *x\n",
        "a: !!java.net.URL [http://x]\n",
        "{a: 1}}",
        "---\na: 1\n---\nb: 2\n",
        "? [1, 2]\n: 3\n",
        "a: \u0007\n"
      })
  void whatIsNoStudyIsOneClearFault(String text) throws IOException {
    final Path file = Files.writeString(folder.resolve("odd.yaml"), text);
    final StudyException e =
        assertThrows(
            StudyException.class, () -> StudyFile.read(file, Use.DEVICE, OptionalLong.empty()));
    assertTrue(e.getMessage().contains("odd.yaml"), e.getMessage());
  }

  @Test
  void deepAndLargeFilesAreRefused() throws IOException {
    final Path deep = Files.writeString(folder.resolve("deep.yaml"), "[".repeat(100_000));
    final Path large = Files.write(folder.resolve("large.yaml"), new byte[(1 << 20) + 1]);
    final Path latin =
        Files.write(folder.resolve("latin.yaml"), new byte[] {'a', ':', (byte) 0xB5});
    assertTrue(fault(deep).contains("deep"));
    assertTrue(fault(large).contains("at most"));
    assertTrue(fault(latin).contains("UTF-8"));
    assertTrue(fault(folder.resolve("gone.yaml")).contains("no such file"));
    assertTrue(fault(folder).contains("is not a file"));
  }

  private static String fault(Path file) {
    return assertThrows(
            StudyException.class, () -> StudyFile.read(file, Use.DEVICE, OptionalLong.empty()))
        .getMessage();
  }
}
