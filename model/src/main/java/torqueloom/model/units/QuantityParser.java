package torqueloom.model.units;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * Text to SI number.
 *
 * <p>Understood: {@code 1.6 nm}, {@code 0.95 mJ/m²}, {@code 9e10 A/m2}, {@code 60 fJ/(V m)}, {@code
 * 150 µΩ cm}, {@code 2 %}. Refused, never guessed: a missing number or unit, a unit of another
 * dimension, {@code a/b/c} and {@code a/b c}, a decimal comma, grouped digits, NaN and infinity.
 */
public final class QuantityParser {
  /**
   * Vacuum permeability (N/A²), CODATA 2022; a field strength in A/m times this is its flux
   * density. A copy, because this package stands below {@code torqueloom.model.constants}.
   */
  static final String VACUUM_PERMEABILITY = "1.25663706127e-6";

  private static final int LONGEST = 200;
  private static final Pattern NUMBER =
      Pattern.compile("[+-]?(?:[0-9]+\\.?[0-9]*|\\.[0-9]+)(?:[eE][+-]?[0-9]+)?");
  private static final Pattern NOT_FINITE =
      Pattern.compile("[+-]?\\.?(?:nan|inf|infinity|\u221E)\\b.*", Pattern.CASE_INSENSITIVE);
  private static final Pattern POWER_OF_TEN = Pattern.compile("\\s*[x*]\\s*10.*");
  private static final UnitScale PERMEABILITY =
      UnitScale.of(VACUUM_PERMEABILITY, Dimension.FLUX_DENSITY.over(Dimension.MAGNETIZATION));

  private QuantityParser() {}

  /**
   * A text that was read as one of several kinds.
   *
   * @param kind which of them
   * @param value in SI units
   */
  public record Match(QuantityKind kind, double value) {}

  /**
   * Reads a quantity of one kind.
   *
   * @param text number and unit
   * @param kind what is wanted
   * @return the value in SI units; tesla for {@link QuantityKind#FIELD}, also when given in A/m;
   *     0.02 for {@code 2 %}
   * @throws QuantityException saying what was found and what is allowed
   */
  public static double parse(String text, QuantityKind kind) {
    return parseOneOf(text, kind).value();
  }

  /**
   * Reads a quantity that may be of several kinds, such as a spread in per cent or in mT.
   *
   * @param text number and unit
   * @param kinds what is allowed, the first that fits is taken
   * @throws QuantityException saying what was found and what is allowed
   */
  public static Match parseOneOf(String text, QuantityKind... kinds) {
    try {
      final Reading reading = Reading.of(text);
      for (final QuantityKind kind : kinds) {
        final UnitScale unit = unitFor(reading.unit(), kind);
        if (unit.dimension().equals(kind.dimension())) {
          return new Match(kind, reading.in(unit));
        }
      }
      throw new UnitRefusal(otherKind(reading));
    } catch (final UnitRefusal refusal) {
      final String reason = refusal.getMessage().isEmpty() ? "" : refusal.getMessage() + "; ";
      throw new QuantityException(text, reason + needed(kinds));
    }
  }

  /**
   * Reads any quantity.
   *
   * @throws QuantityException if the text is no number with a known unit
   */
  public static Quantity parse(String text) {
    try {
      final Reading reading = Reading.of(text);
      return new Quantity(reading.in(reading.unit()), reading.unit().dimension());
    } catch (final UnitRefusal refusal) {
      throw new QuantityException(
          text, refusal.getMessage() + "; a number with its unit is needed, e.g. 1.3 nm");
    }
  }

  private static UnitScale unitFor(UnitScale unit, QuantityKind kind) {
    final boolean strength =
        kind == QuantityKind.FIELD && unit.dimension().equals(Dimension.MAGNETIZATION);
    return strength ? unit.times(PERMEABILITY) : unit;
  }

  private static String otherKind(Reading reading) {
    if (reading.unitText().isEmpty()) {
      return "the unit is missing";
    }
    return reading.unitText()
        + " is the unit of "
        + QuantityKind.of(reading.unit().dimension())
            .map(QuantityKind::withArticle)
            .orElse("something in " + reading.unit().dimension());
  }

  private static String needed(QuantityKind... kinds) {
    final String names =
        Arrays.stream(kinds).map(QuantityKind::withArticle).collect(Collectors.joining(" or "));
    final boolean unit =
        Arrays.stream(kinds).noneMatch(kind -> kind.dimension().equals(Dimension.NONE));
    final String examples =
        Arrays.stream(kinds).map(QuantityKind::example).collect(Collectors.joining(" or "));
    return names + (unit ? " with its unit" : "") + " is needed, e.g. " + examples;
  }

  /** A number and the unit behind it, not yet multiplied. */
  private record Reading(BigDecimal number, String unitText, UnitScale unit) {

    static Reading of(String text) {
      if (text.length() > LONGEST) {
        throw new UnitRefusal("the text is longer than " + LONGEST + " characters");
      }
      final String plain = Spelling.plain(text);
      final Matcher number = NUMBER.matcher(plain);
      if (!number.lookingAt()) {
        throw new UnitRefusal(noNumber(plain));
      }
      final String rest = plain.substring(number.end());
      refuseMoreDigits(rest);
      final String unitText = rest.strip();
      final UnitScale unit = unitText.isEmpty() ? UnitScale.ONE : UnitReader.read(unitText);
      return new Reading(decimal(number.group()), unitText, unit);
    }

    double in(UnitScale scale) {
      final double value = scale.toSi(number);
      if (Double.isInfinite(value) || (value == 0 && number.signum() != 0)) {
        throw new UnitRefusal("the number is out of the range of double precision");
      }
      return value;
    }
  }

  private static String noNumber(String plain) {
    if (plain.isEmpty()) {
      return "";
    }
    if (NOT_FINITE.matcher(plain).matches()) {
      return "the number is not finite";
    }
    return "the number is missing";
  }

  private static void refuseMoreDigits(String rest) {
    if (rest.startsWith(",")) {
      throw new UnitRefusal("a comma stands in the number; write a decimal point, 1.5 not 1,5");
    }
    if (POWER_OF_TEN.matcher(rest).matches()) {
      throw new UnitRefusal("write powers of ten as 1.5e-9");
    }
    if (rest.matches("\\s*[0-9_'.].*")) {
      throw new UnitRefusal("the number is not one plain number; write it without grouping, 1000");
    }
  }

  private static BigDecimal decimal(String digits) {
    final int exponent = Math.max(digits.indexOf('e'), digits.indexOf('E'));
    if (exponent >= 0 && digits.length() - exponent > 6) {
      throw new UnitRefusal("the number is out of the range of double precision");
    }
    return new BigDecimal(digits);
  }
}
