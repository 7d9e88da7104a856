package torqueloom.model.device;

import torqueloom.model.magnet.EllipsoidDemagnetization;
import torqueloom.model.magnet.EllipticCylinderDemagnetization;
import torqueloom.model.magnet.PrismDemagnetization;

/** Outline of a film. One outline gives shape fields up to twice apart, so the shape is named. */
public enum Shape {
  /** Rectangular prism. */
  RECTANGLE("rectangle", 1) {
    @Override
    public double[] demagnetizingFactors(double length, double width, double thickness) {
      return PrismDemagnetization.factors(length, width, thickness);
    }
  },
  /** Elliptic cylinder: flat faces, upright walls. */
  ELLIPSE("ellipse", Math.PI / 4) {
    @Override
    public double[] demagnetizingFactors(double length, double width, double thickness) {
      return EllipticCylinderDemagnetization.factors(length, width, thickness);
    }
  },
  /** Ellipsoid with the three full axes. */
  ELLIPSOID("ellipsoid", Math.PI / 6) {
    @Override
    public double[] demagnetizingFactors(double length, double width, double thickness) {
      return EllipsoidDemagnetization.factors(length, width, thickness);
    }
  };

  private final String studyName;
  private final double fill;

  Shape(String studyName, double fill) {
    this.studyName = studyName;
    this.fill = fill;
  }

  /** Name in a study file. */
  public String studyName() {
    return studyName;
  }

  /** Share of the enclosing box that the body fills (1). */
  public double fill() {
    return fill;
  }

  /**
   * Demagnetizing factors along length, width and thickness (1), sum 1.
   *
   * @param length full length (m), &gt; 0
   * @param width full width (m), &gt; 0
   * @param thickness full thickness (m), &gt; 0
   */
  public abstract double[] demagnetizingFactors(double length, double width, double thickness);
}
