package torqueloom.app.study;

import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import torqueloom.model.units.QuantityException;
import torqueloom.model.units.QuantityKind;
import torqueloom.model.units.QuantityParser;

/** Reads the text of one value as its type says. */
final class ScalarReader {
  private static final Pattern WHOLE = Pattern.compile("[+-]?[0-9]{1,18}");
  private static final int LONGEST_ECHO = 60;

  private ScalarReader() {}

  /** A text that does not fit; the message says what was found and what is allowed. */
  static final class Refusal extends Exception {
    private static final long serialVersionUID = 1L;

    Refusal(String message) {
      super(message);
    }
  }

  /** A deviation given in the parameter's own unit (SI), until its nominal value is known. */
  record Absolute(double value, String text) {}

  /**
   * Reads a value.
   *
   * @param text as written, without quotes
   * @param type one that fits a single text
   * @return the value as {@link Values} holds it
   * @throws Refusal if the text does not fit
   */
  static Object read(String text, ValueType type) throws Refusal {
    if (type instanceof ValueType.Quantity quantity) {
      return quantity(text, quantity);
    }
    if (type instanceof ValueType.Deviation deviation) {
      return deviation(text, deviation);
    }
    if (type instanceof ValueType.Whole whole) {
      return whole(text, whole);
    }
    if (type instanceof ValueType.Flag) {
      return flag(text, type);
    }
    if (type instanceof ValueType.Choice choice) {
      return choice(text, choice);
    }
    if (type instanceof ValueType.WordOr either) {
      return text.equals(either.word()) ? text : readOther(text, either);
    }
    if (type instanceof ValueType.FileOr either) {
      return plain(text, either);
    }
    if (type instanceof ValueType.Text || type instanceof ValueType.FilePath) {
      return plain(text, type);
    }
    throw new Refusal("found " + quote(text) + "; " + type.needed());
  }

  private static Object readOther(String text, ValueType.WordOr either) throws Refusal {
    if (either.other() instanceof ValueType.Section) {
      throw new Refusal("found " + quote(text) + "; " + either.needed());
    }
    try {
      return read(text, either.other());
    } catch (Refusal e) {
      throw new Refusal("found " + quote(text) + "; " + either.needed());
    }
  }

  private static Double quantity(String text, ValueType.Quantity type) throws Refusal {
    final double value;
    try {
      value = QuantityParser.parse(text, type.kind());
    } catch (QuantityException e) {
      throw new Refusal(e.getMessage());
    }
    for (final Bound bound : type.bounds()) {
      if (!bound.allows(value)) {
        throw new Refusal("found " + echo(text) + "; " + type.needed());
      }
    }
    // One zero only, so that -0 and 0 give one digest.
    return value + 0.0;
  }

  private static Object deviation(String text, ValueType.Deviation type) throws Refusal {
    final QuantityParser.Match match;
    try {
      match = QuantityParser.parseOneOf(text, QuantityKind.RATIO, type.kind());
    } catch (QuantityException e) {
      throw new Refusal("found " + quote(text) + "; " + type.needed());
    }
    final boolean share = match.kind() == QuantityKind.RATIO;
    if (match.value() < 0 || share && match.value() > 1) {
      throw new Refusal("found " + echo(text) + "; " + type.needed());
    }
    return share ? (Object) (match.value() + 0.0) : new Absolute(match.value(), text);
  }

  private static Long whole(String text, ValueType.Whole type) throws Refusal {
    if (!WHOLE.matcher(text).matches()) {
      throw new Refusal("found " + quote(text) + "; " + type.needed());
    }
    final long value = Long.parseLong(text);
    if (value < type.low() || value > type.high()) {
      throw new Refusal("found " + text + "; " + type.needed());
    }
    return value;
  }

  private static Boolean flag(String text, ValueType type) throws Refusal {
    if (text.equals("true") || text.equals("false")) {
      return text.equals("true");
    }
    throw new Refusal("found " + quote(text) + "; " + type.needed());
  }

  private static String choice(String text, ValueType.Choice type) throws Refusal {
    if (type.supported().contains(text)) {
      return text;
    }
    if (type.later().contains(text)) {
      throw new Refusal(
          "found "
              + text
              + ", which this version does not compute yet; it computes "
              + String.join(", ", type.supported()));
    }
    final Optional<String> near = NearestName.of(text, type.all());
    throw new Refusal(
        "found "
            + quote(text)
            + "; "
            + type.needed()
            + near.map(n -> "; nearest known word: " + n).orElse(""));
  }

  private static String plain(String text, ValueType type) throws Refusal {
    final boolean printable = text.chars().noneMatch(Character::isISOControl);
    if (text.isBlank() || text.length() > ValueType.Text.LONGEST || !printable) {
      throw new Refusal("found " + quote(text) + "; " + type.needed());
    }
    return text.strip();
  }

  /** Text found, in quotes, short and printable. */
  static String quote(String text) {
    return '"' + echo(text) + '"';
  }

  private static String echo(String text) {
    final String printable = text.replaceAll("\\p{Cntrl}", "?");
    return printable.length() <= LONGEST_ECHO
        ? printable
        : printable.substring(0, LONGEST_ECHO) + "...";
  }

  /** Whether one text may stand for a type; others need a list or a block. */
  static boolean fitsText(ValueType type) {
    return !(type instanceof ValueType.Section) && !(type instanceof ValueType.Many);
  }

  /** The default of a key as its value. */
  static Object standard(String text, ValueType type) {
    try {
      return type instanceof ValueType.Many many
          ? List.of(read(text, many.element()))
          : read(text, type);
    } catch (Refusal e) {
      throw new IllegalStateException("a default of the schema does not fit: " + text, e);
    }
  }
}
