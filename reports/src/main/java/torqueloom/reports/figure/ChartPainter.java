package torqueloom.reports.figure;

import java.util.ArrayList;
import java.util.List;

/** Lays out a chart and writes it. */
final class ChartPainter {
  private static final String FONTS = "'Segoe UI', 'Helvetica Neue', Arial, sans-serif";
  private static final double SMALL = 12;
  private static final double LEGEND_ROW = 19;

  private final Chart chart;
  private final String id;
  private final SvgWriter svg = new SvgWriter();
  private final List<List<Mark>> legend;
  private final Scale x;
  private final Scale y;
  private final List<Ticks.Tick> xTicks;
  private final List<Ticks.Tick> yTicks;

  ChartPainter(Chart chart, String id) {
    this.chart = chart;
    this.id = id;
    this.legend = legendRows();
    Extent across = Extent.NONE;
    Extent up = Extent.NONE;
    for (final Mark mark : chart.marks()) {
      across = across.and(mark.horizontal());
      up = up.and(mark.vertical());
    }
    final double topEdge = 12 + legend.size() * LEGEND_ROW + (chart.top() == null ? 0 : 36);
    final double bottomEdge = chart.height() - (chart.xAxis().caption().isEmpty() ? 28.0 : 48.0);
    final boolean downward = chart.yAxis().kind() == Axis.Kind.CATEGORY;
    this.y =
        Scale.of(
            chart.yAxis(), up, downward ? topEdge : bottomEdge, downward ? bottomEdge : topEdge);
    this.yTicks = ticks(chart.yAxis(), y, (int) Math.max(3, (bottomEdge - topEdge) / 48));
    this.x = Scale.of(chart.xAxis(), across, leftEdge(), chart.width() - 18.0);
    this.xTicks = ticks(chart.xAxis(), x, 8);
  }

  String paint() {
    final Object[] attributes = {
      "xmlns",
      "http://www.w3.org/2000/svg",
      "viewBox",
      "0 0 " + chart.width() + " " + chart.height(),
      "width",
      chart.width(),
      "height",
      chart.height(),
      "role",
      "img",
      "class",
      "chart",
      "aria-labelledby",
      id + "-t " + id + "-d",
      "font-family",
      FONTS,
      "font-size",
      "13"
    };
    svg.open("svg", attributes);
    svg.element("title", chart.title(), "id", id + "-t");
    svg.element("desc", chart.description(), "id", id + "-d").newline();
    ground();
    marks();
    axes();
    legend();
    return svg.close().text();
  }

  private double leftEdge() {
    double widest = 0;
    for (final Ticks.Tick tick : yTicks) {
      widest = Math.max(widest, textWidth(tick.label()));
    }
    return 14 + widest + (chart.yAxis().caption().isEmpty() ? 4 : 24);
  }

  /** Width of a text, estimated: fonts differ, so room is left. */
  private static double textWidth(String text) {
    return text.codePointCount(0, text.length()) * SMALL * 0.56;
  }

  private static List<Ticks.Tick> ticks(Axis axis, Scale scale, int most) {
    if (axis.kind() != Axis.Kind.CATEGORY) {
      return scale.logarithmic()
          ? Ticks.logarithmic(scale.low(), scale.high(), most)
          : Ticks.linear(scale.low(), scale.high(), most);
    }
    final List<Ticks.Tick> names = new ArrayList<>();
    for (int i = 0; i < axis.categories().size(); i++) {
      names.add(new Ticks.Tick(i, axis.categories().get(i)));
    }
    return names;
  }

  private void ground() {
    final double top = Math.min(y.from(), y.to());
    final double height = Math.abs(y.to() - y.from());
    svg.open("defs").open("clipPath", "id", id + "-c");
    svg.box(
        "", x.from() - 4, top - 4, x.to() - x.from() + 8, height + 8, Style.plain("#000000", 0));
    svg.close().close();
    svg.box("", x.from(), top, x.to() - x.from(), height, Style.plain(Palette.GROUND, 0));
    for (final Ticks.Tick tick : yTicks) {
      if (chart.yAxis().kind() != Axis.Kind.CATEGORY) {
        grid(x.from(), y.place(tick.value()), x.to(), y.place(tick.value()));
      }
    }
    for (final Ticks.Tick tick : xTicks) {
      if (chart.xAxis().kind() != Axis.Kind.CATEGORY) {
        grid(x.place(tick.value()), y.from(), x.place(tick.value()), y.to());
      }
    }
    svg.newline();
  }

  private void grid(double x1, double y1, double x2, double y2) {
    svg.line("", x1, y1, x2, y2, Style.plain(Palette.GRID, 1));
  }

  private void marks() {
    svg.open("g", "clip-path", "url(#" + id + "-c)").newline();
    final Canvas canvas = new Canvas(svg, x, y, chart.xAxis(), chart.yAxis());
    boolean empty = true;
    for (final Mark mark : chart.marks()) {
      mark.draw(canvas);
      svg.newline();
      empty &= mark instanceof RuleMark || mark.vertical().isEmpty() || mark.horizontal().isEmpty();
    }
    if (empty) {
      final double middle = (x.from() + x.to()) / 2;
      svg.label("no data", middle, (y.from() + y.to()) / 2, "middle", Palette.MUTED);
    }
    svg.close().newline();
  }

  private void axes() {
    final double base = Math.max(y.from(), y.to());
    final double crown = Math.min(y.from(), y.to());
    final Style ink = Style.plain(Palette.INK, 1.2);
    svg.line("", x.from(), crown, x.from(), base, ink).line("", x.from(), base, x.to(), base, ink);
    for (final Ticks.Tick tick : xTicks) {
      label(tick.label(), x.place(tick.value()), base + 17, "middle");
    }
    for (final Ticks.Tick tick : yTicks) {
      label(tick.label(), x.from() - 7, y.place(tick.value()) + 4, "end");
    }
    caption(chart.xAxis().caption(), (x.from() + x.to()) / 2, base + 38, "");
    final double middle = (base + crown) / 2;
    caption(
        chart.yAxis().caption(), 15, middle, "rotate(-90 15 " + Numbers.coordinate(middle) + ")");
    if (chart.top() != null) {
      topAxis(crown);
    }
    svg.newline();
  }

  private void topAxis(double crown) {
    final double factor = chart.topFactor();
    final Scale scale =
        new Scale(x.logarithmic(), x.low() * factor, x.high() * factor, x.from(), x.to());
    final Style muted = Style.plain(Palette.MUTED, 1);
    svg.line("", x.from(), crown, x.to(), crown, muted);
    for (final Ticks.Tick tick : ticks(chart.top(), scale, 8)) {
      final double place = scale.place(tick.value());
      svg.line("", place, crown, place, crown - 4, muted);
      label(tick.label(), place, crown - 7, "middle");
    }
    caption(chart.top().caption(), (x.from() + x.to()) / 2, crown - 23, "");
  }

  private void label(String text, double px, double py, String anchor) {
    svg.label(text, px, py, anchor, Palette.INK);
  }

  private void caption(String text, double px, double py, String transform) {
    if (!text.isEmpty()) {
      final Object[] attributes = {
        "x", px, "y", py, "text-anchor", "middle", "fill", Palette.INK, "transform", transform
      };
      svg.element("text", text, attributes);
    }
  }

  private List<List<Mark>> legendRows() {
    final List<List<Mark>> rows = new ArrayList<>();
    double used = Double.POSITIVE_INFINITY;
    for (final Mark mark : chart.marks()) {
      if (mark.label().isEmpty()) {
        continue;
      }
      final double wide = entryWidth(mark);
      if (used + wide > chart.width() - 20) {
        rows.add(new ArrayList<>());
        used = 0;
      }
      rows.get(rows.size() - 1).add(mark);
      used += wide;
    }
    return rows;
  }

  private static double entryWidth(Mark mark) {
    return 26 + 7 + textWidth(mark.label()) + 18;
  }

  private void legend() {
    double py = 16;
    for (final List<Mark> row : legend) {
      double px = 14;
      for (final Mark mark : row) {
        mark.sample(svg, px, py);
        label(mark.label(), px + 33, py + 4, "start");
        px += entryWidth(mark);
      }
      py += LEGEND_ROW;
    }
  }
}
