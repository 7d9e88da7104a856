package torqueloom.model.device;

/**
 * Outline of the free film: the length lies along the current (x), the width across it (y).
 *
 * @param shape form of the body
 * @param length full length (m), &gt; 0
 * @param width full width (m), &gt; 0
 */
public record Outline(Shape shape, double length, double width) {
  /** @throws IllegalArgumentException naming the first value that is NaN or out of range */
  public Outline {
    Require.present("shape", shape);
    Require.positive("length", length, "m");
    Require.positive("width", width, "m");
  }

  /** Largest cross-section parallel to the film (m²). */
  public double area() {
    return (shape == Shape.RECTANGLE ? 1 : Math.PI / 4) * length * width;
  }

  /** Volume for a thickness in meters (m³). */
  public double volume(double thickness) {
    return shape.fill() * length * width * thickness;
  }
}
