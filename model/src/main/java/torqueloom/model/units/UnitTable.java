package torqueloom.model.units;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** The known unit symbols and prefixes. */
final class UnitTable {
  /** Enough digits of pi for one rounding to a double. */
  private static final String PI_OVER_180 = "0.017453292519943295769236907684886127134428718885417";

  private static final Map<String, Integer> PREFIXES = new LinkedHashMap<>();
  private static final Map<String, UnitScale> PREFIXABLE = new LinkedHashMap<>();
  private static final Map<String, UnitScale> PLAIN = new LinkedHashMap<>();

  /** Every spelling, for suggestions; sorted, so that suggestions never depend on a hash. */
  private static final Map<String, UnitScale> SPELLINGS = new TreeMap<>();

  private UnitTable() {}

  static {
    addPrefixes();
    addSiUnits();
    addCgsUnits();
    addPlainUnits();
    SPELLINGS.putAll(PREFIXABLE);
    PREFIXES.forEach(
        (prefix, exponent) ->
            PREFIXABLE.forEach(
                (symbol, unit) -> SPELLINGS.put(prefix + symbol, unit.scaled(exponent))));
    SPELLINGS.putAll(PLAIN);
  }

  /** The unit of a symbol with or without prefix, {@code µ} written as {@code u}. */
  static Optional<UnitScale> find(String symbol) {
    return Optional.ofNullable(SPELLINGS.get(symbol));
  }

  /** The known symbol with the fewest changes from {@code symbol}, if it is close enough. */
  static Optional<String> nearest(String symbol) {
    String best = null;
    int fewest = 2 * Math.max(1, symbol.length() / 2) + 1;
    for (final String known : SPELLINGS.keySet()) {
      final int changes = changes(symbol, known);
      if (changes < fewest) {
        fewest = changes;
        best = known;
      }
    }
    return Optional.ofNullable(best);
  }

  /** Edit distance in which a change of case counts one and any other change two. */
  private static int changes(String a, String b) {
    int[] previous = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      previous[j] = 2 * j;
    }
    for (int i = 1; i <= a.length(); i++) {
      final int[] row = new int[b.length() + 1];
      row[0] = 2 * i;
      for (int j = 1; j <= b.length(); j++) {
        final int replace = previous[j - 1] + replacement(a.charAt(i - 1), b.charAt(j - 1));
        row[j] = Math.min(replace, 2 + Math.min(previous[j], row[j - 1]));
      }
      previous = row;
    }
    return previous[b.length()];
  }

  private static int replacement(char a, char b) {
    if (a == b) {
      return 0;
    }
    return Character.toLowerCase(a) == Character.toLowerCase(b) ? 1 : 2;
  }

  private static void addPrefixes() {
    final String symbols = "afpnumcdkMGTP";
    final int[] exponents = {-18, -15, -12, -9, -6, -3, -2, -1, 3, 6, 9, 12, 15};
    for (int i = 0; i < exponents.length; i++) {
      PREFIXES.put(symbols.substring(i, i + 1), exponents[i]);
    }
  }

  private static void addSiUnits() {
    si("m", "1", Dimension.LENGTH);
    si("g", "1e-3", Dimension.MASS);
    si("s", "1", Dimension.TIME);
    si("A", "1", Dimension.CURRENT);
    si("K", "1", Dimension.TEMPERATURE);
    si("rad", "1", Dimension.ANGLE);
    si("Hz", "1", Dimension.TIME.power(-1));
    si("N", "1", Dimension.ENERGY.over(Dimension.LENGTH));
    si("Pa", "1", Dimension.ENERGY.over(Dimension.LENGTH.power(3)));
    si("J", "1", Dimension.ENERGY);
    si("W", "1", Dimension.POWER);
    si("C", "1", Dimension.CHARGE);
    si("V", "1", Dimension.VOLTAGE);
    si("F", "1", Dimension.CHARGE.over(Dimension.VOLTAGE));
    si("ohm", "1", Dimension.RESISTANCE);
    si("Ohm", "1", Dimension.RESISTANCE);
    si("S", "1", Dimension.RESISTANCE.power(-1));
    si("Wb", "1", Dimension.FLUX);
    si("T", "1", Dimension.FLUX_DENSITY);
    si("H", "1", Dimension.FLUX.over(Dimension.CURRENT));
    // Exact since the 2019 revision of the SI (BIPM, SI Brochure, 9th edition).
    si("eV", "1.602176634e-19", Dimension.ENERGY);
  }

  /** Gaussian units; Oe is read as the flux density it has in vacuum, 1e-4 T. */
  private static void addCgsUnits() {
    si("Oe", "1e-4", Dimension.FLUX_DENSITY);
    si("G", "1e-4", Dimension.FLUX_DENSITY);
    si("erg", "1e-7", Dimension.ENERGY);
    si("dyn", "1e-5", Dimension.ENERGY.over(Dimension.LENGTH));
    si("emu", "1e-3", Dimension.CURRENT.times(Dimension.LENGTH.power(2)));
  }

  private static void addPlainUnits() {
    plain("%", "0.01", Dimension.NONE);
    plain("percent", "0.01", Dimension.NONE);
    plain("ppm", "1e-6", Dimension.NONE);
    plain("deg", PI_OVER_180, Dimension.ANGLE);
    plain("degree", PI_OVER_180, Dimension.ANGLE);
    plain("degrees", PI_OVER_180, Dimension.ANGLE);
    plain("\u00C5", "1e-10", Dimension.LENGTH);
    plain("angstrom", "1e-10", Dimension.LENGTH);
    plain("min", "60", Dimension.TIME);
    plain("h", "3600", Dimension.TIME);
    plain("kelvin", "1", Dimension.TEMPERATURE);
    plain("tesla", "1", Dimension.FLUX_DENSITY);
    plain("gauss", "1e-4", Dimension.FLUX_DENSITY);
    plain("oersted", "1e-4", Dimension.FLUX_DENSITY);
  }

  private static void si(String symbol, String scale, Dimension dimension) {
    PREFIXABLE.put(symbol, UnitScale.of(scale, dimension));
  }

  private static void plain(String symbol, String scale, Dimension dimension) {
    PLAIN.put(symbol, UnitScale.of(scale, dimension));
  }
}
