package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import torqueloom.model.response.ResponseCurve;
import torqueloom.model.response.WilsonInterval;
import torqueloom.reports.figure.Axis;
import torqueloom.reports.figure.Chart;
import torqueloom.reports.figure.LineMark;
import torqueloom.reports.figure.Mark;
import torqueloom.reports.figure.Marker;
import torqueloom.reports.figure.Palette;
import torqueloom.reports.figure.Style;

/** Pictures of the spike response. */
final class ResponsePictures {
  /** Two-sided 95 % point of the normal distribution. */
  private static final double Z = 1.959963984540054;

  /** Most curves of P(n) in one picture. */
  private static final int MOST_COUNTS = 5;

  /** Smallest share for which a count gets a curve (1). */
  private static final double NOTABLE = 0.01;

  private final StudyFacts facts;
  private final DriveAxis drive;

  ResponsePictures(StudyFacts facts) {
    this.facts = facts;
    this.drive =
        DriveAxis.of(facts.result().library().curves(), facts.result().library().driveUnit());
  }

  Chart meanCounts() {
    final List<Mark> marks = new ArrayList<>();
    final Style faint = new Style(Palette.MUTED, "", Marker.NONE, 0.8, 0.45);
    final List<ResponseCurve> spread = facts.spreadCurves();
    for (int i = 0; i < spread.size(); i++) {
      marks.add(
          LineMark.curve(
              i == 0 ? "devices drawn from the tolerances" : "",
              drive.scaled(spread.get(i).drive()),
              means(spread.get(i)),
              faint));
    }
    final List<ResponseCurve> nominal = facts.nominalCurves();
    for (int i = 0; i < nominal.size(); i++) {
      final String label = "nominal, " + Words.kelvin(nominal.get(i).temperatureKelvin());
      marks.add(mean(label, nominal.get(i), Palette.ordered(i, nominal.size())));
    }
    return withTorque(
        Chart.of(
            "Mean count against drive",
            "One curve for the nominal device at each temperature with error bars, and a faint"
                + " curve for each device drawn from the tolerances.",
            drive.axis(),
            Axis.linear("mean count", ""),
            marks));
  }

  Chart distribution(ResponseCurve curve) {
    final List<Mark> marks = new ArrayList<>();
    final int most = Math.min(MOST_COUNTS - 1, largestNotable(curve));
    for (int n = 0; n <= most; n++) {
      marks.add(share(curve, n, Palette.series(n)));
    }
    return withTorque(
        Chart.of(
            "Share of slots by count",
            "For each number of counts the share of slots that gave it, against drive, with"
                + " intervals.",
            drive.axis(),
            Axis.linear("share of slots", "").between(0, 1),
            marks));
  }

  /** Largest count that some drive gives in a share of slots worth drawing. */
  private static int largestNotable(ResponseCurve curve) {
    for (int n = curve.maximumCount(); n > 1; n--) {
      for (int i = 0; i < curve.drive().length; i++) {
        if (curve.probability(i, n) >= NOTABLE) {
          return n;
        }
      }
    }
    return Math.min(1, curve.maximumCount());
  }

  Chart latency(ResponseCurve curve) {
    final double[] y = nanoseconds(curve.latencySeconds());
    final double[] jitter = nanoseconds(curve.jitterSeconds());
    final double[] low = new double[y.length];
    final double[] high = new double[y.length];
    for (int i = 0; i < y.length; i++) {
      low[i] = Math.max(0, y[i] - jitter[i]);
      high[i] = y[i] + jitter[i];
    }
    final Mark mark =
        new LineMark(
            "mean and jitter", drive.scaled(curve.drive()), y, low, high, true, Palette.series(0));
    return withTorque(
            Chart.of(
                "Latency against drive",
                "Mean time to the first count with its standard deviation, against drive.",
                drive.axis(),
                Axis.linear("time to first count", "ns"),
                List.of(mark)))
        .withHeight(300);
  }

  private Chart withTorque(Chart chart) {
    final double perStep = drive.milliteslaPerStep(facts.torquePerDrive());
    return Double.isFinite(perStep) && perStep > 0
        ? chart.withTop(Axis.linear("damping-like torque field", "mT"), perStep)
        : chart;
  }

  private Mark mean(String label, ResponseCurve curve, Style style) {
    final double[] y = means(curve);
    final double[] low = new double[y.length];
    final double[] high = new double[y.length];
    for (int i = 0; i < y.length; i++) {
      final double half = Z * standardError(curve, i, y[i]);
      low[i] = y[i] - half;
      high[i] = y[i] + half;
    }
    return new LineMark(label, drive.scaled(curve.drive()), y, low, high, true, style);
  }

  private static double standardError(ResponseCurve curve, int drive, double mean) {
    double sum = 0;
    for (int i = 0; i < curve.counts()[drive].length; i++) {
      final double off = curve.countsFrom() + i - mean;
      sum += off * off * curve.counts()[drive][i];
    }
    final int trials = curve.trials()[drive];
    return Math.sqrt(sum / trials / trials);
  }

  private Mark share(ResponseCurve curve, int n, Style style) {
    final int points = curve.drive().length;
    final double[] y = new double[points];
    final double[] low = new double[points];
    final double[] high = new double[points];
    for (int i = 0; i < points; i++) {
      y[i] = curve.probability(i, n);
      final WilsonInterval interval =
          WilsonInterval.of((int) Math.rint(y[i] * curve.trials()[i]), curve.trials()[i]);
      low[i] = interval.low();
      high[i] = interval.high();
    }
    final String label = n == 0 ? "no count" : n == 1 ? "1 count" : n + " counts";
    return new LineMark(label, drive.scaled(curve.drive()), y, low, high, true, style);
  }

  private static double[] means(ResponseCurve curve) {
    final double[] y = new double[curve.drive().length];
    for (int i = 0; i < y.length; i++) {
      y[i] = curve.meanCount(i);
    }
    return y;
  }

  private static double[] nanoseconds(double[] seconds) {
    return Arrays.stream(seconds).map(s -> s * 1e9).toArray();
  }
}
