package torqueloom.reports.figure;

/** Something drawn on the axes of a chart. */
public sealed interface Mark
    permits BandMark, BarMark, BoxMark, HeatMark, LineMark, RuleMark, StepMark, SwarmMark {
  /** Name in the legend, empty to stay out of it. */
  String label();

  /** How it looks. */
  Style style();

  /** Horizontal values that should be visible. */
  Extent horizontal();

  /** Vertical values that should be visible. */
  Extent vertical();

  /** Draws the mark. */
  void draw(Canvas canvas);

  /** Draws the sample in the legend, in a box of 26 by 12 pixels whose left middle is given. */
  default void sample(SvgWriter svg, double x, double y) {
    svg.line("", x, y, x + 26, y, style());
    Shapes.marker(svg, "", style(), x + 13, y);
  }
}
