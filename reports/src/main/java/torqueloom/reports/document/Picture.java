package torqueloom.reports.document;

/** A drawing that can be written as a piece of SVG. */
public interface Picture {
  /** Short name, read aloud in place of the picture. */
  String title();

  /** What the picture shows, in a sentence or two. */
  String description();

  /**
   * The drawing as one well-formed {@code svg} element with title, description and {@code
   * role="img"}; no scripts, no outside references.
   *
   * @param id unique in the page; names inside the drawing start with it
   */
  String svg(String id);
}
