package torqueloom.reports.figure;

import java.util.List;
import torqueloom.reports.document.Picture;

/**
 * Marks on two axes.
 *
 * @param title short name, read aloud in place of the picture
 * @param description what it shows, in a sentence or two
 * @param xAxis horizontal axis
 * @param yAxis vertical axis; an axis of names runs downward
 * @param top a second horizontal axis above, or null
 * @param topFactor values of the second axis over those of the first
 * @param marks drawn in order, later ones above earlier ones
 * @param width of the drawing (pixel)
 * @param height of the drawing (pixel)
 */
public record Chart(
    String title,
    String description,
    Axis xAxis,
    Axis yAxis,
    Axis top,
    double topFactor,
    List<Mark> marks,
    int width,
    int height)
    implements Picture {
  /** Usual width (pixel). */
  public static final int WIDTH = 720;

  /** Usual height (pixel). */
  public static final int HEIGHT = 380;

  /** Copies the list. */
  public Chart {
    marks = List.copyOf(marks);
  }

  /** A chart of the usual size with two axes. */
  public static Chart of(
      String title, String description, Axis xAxis, Axis yAxis, List<Mark> marks) {
    return new Chart(title, description, xAxis, yAxis, null, 1, marks, WIDTH, HEIGHT);
  }

  /** The same chart with a second horizontal axis whose values are {@code factor} times the first. */
  public Chart withTop(Axis axis, double factor) {
    return new Chart(title, description, xAxis, yAxis, axis, factor, marks, width, height);
  }

  /** The same chart with another height (pixel). */
  public Chart withHeight(int newHeight) {
    return new Chart(title, description, xAxis, yAxis, top, topFactor, marks, width, newHeight);
  }

  @Override
  public String svg(String id) {
    return new ChartPainter(this, id).paint();
  }
}
