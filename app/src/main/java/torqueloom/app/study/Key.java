package torqueloom.app.study;

import java.util.ArrayList;
import java.util.List;
import torqueloom.model.units.QuantityKind;

/**
 * One key of the study file. The schema is a tree of these; it drives the reader, the manual and the
 * editor schema.
 *
 * @param name the key as written
 * @param type what may stand behind it
 * @param required whether it must stand where its block stands
 * @param standard default as it would be written, or {@code = other.key}; null for none
 * @param use first stage that reads it
 * @param meaning one line for the manual
 */
record Key(
    String name, ValueType type, boolean required, String standard, Use use, String meaning) {

  static Key quantity(String name, QuantityKind kind, String example, String... bounds) {
    final List<Bound> read = new ArrayList<>();
    for (final String bound : bounds) {
      read.add(Bound.of(bound, kind));
    }
    return of(name, new ValueType.Quantity(kind, List.copyOf(read), example));
  }

  static Key whole(String name, long low, long high) {
    return of(name, new ValueType.Whole(low, high));
  }

  static Key flag(String name) {
    return of(name, new ValueType.Flag());
  }

  static Key choice(String name, String... supported) {
    return of(name, new ValueType.Choice(List.of(supported), List.of()));
  }

  static Key section(String name, Key... keys) {
    return of(name, new ValueType.Section(List.of(keys)));
  }

  static Key of(String name, ValueType type) {
    return new Key(name, type, false, null, Use.STUDY, "");
  }

  /** The same key with further words that a later version will compute. */
  Key later(String... words) {
    final ValueType.Choice choice = (ValueType.Choice) type;
    return new Key(
        name,
        new ValueType.Choice(choice.supported(), List.of(words)),
        required,
        standard,
        use,
        meaning);
  }

  /** The same key, which must stand. */
  Key must() {
    return new Key(name, type, true, null, use, meaning);
  }

  /** The same key with a default, as written, or {@code = other.key} for another key's value. */
  Key standard(String text) {
    return new Key(name, type, false, text, use, meaning);
  }

  /** The same key with its first stage and its line in the manual. */
  Key doc(Use stage, String line) {
    return new Key(name, type, required, standard, stage, line);
  }

  /** Whether a block is filled with its defaults where it is left out. */
  boolean filledWhenAbsent() {
    return type instanceof ValueType.Section && "{}".equals(standard);
  }
}
