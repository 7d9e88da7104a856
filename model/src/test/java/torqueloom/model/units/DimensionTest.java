package torqueloom.model.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DimensionTest {

  /**
   * Base units of the derived units as the SI Brochure, 9th edition (2019), table 4, lists them.
   */
  @ParameterizedTest
  @CsvSource({
    "N, m kg s^-2",
    "Pa, m^-1 kg s^-2",
    "J, m^2 kg s^-2",
    "W, m^2 kg s^-3",
    "C, s A",
    "V, m^2 kg s^-3 A^-1",
    "F, m^-2 kg^-1 s^4 A^2",
    "ohm, m^2 kg s^-3 A^-2",
    "S, m^-2 kg^-1 s^3 A^2",
    "Wb, m^2 kg s^-2 A^-1",
    "T, kg s^-2 A^-1",
    "H, m^2 kg s^-2 A^-2",
    "Hz, s^-1",
    "%, 1",
  })
  void derivedUnitsHaveTheirBaseUnits(String symbol, String baseUnits) {
    assertEquals(baseUnits, UnitTable.find(symbol).orElseThrow().dimension().toString());
  }

  @Test
  void quotientUndoesProduct() {
    final Dimension field = Dimension.FLUX_DENSITY;
    assertEquals(field, field.times(Dimension.ANGLE).over(Dimension.ANGLE));
    assertEquals(Dimension.NONE, field.power(2).over(field).over(field));
  }

  @Test
  void suggestionsAreCloseOrAbsent() {
    assertEquals("GHz", UnitTable.nearest("Ghz").orElseThrow());
    assertTrue(UnitTable.nearest("furlongs").isEmpty());
  }
}
