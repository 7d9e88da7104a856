package torqueloom.app.study;

import java.util.List;
import java.util.stream.Collectors;
import torqueloom.model.units.QuantityKind;

/** What may stand behind a key. */
sealed interface ValueType {

  /** What is allowed, in words, e.g. {@code a length of more than 0 nm}. */
  String allowed();

  /** A text that is allowed; may be empty. */
  default String example() {
    return "";
  }

  /** What is allowed as the end of a message: "... is needed, e.g. 1.3 nm". */
  default String needed() {
    return allowed() + " is needed" + (example().isEmpty() ? "" : ", e.g. " + example());
  }

  /** A number with its unit. Its value is a Double in SI. */
  record Quantity(QuantityKind kind, List<Bound> bounds, String example) implements ValueType {
    @Override
    public String allowed() {
      final String what =
          kind == QuantityKind.RATIO ? "a number or percentage" : kind.withArticle();
      return what + range(bounds);
    }
  }

  /** A whole number. Its value is a Long. */
  record Whole(long low, long high) implements ValueType {
    @Override
    public String allowed() {
      return low == high ? "the number " + low : "a whole number from " + low + " to " + high;
    }
  }

  /** {@code true} or {@code false}. Its value is a Boolean. */
  record Flag() implements ValueType {
    @Override
    public String allowed() {
      return "true or false";
    }
  }

  /** Text of 1 to 200 characters. Its value is a String. */
  record Text() implements ValueType {
    /** Longest text (characters). */
    static final int LONGEST = 200;

    @Override
    public String allowed() {
      return "a text of 1 to " + LONGEST + " characters";
    }
  }

  /** Path of a file, relative to the study's folder. Its value is a String. */
  record FilePath(String holds) implements ValueType {
    @Override
    public String allowed() {
      return "the path of a file with " + holds + ", relative to the study";
    }
  }

  /**
   * One of some words. Its value is a String.
   *
   * @param supported what this version computes
   * @param later words of later versions, refused with a message of their own
   */
  record Choice(List<String> supported, List<String> later) implements ValueType {
    @Override
    public String allowed() {
      return supported.size() == 1 ? supported.get(0) : "one of " + String.join(", ", supported);
    }

    List<String> all() {
      return java.util.stream.Stream.concat(supported.stream(), later.stream())
          .collect(Collectors.toList());
    }
  }

  /** A word or a value of another type. Its value is the word or the other type's value. */
  record WordOr(String word, ValueType other) implements ValueType {
    @Override
    public String allowed() {
      return word + ", or " + other.allowed();
    }

    @Override
    public String example() {
      return other.example();
    }
  }

  /**
   * Standard deviation of a parameter, as a share of its nominal value or in the parameter's unit.
   * Its value is a Double, the share (1).
   *
   * @param kind what the parameter measures
   * @param nominal dotted name of the parameter's key
   */
  record Deviation(QuantityKind kind, String nominal) implements ValueType {
    @Override
    public String allowed() {
      final String other = kind == QuantityKind.RATIO ? "" : " or " + kind.withArticle();
      return "a share of the nominal value" + other + ", from 0 to 100 %,";
    }

    @Override
    public String example() {
      return "0.3 %";
    }
  }

  /** The path of one file, or a block of several. Its value is the path, or the block's values. */
  record FileOr(FilePath file, Section block) implements ValueType {
    @Override
    public String allowed() {
      return file.allowed() + ", or " + block.allowed();
    }
  }

  /** A list. Its value is a List of the element's values. */
  record Many(ValueType element, int least, int most) implements ValueType {
    @Override
    public String allowed() {
      return "a list [..] of " + least + " to " + most + " values, each " + element.allowed();
    }
  }

  /** Keys with values of their own. */
  record Section(List<Key> keys) implements ValueType {
    @Override
    public String allowed() {
      return "a block with the keys "
          + keys.stream().map(Key::name).collect(Collectors.joining(", "));
    }
  }

  private static String range(List<Bound> bounds) {
    return bounds.isEmpty()
        ? ""
        : bounds.stream().map(Bound::words).collect(Collectors.joining(" and ", " of ", ""));
  }
}
