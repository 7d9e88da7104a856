package torqueloom.reports.feasibility;

import java.util.List;
import java.util.Map;
import torqueloom.model.units.QuantityFormat;
import torqueloom.model.units.QuantityKind;
import torqueloom.reports.document.Text;
import torqueloom.reports.figure.Numbers;
import torqueloom.training.study.Interval;

/** Numbers of a result in the words of a report. */
final class Words {
  /** What a value that was not computed is called. */
  static final String UNKNOWN = "unknown";

  /** Up to this a share would be shown as nothing at all (1). */
  private static final double SMALLEST_SHOWN = 0.0005;

  private static final Map<String, QuantityKind> KINDS =
      Map.ofEntries(
          Map.entry("T", QuantityKind.FIELD),
          Map.entry("m", QuantityKind.LENGTH),
          Map.entry("m^2", QuantityKind.AREA),
          Map.entry("m^3", QuantityKind.VOLUME),
          Map.entry("rad", QuantityKind.ANGLE),
          Map.entry("s", QuantityKind.TIME),
          Map.entry("Hz", QuantityKind.FREQUENCY),
          Map.entry("K", QuantityKind.TEMPERATURE),
          Map.entry("A", QuantityKind.CURRENT),
          Map.entry("A/m", QuantityKind.MAGNETIZATION),
          Map.entry("A/m^2", QuantityKind.CURRENT_DENSITY),
          Map.entry("V", QuantityKind.VOLTAGE),
          Map.entry("V/m", QuantityKind.ELECTRIC_FIELD),
          Map.entry("ohm", QuantityKind.RESISTANCE),
          Map.entry("S", QuantityKind.CONDUCTANCE),
          Map.entry("J", QuantityKind.ENERGY),
          Map.entry("J/m^2", QuantityKind.SURFACE_ENERGY),
          Map.entry("W", QuantityKind.POWER),
          Map.entry("F", QuantityKind.CAPACITANCE),
          Map.entry("K/W", QuantityKind.THERMAL_RESISTANCE));

  private static final Map<String, String> GREEK =
      Map.of("alpha", "α", "beta", "β", "gamma", "γ", "Delta", "Δ", "theta", "θ", "tau", "τ");

  private Words() {}

  /** A share as a percentage with one decimal: "92.4 %". */
  static String percent(double share) {
    if (share > 0 && share <= SMALLEST_SHOWN) {
      return "below 0.1 %";
    }
    return Double.isFinite(share) ? decimal(100 * share) + " %" : UNKNOWN;
  }

  /** A share as a percentage without needless decimals: "90 %", for targets. */
  static String round(double share) {
    return Double.isFinite(share) ? Numbers.significant(100 * share, 4) + " %" : UNKNOWN;
  }

  /** Ends of an interval of shares: "90.1 to 94.0 %". */
  static String range(Interval interval) {
    return known(interval)
        ? decimal(100 * interval.low()) + " to " + decimal(100 * interval.high()) + " %"
        : "interval unknown";
  }

  /** A share with its interval: "92.4 % (90.1 to 94.0 %)". */
  static String share(Interval interval) {
    return percent(interval.estimate()) + " (" + range(interval) + ")";
  }

  /** A difference of shares in percentage points with its interval: "3.2 points (2.8 to 3.6)". */
  static String points(Interval interval) {
    final String ends =
        known(interval)
            ? decimal(100 * interval.low()) + " to " + decimal(100 * interval.high())
            : "interval unknown";
    return points(interval.estimate()) + " (" + ends + ")";
  }

  /** A gain in percentage points with its interval, without parentheses. */
  static String gain(Interval interval) {
    return points(interval.estimate())
        + (known(interval)
            ? ", " + decimal(100 * interval.low()) + " to " + decimal(100 * interval.high())
            : "");
  }

  /** A difference of shares in percentage points: "3.2 points". */
  static String points(double difference) {
    return Double.isFinite(difference) ? decimal(100 * difference) + " points" : UNKNOWN;
  }

  /** A value with its SI unit in engineering form: "4.00 mT". */
  static String quantity(double value, String unit) {
    if (!Double.isFinite(value)) {
      return UNKNOWN;
    }
    if (unit.isEmpty() || unit.equals("1")) {
      return Numbers.significant(value, 3);
    }
    final QuantityKind kind = KINDS.get(unit);
    return kind == null
        ? Numbers.significant(value, 3) + " " + pretty(unit)
        : pretty(QuantityFormat.text(value, kind));
  }

  /** A value of a derived quantity: a number, numbers, or text. */
  static String value(Object value, String unit) {
    if (value instanceof Number number) {
      return quantity(number.doubleValue(), unit);
    }
    if (value instanceof double[] numbers) {
      final StringBuilder out = new StringBuilder();
      for (final double number : numbers) {
        out.append(out.length() == 0 ? "" : ", ").append(quantity(number, unit));
      }
      return out.toString();
    }
    return String.valueOf(value);
  }

  /** A symbol of the literature as it is printed: Greek letters, subscripts. */
  static Text symbol(String typed) {
    String out = typed;
    for (final Map.Entry<String, String> letter : GREEK.entrySet()) {
      out = out.replaceAll("\\b" + letter.getKey() + "(?![a-zA-Z])", letter.getValue());
    }
    return out.matches("\\p{L}+(_[A-Za-z0-9,]+)?") ? Text.symbol(out) : Text.withSymbols(out);
  }

  /** A temperature: "300 K". */
  static String kelvin(double temperature) {
    return Numbers.significant(temperature, 5) + " K";
  }

  /** A whole number with thin gaps between groups of three digits from five digits on. */
  static String count(long number) {
    final String digits = Long.toString(number);
    if (digits.length() < 5) {
      return digits;
    }
    return digits.replaceAll("(?<=\\d)(?=(\\d{3})+$)", "\u202F");
  }

  /** Names in a sentence: "a, b and c". */
  static String list(List<String> names) {
    if (names.size() < 2) {
      return String.join("", names);
    }
    return String.join(", ", names.subList(0, names.size() - 1))
        + " and "
        + names.get(names.size() - 1);
  }

  /** Typed units as printed ones: superscripts, the ohm and micro signs, powers of ten. */
  static String pretty(String text) {
    String out = text.replaceAll("(?<=\\d)e\\+?(-?\\d+)", "×10^$1").replace("uohm", "µΩ");
    out =
        out.replaceAll("\\bu(?=[mAVWsJSTFHN]\\b)", "µ")
            .replaceAll("(?<![a-z])([a-zA-Zµ]?)ohm\\b", "$1Ω");
    out = out.replaceAll("(?<![\\w.)^⁻-])-(?=\\d)", "−");
    final StringBuilder raised = new StringBuilder();
    final java.util.regex.Matcher power =
        java.util.regex.Pattern.compile("\\^(-?\\d+)").matcher(out);
    while (power.find()) {
      power.appendReplacement(raised, Numbers.superscript(Integer.parseInt(power.group(1))));
    }
    return power.appendTail(raised).toString();
  }

  private static boolean known(Interval interval) {
    return Double.isFinite(interval.low()) && Double.isFinite(interval.high());
  }

  private static String decimal(double value) {
    return Numbers.fixed(value, 1);
  }
}
