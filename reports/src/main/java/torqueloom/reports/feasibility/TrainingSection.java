package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import torqueloom.reports.document.Block;
import torqueloom.reports.document.Definitions;
import torqueloom.reports.document.Figure;
import torqueloom.reports.document.Paragraph;
import torqueloom.reports.document.Section;
import torqueloom.reports.document.Text;
import torqueloom.reports.figure.Axis;
import torqueloom.reports.figure.Chart;
import torqueloom.reports.figure.LineMark;
import torqueloom.reports.figure.Mark;
import torqueloom.reports.figure.Marker;
import torqueloom.reports.figure.Palette;
import torqueloom.reports.figure.RuleMark;
import torqueloom.reports.figure.Style;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.learning.TrainingHistory;
import torqueloom.training.learning.TrainingHistory.Epoch;
import torqueloom.training.study.StudyResult;

/** The task, the network and its training. */
final class TrainingSection {
  private TrainingSection() {}

  static Section of(StudyFacts facts) {
    final StudyResult result = facts.result();
    final List<Block> blocks = new ArrayList<>();
    blocks.add(new Definitions(facts(result)));
    blocks.add(Paragraph.of(comparison(result)));
    final String caption =
        "Accuracy of the nominal network after each epoch. The weights of the marked epoch were"
            + " kept."
            + (facts.trainedOnDrawnDevices() ? " The steps themselves saw drawn devices." : "");
    blocks.add(new Figure("training-accuracy", accuracy(result.history()), Text.of(caption)));
    blocks.add(
        new Figure("training-loss", loss(result.history()), Text.of("Mean loss of each epoch.")));
    return new Section("training", "Task and training", blocks);
  }

  private static String comparison(StudyResult result) {
    final double lead = result.ideal() - result.baseline();
    return "The ideal network reaches "
        + Words.percent(result.ideal())
        + " on the test rows. Logistic regression on the same rows (penalty strength "
        + Words.quantity(result.baselineStrength(), "1")
        + ", chosen on the validation rows) reaches "
        + Words.percent(result.baseline())
        + ", "
        + Words.points(Math.abs(lead))
        + (lead >= 0
            ? " less."
            : " more: on this task the devices do not beat a plain linear classifier.");
  }

  private static List<Definitions.Entry> facts(StudyResult result) {
    final NetworkSettings network = result.plan().network();
    final List<String> hidden = new ArrayList<>();
    for (final int size : network.hidden()) {
      hidden.add(Integer.toString(size));
    }
    final int[] rows = result.rows();
    return List.of(
        Definitions.Entry.of(
            "Rows",
            Words.count(rows[0])
                + " to train, "
                + Words.count(rows[1])
                + " to validate, "
                + Words.count(rows[2])
                + " to test"),
        Definitions.Entry.of("Features", Words.count(result.features())),
        Definitions.Entry.of("Classes", String.join(", ", result.classes())),
        Definitions.Entry.of("Hidden neurons", String.join(", ", hidden)),
        Definitions.Entry.of("Slots", Words.count(network.slots())),
        Definitions.Entry.of(
            "Output",
            network.output() == NetworkSettings.Output.DEVICE
                ? "device neurons, counts summed over the slots"
                : "weighted sum of the last layer's counts, taken by the electronics"),
        Definitions.Entry.of(
            "Devices while training",
            result.plan().training().variationAware()
                ? "drawn anew from the tolerances in every step"
                : "the nominal device"),
        Definitions.Entry.of("Pulses clipped at the largest drive", clipped(result.history())));
  }

  private static String clipped(TrainingHistory history) {
    final int best = history.bestEpoch();
    return best >= 0 && best < history.epochs().size()
        ? Words.percent(history.epochs().get(best).clippedShare()) + " in the kept epoch"
        : Words.UNKNOWN;
  }

  private static Chart accuracy(TrainingHistory history) {
    final List<Mark> marks = new ArrayList<>();
    marks.add(best(history));
    marks.add(curve("training rows", history, e -> 100 * e.trainAccuracy(), 1));
    marks.add(curve("validation rows", history, e -> 100 * e.validationAccuracy(), 0));
    return Chart.of(
            "Accuracy while training",
            "Accuracy on training and validation rows after each epoch.",
            Axis.linear("epoch", ""),
            Axis.linear("accuracy", "%"),
            marks)
        .withHeight(320);
  }

  private static Chart loss(TrainingHistory history) {
    return Chart.of(
            "Loss while training",
            "Mean cross-entropy of each epoch.",
            Axis.linear("epoch", ""),
            Axis.linear("mean cross-entropy", "nat"),
            List.of(best(history), curve("training rows", history, Epoch::loss, 1)))
        .withHeight(260);
  }

  private static Mark best(TrainingHistory history) {
    return new RuleMark(
        "kept epoch",
        history.bestEpoch() + 1.0,
        true,
        new Style(Palette.MUTED, "4 3", Marker.NONE, 1.4, 1));
  }

  private static Mark curve(
      String label, TrainingHistory history, ToDoubleFunction<Epoch> value, int series) {
    final int epochs = history.epochs().size();
    final double[] x = new double[epochs];
    final double[] y = new double[epochs];
    for (int i = 0; i < epochs; i++) {
      x[i] = i + 1.0;
      y[i] = value.applyAsDouble(history.epochs().get(i));
    }
    return LineMark.curve(label, x, y, Palette.series(series));
  }
}
