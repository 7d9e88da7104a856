package torqueloom.model.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ShortestDecimalTest {

  @ParameterizedTest
  @CsvSource({
    "300.0, 300",
    "-0.3, -0.3",
    "5.0E-10, 5e-10",
    "0.1, 0.1",
    "1e-6, 0.000001",
    "1e-7, 1e-7",
    "7.8e11, 780000000000",
    "1e20, 100000000000000000000",
    "1e21, 1e21",
    "-1.5e300, -1.5e300",
    "9007199254740993, 9007199254740992",
    "0.30000000000000004, 0.30000000000000004",
    "4.9E-324, 5e-324",
    "1.7976931348623157E308, 1.7976931348623157e308",
    "2.2250738585072014E-308, 2.2250738585072014e-308",
    "-0.0, -0",
    "0.0, 0",
  })
  void writesAsEcmaScriptDoes(double value, String expected) {
    assertEquals(expected, ShortestDecimal.of(value));
  }

  /**
   * Numbers for which Double.toString is too long or not the closest before Java 19: the first is
   * the example of JDK-4511638, the second 2^-44 of R. Giulietti's paper on the remedy, both from
   * memory; the expected texts are those of Python 3's repr, which is shortest and closest.
   */
  @ParameterizedTest
  @CsvSource({
    "2.0E-3, 0.002",
    "1.1E23, 1.1e23",
    "2.0E23, 2e23",
    "2.2E-322, 2.2e-322",
    "5.684341886080802E-14, 5.684341886080802e-14",
    "9.5367431640625E-7, 9.5367431640625e-7",
    "8.41E21, 8.41e21",
    "2.2250738585072011E-308, 2.225073858507201e-308",
    "0x1.0000000000000p-44, 5.684341886080802e-14",
    "0x1.0000000000000p-970, 1.0020841800044864e-292",
    "0x1.0000000000000p+90, 1.2379400392853803e27",
    "0x1.0000000000000p-90, 8.077935669463161e-28",
    "0x1.0000000000000p-500, 3.054936363499605e-151",
    "0x1.0000000000000p+400, 2.5822498780869086e120",
    "0x1.ba8493ceb3ffdp+190, 2.7126267136355693e57",
    "0x1.1b1b48b529b4ap-756, 2.9176505403442687e-228",
    "0x1.dadfa5eb561a4p+852, 5.5705027106665415e256",
    "0x1.dc94f9a9a80fdp-53, 2.0668446752292503e-16",
    "0x1.95c7ea02f34a6p+166, 1.4826236772844953e50",
    "0x1.4491e10c67fd9p+217, 2.670405756230503e65",
    "0x1.4294f035efa25p+838, 2.3095972247362096e252",
    "0x1.fce2cd6645fa9p-63, 2.1552158160265848e-19",
    "0x1.01c7642650644p+105, 4.084669271327047e31",
    "0x1.b12133bfd1d33p-631, 1.89867543353284e-190",
    "0x1.b81c3fee29476p+445, 1.5619592075495646e134",
    "0x1.ea1da78633074p+84, 3.703210565721954e25",
  })
  void isShortestAndClosest(double value, String expected) {
    assertEquals(expected, ShortestDecimal.of(value));
  }

  /** Powers of two have the lopsided rounding intervals; any bit pattern reads back exactly. */
  @Test
  void readsBackEveryDouble() {
    final Random random = new Random(11);
    for (int i = 0; i < 50_000; i++) {
      final double value =
          i < 2000
              ? Math.scalb(1.0, i - 1000)
              : Double.longBitsToDouble(random.nextLong() & 0x7FEF_FFFF_FFFF_FFFFL);
      final String text = ShortestDecimal.of(value);
      assertEquals(value, Double.parseDouble(text));
      assertTrue(text.length() <= Double.toString(value).length() + 3, text);
    }
  }

  @Test
  void readsBackEveryFloat() {
    final Random random = new Random(12);
    for (int i = 0; i < 20_000; i++) {
      final float value = Float.intBitsToFloat(random.nextInt() & 0x7F7F_FFFF);
      assertEquals(value, Float.parseFloat(ShortestDecimal.of(value)));
    }
    assertEquals("0.1", ShortestDecimal.of(0.1f));
    assertEquals("16777216", ShortestDecimal.of(16777216f));
    assertEquals("-0", ShortestDecimal.of(-0f));
  }
}
