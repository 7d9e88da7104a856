package torqueloom.reports.document;

import java.util.Objects;

/**
 * A run of characters in one style.
 *
 * @param style how it is set
 * @param text plain characters, not escaped
 */
public record Span(Style style, String text) {
  /** Styles of running text. */
  public enum Style {
    /** As the surrounding text. */
    PLAIN,
    /** Important. */
    STRONG,
    /** A variable or a word with a special meaning. */
    EMPHASIS,
    /** A key, a path or a digest. */
    CODE,
    /** Lowered. */
    SUBSCRIPT
  }

  /** Refuses null. */
  public Span {
    Objects.requireNonNull(style, "style");
    Objects.requireNonNull(text, "text");
  }
}
