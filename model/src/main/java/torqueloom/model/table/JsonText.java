package torqueloom.model.table;

/** Strings of JSON: only what must be escaped is (RFC 8259, section 7). */
final class JsonText {
  private JsonText() {}

  static void appendQuoted(StringBuilder out, CharSequence text) {
    out.append('"');
    for (int i = 0; i < text.length(); i++) {
      final char c = text.charAt(i);
      final boolean pair =
          Character.isHighSurrogate(c)
              && i + 1 < text.length()
              && Character.isLowSurrogate(text.charAt(i + 1));
      if (pair) {
        out.append(c).append(text.charAt(++i));
      } else {
        append(out, c);
      }
    }
    out.append('"');
  }

  private static void append(StringBuilder out, char c) {
    switch (c) {
      case '"' -> out.append("\\\"");
      case '\\' -> out.append("\\\\");
      case '\n' -> out.append("\\n");
      case '\r' -> out.append("\\r");
      case '\t' -> out.append("\\t");
      case '\b' -> out.append("\\b");
      case '\f' -> out.append("\\f");
      default -> {
        // A surrogate without its other half has no UTF-8 form.
        if (c < 0x20 || Character.isSurrogate(c)) {
          out.append(String.format("\\u%04x", (int) c));
        } else {
          out.append(c);
        }
      }
    }
  }
}
