package torqueloom.model.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** Conversions follow the definitions of the units (BIPM, SI Brochure, 9th edition, 2019). */
class QuantityParserTest {

  /** No tolerance: the text is scaled exactly and rounded once. */
  @ParameterizedTest(name = "{0}")
  @CsvSource(
      delimiter = '|',
      value = {
        "1.6 nm | LENGTH | 1.6e-9",
        "60 nm | LENGTH | 6e-8",
        "60nm | LENGTH | 6e-8",
        "1.3 \u00C5 | LENGTH | 1.3e-10",
        "+.5 um | LENGTH | 5e-7",
        "5. \u00B5m | LENGTH | 5e-6",
        "5 \u03BCm | LENGTH | 5e-6",
        "0.95 mJ/m^2 | SURFACE_ENERGY | 0.95e-3",
        "1.379 mJ/m\u00B2 | SURFACE_ENERGY | 1.379e-3",
        "1.379 mJ m\u207B\u00B2 | SURFACE_ENERGY | 1.379e-3",
        "1.379 mJ*m^-2 | SURFACE_ENERGY | 1.379e-3",
        "1.379 mJ m-2 | SURFACE_ENERGY | 1.379e-3",
        "1 erg/cm^2 | SURFACE_ENERGY | 1e-3",
        "1 erg/cm3 | ENERGY_DENSITY | 0.1",
        "1.0 MA/m | MAGNETIZATION | 1e6",
        "800 kA/m | MAGNETIZATION | 8e5",
        "1 emu/cm^3 | MAGNETIZATION | 1e3",
        "9e10 A/m^2 | CURRENT_DENSITY | 9e10",
        "9E10 A/m2 | CURRENT_DENSITY | 9e10",
        "9e+10A/m\u00B2 | CURRENT_DENSITY | 9e10",
        "9e6 A/cm^2 | CURRENT_DENSITY | 9e10",
        "0 A/m^2 | CURRENT_DENSITY | 0",
        "300 K | TEMPERATURE | 300",
        "4 mT | FIELD | 4e-3",
        "\u22124 mT | FIELD | -4e-3",
        "10 Oe | FIELD | 1e-3",
        "10 G | FIELD | 1e-3",
        "2 kOe | FIELD | 0.2",
        "2 % | RATIO | 0.02",
        "60% | RATIO | 0.6",
        "0.6 | RATIO | 0.6",
        "-0.3 | RATIO | -0.3",
        "150 uohm cm | RESISTIVITY | 1.5e-6",
        "150 \u00B5\u03A9 cm | RESISTIVITY | 1.5e-6",
        "150 \u03BC\u2126\u00B7cm | RESISTIVITY | 1.5e-6",
        "150 \u00B5\u03A9cm | RESISTIVITY | 1.5e-6",
        "100 ohm um^2 | RESISTANCE_AREA | 1e-10",
        "100 \u03A9*\u00B5m\u00B2 | RESISTANCE_AREA | 1e-10",
        "1 kOhm | RESISTANCE | 1e3",
        "60 fJ/(V m) | VOLTAGE_COEFFICIENT | 6e-14",
        "60 fJ/(V*m) | VOLTAGE_COEFFICIENT | 6e-14",
        "60 fJ/( V\u00A0m ) | VOLTAGE_COEFFICIENT | 6e-14",
        "60 fJ V^-1 m^(-1) | VOLTAGE_COEFFICIENT | 6e-14",
        "1 V/nm | ELECTRIC_FIELD | 1e9",
        "12 pJ/m | EXCHANGE | 12e-12",
        "1 uerg/cm | EXCHANGE | 1e-11",
        "3.2e6 K/W | THERMAL_RESISTANCE | 3.2e6",
        "2 GHz | FREQUENCY | 2e9",
        "0.5 ns | TIME | 5e-10",
        "1 min | TIME | 60",
        "5 fF | CAPACITANCE | 5e-15",
        "1 eV | ENERGY | 1.602176634e-19",
        "1 pJ | ENERGY | 1e-12",
        "100 mV | VOLTAGE | 0.1",
        "180 deg | ANGLE | 3.141592653589793",
        "30\u00B0 | ANGLE | 0.5235987755982989",
        "3 mrad | ANGLE | 3e-3",
        "2.07 fWb | MAGNETIC_FLUX | 2.07e-15",
        "1.76e11 rad/(s T) | GYROMAGNETIC_RATIO | 1.76e11",
      })
  void readsExactly(String text, QuantityKind kind, double expected) {
    assertEquals(expected, QuantityParser.parse(text, kind));
  }

  /** Every decimal of up to 15 digits times a power of ten is the double nearest to the product. */
  @Test
  void scalesWithoutASecondRounding() {
    final Random random = new Random(5);
    for (int i = 0; i < 2000; i++) {
      final String digits = String.valueOf(1 + random.nextInt(999_999_999));
      assertEquals(
          Double.parseDouble(digits + "e-9"),
          QuantityParser.parse(digits + " nm", QuantityKind.LENGTH));
    }
  }

  /**
   * 1 Oe is 79.5774715 A/m (1000/4pi to nine digits): half a unit in the last digit, 6.3e-10, and
   * 1.4e-10 by which the measured permeability differs from 4pi 1e-7.
   */
  @Test
  void fieldStrengthIsTakenTimesThePermeability() {
    assertEquals(1e-4, QuantityParser.parse("79.5774715 A/m", QuantityKind.FIELD), 1e-4 * 8e-10);
    assertEquals(
        1.25663706127e-3, QuantityParser.parse("1 kA/m", QuantityKind.FIELD), "rounded once");
  }

  @ParameterizedTest(name = "{0} as {1}")
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "1.3 | LENGTH | the unit is missing",
        "30 | ANGLE | the unit is missing",
        "nm | LENGTH | the number is missing",
        "- 5 nm | LENGTH | the number is missing",
        "`` | LENGTH | a length with its unit is needed, e.g. 1.3 nm",
        "1.3 mT | LENGTH | mT is the unit of a magnetic field",
        "1.3 s/m | LENGTH | something in m^-1 s",
        "5 rad/s | FREQUENCY | something in s^-1 rad",
        "5 % | ANGLE | % is the unit of a plain number",
        "5 nm | RATIO | a plain number or percentage is needed, e.g. 2 %",
        "1 A/m/s | MAGNETIZATION | two ways",
        "60 fJ/V m | VOLTAGE_COEFFICIENT | two ways",
        "60 fJ/V*m | VOLTAGE_COEFFICIENT | two ways",
        "60 fJ/(V m)/s | VOLTAGE_COEFFICIENT | two ways",
        "1,5 nm | LENGTH | decimal point",
        "1,000 nm | LENGTH | decimal point",
        "1_000 nm | LENGTH | without grouping",
        "1 000 nm | LENGTH | without grouping",
        "1.2.3 nm | LENGTH | without grouping",
        "NaN nm | LENGTH | not finite",
        ".nan | RATIO | not finite",
        "-inf nm | LENGTH | not finite",
        "Infinity nm | LENGTH | not finite",
        "1e400 nm | LENGTH | out of the range",
        "1e-400 nm | LENGTH | out of the range",
        "1e99999999999 nm | LENGTH | out of the range",
        "1.5\u00D710^-9 m | LENGTH | powers of ten",
        "1.5 x 10^-9 m | LENGTH | powers of ten",
        "1.3 nn | LENGTH | ~nn~ is no known unit (nearest: nN)",
        "1 ghz | FREQUENCY | (nearest: GHz)",
        "1 KA/m | MAGNETIZATION | (nearest: kA)",
        "1 mj | ENERGY | (nearest: mJ)",
        "20 \u00B0C | TEMPERATURE | kelvin",
        "20 C | TEMPERATURE | a temperature in kelvin with its unit is needed, e.g. 300 K",
        "1 nm) | LENGTH | ~)~ does not belong",
        "1 nm 2 | LENGTH | ~2~ does not belong",
        "1 fJ/(V m | VOLTAGE_COEFFICIENT | parenthesis is missing",
        "1 A/ | CURRENT | not complete",
        "1 m^ | LENGTH | an exponent",
        "1 m^0.5 | LENGTH | an exponent",
        "1 m^99 | LENGTH | an exponent",
      })
  void refusesWithTheReason(String text, QuantityKind kind, String words) {
    final QuantityException refusal =
        assertThrows(QuantityException.class, () -> QuantityParser.parse(text, kind));
    final String wanted = words.replace('~', '"');
    assertTrue(refusal.getMessage().contains(wanted), refusal.getMessage());
    assertTrue(refusal.getMessage().startsWith("found \""), refusal.getMessage());
    assertTrue(refusal.getMessage().endsWith("e.g. " + kind.example()), refusal.getMessage());
    assertEquals(text, refusal.found());
  }

  @Test
  void readsTheFirstKindThatFits() {
    final QuantityKind[] kinds = {QuantityKind.RATIO, QuantityKind.FIELD};
    assertEquals(
        new QuantityParser.Match(QuantityKind.RATIO, 0.03),
        QuantityParser.parseOneOf("3 %", kinds));
    assertEquals(
        new QuantityParser.Match(QuantityKind.FIELD, 0.004),
        QuantityParser.parseOneOf("4 mT", kinds));
    final String message =
        assertThrows(QuantityException.class, () -> QuantityParser.parseOneOf("4 nm", kinds))
            .getMessage();
    assertTrue(message.contains("a plain number or percentage or a magnetic field"), message);
  }

  @Test
  void readsAnyQuantity() {
    assertEquals(new Quantity(0.02, Dimension.NONE), QuantityParser.parse("2 %"));
    assertEquals(new Quantity(2e-9, Dimension.LENGTH), QuantityParser.parse("2 nm"));
    assertThrows(QuantityException.class, () -> QuantityParser.parse("2 foo"));
    assertThrows(IllegalArgumentException.class, () -> new Quantity(Double.NaN, Dimension.NONE));
  }

  @ParameterizedTest
  @EnumSource(QuantityKind.class)
  void everyExampleAndDisplayUnitIsOfItsKind(QuantityKind kind) {
    assertTrue(QuantityParser.parse(kind.example(), kind) > 0);
    assertTrue(QuantityParser.parse("1 " + kind.displayUnit(), kind) > 0);
  }

  @Test
  void messagesEchoOnlyShortPlainText() {
    final String message =
        assertThrows(
                QuantityException.class,
                () -> QuantityParser.parse("\u001B" + "x".repeat(500), QuantityKind.LENGTH))
            .getMessage();
    assertTrue(message.startsWith("found \"?xxx"), message);
    assertTrue(message.length() < 200, message);
  }
}
