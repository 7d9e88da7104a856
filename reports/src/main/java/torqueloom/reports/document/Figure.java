package torqueloom.reports.document;

import java.util.Objects;

/**
 * A picture with its caption.
 *
 * @param id fixed short name, unique in the document
 * @param picture the drawing
 * @param caption what to see in it
 */
public record Figure(String id, Picture picture, Text caption) implements Block {
  /** @throws IllegalArgumentException if the id is no plain name */
  public Figure {
    Ids.check(id);
    Objects.requireNonNull(picture, "picture");
    Objects.requireNonNull(caption, "caption");
  }
}
