package torqueloom.app.study;

import java.util.List;
import java.util.stream.Collectors;
import torqueloom.model.units.QuantityKind;

/** Writes the tables of the manual from the schema, so that the two cannot differ. */
final class Manual {
  private Manual() {}

  /** One Markdown table a block. */
  static String tables() {
    final StringBuilder text = new StringBuilder();
    block(text, "", StudySchema.root().keys());
    return text.toString();
  }

  private static void block(StringBuilder text, String path, List<Key> keys) {
    text.append("\n| key | meaning | default | allowed | used by |\n|---|---|---|---|---|\n");
    for (final Key key : keys) {
      text.append("| `").append(key.name()).append("` | ").append(key.meaning());
      text.append(" | ").append(standard(key)).append(" | ").append(allowed(key.type()));
      text.append(" | ").append(key.use().words()).append(" |\n");
    }
    for (final Key key : keys) {
      final List<Key> inner = StudySchema.inner(key.type());
      if (!inner.isEmpty()) {
        final String name = path.isEmpty() ? key.name() : path + "." + key.name();
        text.append("\n### `").append(name).append("`\n\n");
        text.append(sentence(key)).append('\n');
        block(text, name, inner);
      }
    }
  }

  private static String sentence(Key key) {
    final String meaning = key.meaning();
    return Character.toUpperCase(meaning.charAt(0)) + meaning.substring(1) + ".";
  }

  private static String standard(Key key) {
    if (key.required()) {
      return "**required**";
    }
    if (key.standard() == null) {
      return key.name().equals("name") ? "the file's name" : "left out";
    }
    if (key.standard().equals("{}")) {
      return "all defaults";
    }
    return key.standard().startsWith("= ")
        ? "as `" + key.standard().substring(2) + "`"
        : "`" + key.standard() + "`";
  }

  private static String allowed(ValueType type) {
    if (type instanceof ValueType.Quantity quantity) {
      return unit(quantity.kind()) + range(quantity.bounds());
    }
    if (type instanceof ValueType.Whole whole) {
      return whole.low() == whole.high()
          ? "`" + whole.low() + "`"
          : "whole number, " + whole.low() + " to " + whole.high();
    }
    if (type instanceof ValueType.Choice choice) {
      return words(choice.supported())
          + (choice.later().isEmpty() ? "" : "; later: " + words(choice.later()));
    }
    if (type instanceof ValueType.WordOr either) {
      return "`" + either.word() + "`, or " + allowed(either.other());
    }
    if (type instanceof ValueType.Many many) {
      return "list of "
          + many.least()
          + " to "
          + many.most()
          + ", each: "
          + allowed(many.element());
    }
    if (type instanceof ValueType.Deviation deviation) {
      return "share of the nominal value"
          + (deviation.kind() == QuantityKind.RATIO ? "" : " or " + unit(deviation.kind()))
          + ", 0 to 100 %";
    }
    if (type instanceof ValueType.Section) {
      return "block, see below";
    }
    if (type instanceof ValueType.FileOr) {
      return "path of a CSV, or a block, see below";
    }
    return type instanceof ValueType.Flag ? "`true`, `false`" : shortText(type);
  }

  private static String shortText(ValueType type) {
    return type instanceof ValueType.FilePath file ? "path of " + file.holds() : "text";
  }

  private static String unit(QuantityKind kind) {
    return kind == QuantityKind.RATIO
        ? "number or %"
        : kind.plainName() + ", e.g. `" + kind.example() + "`";
  }

  private static String range(List<Bound> bounds) {
    return bounds.isEmpty()
        ? ""
        : bounds.stream().map(b -> b.text()).collect(Collectors.joining(", ", "; ", ""));
  }

  private static String words(List<String> words) {
    return words.stream().map(word -> "`" + word + "`").collect(Collectors.joining(", "));
  }
}
