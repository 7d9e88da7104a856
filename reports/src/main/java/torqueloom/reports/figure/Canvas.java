package torqueloom.reports.figure;

/**
 * What a mark draws on.
 *
 * @param svg the writer
 * @param x horizontal scale
 * @param y vertical scale
 * @param xAxis horizontal axis, for words in tooltips
 * @param yAxis vertical axis, for words in tooltips
 */
record Canvas(SvgWriter svg, Scale x, Scale y, Axis xAxis, Axis yAxis) {
  /** Words for a point: "name: drive 6.7 mT, mean count 0.5". */
  String describe(String name, double xValue, double yValue) {
    final String start = name.isEmpty() ? "" : name + ": ";
    return start + xAxis.describe(xValue) + ", " + yAxis.describe(yValue);
  }
}
