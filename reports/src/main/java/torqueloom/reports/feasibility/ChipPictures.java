package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import torqueloom.reports.figure.Axis;
import torqueloom.reports.figure.BandMark;
import torqueloom.reports.figure.BoxMark;
import torqueloom.reports.figure.Chart;
import torqueloom.reports.figure.LineMark;
import torqueloom.reports.figure.Mark;
import torqueloom.reports.figure.Marker;
import torqueloom.reports.figure.Palette;
import torqueloom.reports.figure.RuleMark;
import torqueloom.reports.figure.Style;
import torqueloom.reports.figure.SwarmMark;
import torqueloom.training.study.Interval;
import torqueloom.training.study.StudyResult;
import torqueloom.training.study.TemperatureOutcome;

/** Pictures of the chips' accuracies and yields, in percent. */
final class ChipPictures {
  private final StudyFacts facts;
  private final StudyResult result;
  private final List<TemperatureOutcome> chips;

  ChipPictures(StudyFacts facts) {
    this.facts = facts;
    this.result = facts.result();
    this.chips = result.chips();
  }

  Chart distribution() {
    final List<Mark> marks = new ArrayList<>(references());
    for (int i = 0; i < chips.size(); i++) {
      final double[] percent = percent(chips.get(i).accuracies());
      final Style style = Palette.ordered(i, chips.size());
      marks.add(new SwarmMark("", i - 0.16, 0.6, percent, style.fade(0.75)));
      marks.add(BoxMark.of("", i - 0.28, 0.13, percent, style));
    }
    return Chart.of(
            "Chips' accuracies",
            "Accuracy of every chip at each temperature, with box plots and the target.",
            temperatures(),
            Axis.linear("accuracy", "%"),
            marks)
        .withHeight(440);
  }

  Chart accuracyAgainstTemperature() {
    final List<Mark> marks = new ArrayList<>(references());
    final double[] x = chips.stream().mapToDouble(TemperatureOutcome::temperatureKelvin).toArray();
    final Style style = Palette.series(0);
    marks.add(
        new BandMark(
            "middle 90 % of the chips",
            x,
            values(TemperatureOutcome::quantile05),
            values(TemperatureOutcome::quantile95),
            style.fade(0.15)));
    marks.add(intervals("median chip", x, TemperatureOutcome::median, true, style));
    return Chart.of(
        "Accuracy against temperature",
        "Median accuracy with interval, and the middle 90 % of chips.",
        Axis.linear("temperature", "K"),
        Axis.linear("accuracy", "%"),
        marks);
  }

  Chart yield() {
    final List<Mark> marks = new ArrayList<>();
    marks.add(target("target yield", facts.targets().yield()));
    marks.add(yields("on this test set", -0.09, TemperatureOutcome::yield, Palette.series(0)));
    marks.add(yields("on new cases", 0.09, TemperatureOutcome::yieldOnNewCases, Palette.series(1)));
    return Chart.of(
            "Yield by temperature",
            "Share of chips at the target with two intervals for each temperature.",
            temperatures(),
            yieldAxis(),
            marks)
        .withHeight(320);
  }

  /** Holds the target and every interval, and never shows less than nothing or more than all. */
  private Axis yieldAxis() {
    double low = 100 * facts.targets().yield();
    double high = low;
    for (final TemperatureOutcome outcome : chips) {
      for (final Interval interval : List.of(outcome.yield(), outcome.yieldOnNewCases())) {
        low = Math.min(low, 100 * interval.low());
        high = Math.max(high, 100 * interval.high());
      }
    }
    final double room = Math.max(2, 0.1 * (high - low));
    return Double.isFinite(low) && Double.isFinite(high)
        ? Axis.linear("yield", "%").between(Math.max(-2, low - room), Math.min(102, high + room))
        : Axis.linear("yield", "%").between(-2, 102);
  }

  private List<Mark> references() {
    final Style ideal = new Style(Palette.INK, "8 4", Marker.NONE, 1.3, 1);
    final Style baseline = new Style(Palette.MUTED, "2 3", Marker.NONE, 1.5, 1);
    return List.of(
        target("target accuracy", facts.targets().accuracy()),
        new RuleMark("ideal network", 100 * result.ideal(), false, ideal),
        new RuleMark("logistic regression", 100 * result.baseline(), false, baseline));
  }

  private static Mark target(String label, double share) {
    return new RuleMark(
        label, 100 * share, false, new Style(Palette.TARGET, "", Marker.NONE, 1.8, 1));
  }

  private Axis temperatures() {
    return Axis.categories(
        "temperature", chips.stream().map(c -> Words.kelvin(c.temperatureKelvin())).toList());
  }

  private Mark yields(
      String label, double shift, Function<TemperatureOutcome, Interval> which, Style style) {
    final double[] x = new double[chips.size()];
    for (int i = 0; i < x.length; i++) {
      x[i] = i + shift;
    }
    return intervals(label, x, which, false, style);
  }

  private Mark intervals(
      String label,
      double[] x,
      Function<TemperatureOutcome, Interval> which,
      boolean joined,
      Style style) {
    return new LineMark(
        label,
        x,
        values(c -> which.apply(c).estimate()),
        values(c -> which.apply(c).low()),
        values(c -> which.apply(c).high()),
        joined,
        style);
  }

  private double[] values(ToDoubleFunction<TemperatureOutcome> which) {
    return percent(chips.stream().mapToDouble(which).toArray());
  }

  private static double[] percent(double[] shares) {
    return Arrays.stream(shares).map(s -> 100 * s).toArray();
  }
}
