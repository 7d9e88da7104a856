package torqueloom.reports.figure;

import java.util.ArrayDeque;
import java.util.Deque;
import torqueloom.reports.document.Markup;

/** Writes SVG elements; everything is escaped, every element is closed. */
final class SvgWriter {
  private final StringBuilder out = new StringBuilder();
  private final Deque<String> open = new ArrayDeque<>();

  /** Opens an element; attributes come as name, value, name, value; numbers are coordinates. */
  SvgWriter open(String name, Object... attributes) {
    start(name, attributes);
    out.append('>');
    open.push(name);
    return this;
  }

  /** Closes the innermost open element. */
  SvgWriter close() {
    out.append("</").append(open.pop()).append('>');
    return this;
  }

  /** An element without contents. */
  SvgWriter empty(String name, Object... attributes) {
    start(name, attributes);
    out.append("/>");
    return this;
  }

  /** An element that holds a tooltip. */
  SvgWriter shape(String tooltip, String name, Object... attributes) {
    if (tooltip.isEmpty()) {
      return empty(name, attributes);
    }
    open(name, attributes);
    element("title", tooltip);
    return close();
  }

  /** A straight line. */
  SvgWriter line(String tooltip, double x1, double y1, double x2, double y2, Style style) {
    return stroke(tooltip, "M" + Shapes.point(x1, y1) + "L" + Shapes.point(x2, y2), style);
  }

  /** The outline of a path. */
  SvgWriter stroke(String tooltip, String path, Style style) {
    final Object[] attributes = {
      "d",
      path,
      "fill",
      "none",
      "stroke",
      style.color(),
      "stroke-width",
      style.width(),
      "stroke-dasharray",
      style.dash(),
      "stroke-linejoin",
      "round",
      "opacity",
      opacity(style)
    };
    return shape(tooltip, "path", attributes);
  }

  /** The inside of a path. */
  SvgWriter fill(String tooltip, String path, Style style) {
    return shape(tooltip, "path", "d", path, "fill", style.color(), "opacity", opacity(style));
  }

  /** A filled rectangle. */
  SvgWriter box(String tooltip, double x, double y, double width, double height, Style style) {
    final Object[] attributes = {
      "x",
      x,
      "y",
      y,
      "width",
      width,
      "height",
      height,
      "fill",
      style.color(),
      "opacity",
      opacity(style)
    };
    return shape(tooltip, "rect", attributes);
  }

  /** A filled disk. */
  SvgWriter disk(String tooltip, double x, double y, double radius, Style style) {
    final Object[] attributes = {
      "cx", x, "cy", y, "r", radius, "fill", style.color(), "opacity", opacity(style)
    };
    return shape(tooltip, "circle", attributes);
  }

  /** A short text; the anchor is "start", "middle" or "end". */
  SvgWriter label(String text, double x, double y, String anchor, String color) {
    final Object[] attributes = {
      "x", x, "y", y, "text-anchor", anchor, "font-size", "12", "fill", color
    };
    return element("text", text, attributes);
  }

  private static Object opacity(Style style) {
    return style.opacity() == 1 ? "" : (Object) style.opacity();
  }

  /** An element that holds text. */
  SvgWriter element(String name, String text, Object... attributes) {
    open(name, attributes);
    out.append(Markup.escape(text));
    return close();
  }

  /** A line break in the source, to keep it readable. */
  SvgWriter newline() {
    out.append('\n');
    return this;
  }

  /** Everything written. */
  String text() {
    if (!open.isEmpty()) {
      throw new IllegalStateException("element " + open.peek() + " is still open");
    }
    return out.toString();
  }

  private void start(String name, Object... attributes) {
    out.append('<').append(name);
    for (int i = 0; i < attributes.length; i += 2) {
      final Object value = attributes[i + 1];
      final String text =
          value instanceof Number number
              ? Numbers.coordinate(number.doubleValue())
              : Markup.escape(value.toString());
      if (!text.isEmpty()) {
        out.append(' ').append(attributes[i]).append("=\"").append(text).append('"');
      }
    }
  }
}
