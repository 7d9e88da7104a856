package torqueloom.model.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class QuantityFormatTest {

  @ParameterizedTest(name = "{2}")
  @CsvSource({
    "0.004, FIELD, 4.00 mT",
    "-0.0002, FIELD, -200 uT",
    "0, FIELD, 0 T",
    "1.58, FIELD, 1.58 T",
    "7.8e11, CURRENT_DENSITY, 7.8e11 A/m^2",
    "62.13, RATIO, 62.1",
    "1.42e-9, TIME, 1.42 ns",
    "9.996e-10, TIME, 1.00 ns",
    "8e5, MAGNETIZATION, 800 kA/m",
    "1.379e-3, SURFACE_ENERGY, 1.38 mJ/m^2",
    "1.5e-6, RESISTIVITY, 150 uohm cm",
    "1e-10, RESISTANCE_AREA, 100 ohm um^2",
    "1e9, ELECTRIC_FIELD, 1.00 V/nm",
    "3.2e6, THERMAL_RESISTANCE, 3.2e6 K/W",
    "300, TEMPERATURE, 300 K",
    "1234.4, TEMPERATURE, 1230 K",
    "0.5235987755982988, ANGLE, 30.0 deg",
    "1e-14, AREA, 0.0100 um^2",
    "0.0001234, RATIO, 1.23e-4",
    "123456, RATIO, 1.23e5",
    "3e-25, ENERGY, 3e-25 J",
    "NaN, FIELD, unknown",
    "Infinity, TIME, infinite",
  })
  void writesForPeople(double value, QuantityKind kind, String expected) {
    assertEquals(expected, QuantityFormat.text(value, kind));
  }

  @Test
  void writesPercentagesAndAsManyDigitsAsAsked() {
    assertEquals("92.4 %", QuantityFormat.percent(0.9237));
    assertEquals("0 %", QuantityFormat.percent(0));
    assertEquals("unknown", QuantityFormat.percent(Double.NaN));
    assertEquals("1.3790 mJ/m^2", QuantityFormat.text(1.379e-3, QuantityKind.SURFACE_ENERGY, 5));
    assertThrows(
        IllegalArgumentException.class, () -> QuantityFormat.text(1, QuantityKind.RATIO, 0));
  }

  /** 17 digits always name one double, so text and number must agree both ways. */
  @ParameterizedTest
  @EnumSource(QuantityKind.class)
  void readsBackWhatItWrote(QuantityKind kind) {
    for (final double value : new double[] {1.2345678901234567e-9, 0.3, 4.5e7, -6.1e3}) {
      assertEquals(
          value,
          QuantityParser.parse(QuantityFormat.text(value, kind, 17), kind),
          Math.ulp(value),
          kind.name());
    }
  }
}
