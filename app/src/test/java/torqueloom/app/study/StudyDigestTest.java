package torqueloom.app.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What changes a study's digest, and what does not. */
class StudyDigestTest {
  @TempDir Path folder;

  private String digest(String text) throws Exception {
    return Studies.read(folder, text).digest();
  }

  @Test
  void isSixtyFourLowerCaseHexDigits() throws Exception {
    assertTrue(digest(Studies.full()).matches("[0-9a-f]{64}"));
  }

  @Test
  void commentsOrderAndWrittenDefaultsDoNotChangeIt() throws Exception {
    final String text = Studies.full();
    final String moved =
        text.replace("seed: 42\n", "")
            .replace("budget: {chips: 512}", "budget: {chips: 512}\nseed: 42");
    assertEquals(digest(text), digest("# another comment\n" + text));
    assertEquals(digest(text), digest(moved));
    assertEquals(digest(text), digest(text.replace("  patience: 20\n", "")));
    assertEquals(digest(text), digest(text.replace("\n  gain: auto", "")));
  }

  @ParameterizedTest
  @CsvSource({
    "seed: 42, seed: 43",
    "damping: 0.1, damping: 0.10000000000000002",
    "slots: 8, slots: 9",
    "chips: 1000, chips: 1001",
    "gain: auto, gain: 100",
    "retrim: true, retrim: false"
  })
  void anyValueChangesIt(String before, String after) throws Exception {
    final String text = Studies.full();
    assertTrue(text.contains(before), before);
    assertNotEquals(digest(text), digest(text.replace(before, after)));
  }

  @Test
  void oneByteOfTheDataChangesItAndItsNameDoesNot() throws Exception {
    final String text = Studies.full();
    final Path file = Studies.write(folder, text);
    final String before = StudyFile.read(file, Use.CHIPS, OptionalLong.empty()).digest();
    Files.move(folder.resolve("task.csv"), folder.resolve("other.csv"));
    Files.writeString(file, text.replace("task.csv", "other.csv"));
    assertEquals(before, StudyFile.read(file, Use.CHIPS, OptionalLong.empty()).digest());
    Files.writeString(folder.resolve("other.csv"), "a,state\n0.1,on\n0.8,off\n");
    assertNotEquals(before, StudyFile.read(file, Use.CHIPS, OptionalLong.empty()).digest());
  }

  @Test
  void seedOverrideCountsAsIfItStoodInTheStudy() throws Exception {
    final String text = Studies.full();
    final Path file = Studies.write(folder, text);
    final String overridden = StudyFile.read(file, Use.CHIPS, OptionalLong.of(5)).digest();
    assertEquals(overridden, digest(text.replace("seed: 42", "seed: 5")));
  }

  @Test
  void minusZeroIsZero() throws Exception {
    final String text = Studies.full();
    assertEquals(digest(text), digest(text.replace("bias: 0 A/m^2", "bias: -0 A/m^2")));
  }
}
