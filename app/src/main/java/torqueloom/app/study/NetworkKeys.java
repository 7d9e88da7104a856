package torqueloom.app.study;

import static torqueloom.app.study.Key.choice;
import static torqueloom.app.study.Key.flag;
import static torqueloom.app.study.Key.quantity;
import static torqueloom.app.study.Key.section;
import static torqueloom.app.study.Key.whole;
import static torqueloom.app.study.Use.CHIPS;
import static torqueloom.app.study.Use.LATER;
import static torqueloom.app.study.Use.TRAIN;
import static torqueloom.model.units.QuantityKind.RATIO;
import static torqueloom.model.units.QuantityKind.TEMPERATURE;

import java.util.List;

/** Keys of the task, the network, its training, the chips and the targets. */
final class NetworkKeys {
  private NetworkKeys() {}

  static Key task() {
    final ValueType.Section pair =
        new ValueType.Section(
            List.of(
                Key.of("features", new ValueType.FilePath("features as IDX (plain or gz) or NPY"))
                    .must()
                    .doc(TRAIN, "features, first axis the cases"),
                Key.of("labels", new ValueType.FilePath("labels as IDX (plain or gz) or NPY"))
                    .must()
                    .doc(TRAIN, "labels, one a case")));
    return section(
            "task",
            Key.of(
                    "data",
                    new ValueType.FileOr(new ValueType.FilePath("a CSV with a header"), pair))
                .doc(TRAIN, "all cases in one file; split by the keys of split"),
            Key.of("train", new ValueType.FilePath("a CSV with a header"))
                .doc(TRAIN, "training cases, together with test instead of data"),
            Key.of("test", new ValueType.FilePath("a CSV with a header"))
                .doc(TRAIN, "test cases, together with train"),
            Key.of("label", new ValueType.Text())
                .standard("label")
                .doc(TRAIN, "header of the label column in CSV files"),
            section(
                    "split",
                    share("train", "60 %", "training cases"),
                    share("validation", "20 %", "cases for early stopping and choices"),
                    share("test", "20 %", "test cases; not used with train and test files"))
                .standard("{}")
                .doc(TRAIN, "shares of the cases; the sum is 100 % (with a test file: at most)"))
        .must()
        .doc(TRAIN, "the task's data");
  }

  private static Key share(String name, String standard, String line) {
    return quantity(name, RATIO, standard, "> 0", "< 100 %").standard(standard).doc(TRAIN, line);
  }

  static Key network() {
    return section(
            "network",
            choice("kind", "feed-forward")
                .later("stdp", "reservoir", "synchronization", "chain")
                .standard("feed-forward")
                .doc(TRAIN, "shape of the network"),
            Key.of("hidden", new ValueType.Many(new ValueType.Whole(1, 4096), 1, 8))
                .must()
                .doc(TRAIN, "neurons of each hidden layer"),
            whole("slots", 1, 1000).standard("8").doc(TRAIN, "slots of one inference"),
            choice("output", "weighted-sum", "device")
                .standard("weighted-sum")
                .doc(TRAIN, "who sums the last counts: the electronics, or device neurons"),
            choice("encoder", "amplitude")
                .later("rate", "latency", "population", "threshold-crossing")
                .standard("amplitude")
                .doc(TRAIN, "how a feature enters: as a constant level in every slot"),
            whole("input-levels", 0, 65_536)
                .standard("0")
                .doc(TRAIN, "levels of the encoder, 0 for continuous, else at least 2"),
            quantity("input-full-scale", RATIO, "4", "> 0", "<= 100")
                .standard("4")
                .doc(TRAIN, "counts per slot that a feature at its upper end stands for"))
        .must()
        .doc(TRAIN, "the network");
  }

  static Key training() {
    return section(
            "training",
            choice("method", "surrogate-gradient")
                .later("stdp", "ridge")
                .standard("surrogate-gradient")
                .doc(TRAIN, "training method"),
            whole("epochs", 1, 100_000).standard("60").doc(TRAIN, "most passes over the cases"),
            whole("batch", 1, 65_536).standard("64").doc(TRAIN, "cases of one step"),
            quantity("learning-rate", RATIO, "0.003", "> 0", "<= 1")
                .standard("0.003")
                .doc(TRAIN, "step of the updater"),
            flag("variation-aware")
                .standard("true")
                .doc(TRAIN, "each step draws new devices and write errors"),
            choice("surrogate", "response")
                .later("fast-sigmoid", "arctan", "triangle")
                .standard("response")
                .doc(TRAIN, "derivative in the backward pass: of the calibrated mean response"),
            Key.of(
                    "surrogate-width",
                    new ValueType.WordOr(
                        "auto",
                        new ValueType.Quantity(
                            RATIO,
                            List.of(Bound.of("> 0", RATIO), Bound.of("<= 100", RATIO)),
                            "0.5")))
                .standard("auto")
                .doc(TRAIN, "width, in units of unit-drive, by which the derivative is widened"),
            whole("patience", 1, 100_000)
                .standard("20")
                .doc(TRAIN, "epochs without a better validation accuracy before it stops"))
        .standard("{}")
        .doc(TRAIN, "how the network is trained");
  }

  static Key evaluation() {
    return section(
            "evaluation",
            whole("chips", 1, 1_000_000).standard("1000").doc(CHIPS, "number of chips"),
            whole("noise-passes", 1, 1000)
                .standard("4")
                .doc(CHIPS, "thermal draws of the test cases on each chip"),
            Key.of(
                    "temperatures",
                    new ValueType.Many(
                        new ValueType.Quantity(
                            TEMPERATURE,
                            List.of(
                                Bound.of("> 0 K", TEMPERATURE), Bound.of("<= 1000 K", TEMPERATURE)),
                            "300 K"),
                        1,
                        100))
                .standard("= device.temperature")
                .doc(CHIPS, "temperatures at which chips are judged"),
            section(
                    "faults",
                    fault("dead", "share of neurons that never count"),
                    fault("always-firing", "share of neurons that always count"),
                    fault("stuck-synapse", "share of synapses stuck at one level"))
                .standard("{}")
                .doc(LATER, "defects; chips are drawn without any"))
        .standard("{}")
        .doc(CHIPS, "what is evaluated on chips");
  }

  private static Key fault(String name, String line) {
    return quantity(name, RATIO, "0 %", ">= 0", "<= 100 %").standard("0 %").doc(LATER, line);
  }

  static Key targets() {
    return section(
            "targets",
            quantity("accuracy", RATIO, "90 %", "> 0", "< 100 %")
                .must()
                .doc(CHIPS, "accuracy that a chip must reach"),
            quantity("yield", RATIO, "90 %", "> 0", "< 100 %")
                .must()
                .doc(CHIPS, "share of chips that must reach it"),
            quantity("confidence", RATIO, "95 %", ">= 50 %", "< 100 %")
                .standard("95 %")
                .doc(CHIPS, "confidence of the decision"))
        .must()
        .doc(CHIPS, "what the proposal must reach");
  }

  static Key range() {
    return section(
            "range",
            shares("ranges", "10 %", "tuning ranges to try"),
            Key.of("levels", new ValueType.Many(new ValueType.Whole(2, 1 << 20), 1, 100))
                .doc(LATER, "numbers of levels to try"),
            shares("write-errors", "1 %", "write errors to try"),
            choice("retrain", "none", "fine-tune", "full")
                .standard("fine-tune")
                .doc(LATER, "training of each cell"))
        .doc(LATER, "tuning range of the synapses: range x levels x write error");
  }

  private static Key shares(String name, String example, String line) {
    final List<Bound> bounds = List.of(Bound.of(">= 0", RATIO), Bound.of("<= 200 %", RATIO));
    final ValueType share = new ValueType.Quantity(RATIO, bounds, example);
    return Key.of(name, new ValueType.Many(share, 1, 100)).doc(LATER, line);
  }

  static Key budget() {
    return section(
            "budget",
            whole("chips", 1, 1_000_000).standard("512").doc(LATER, "chips of each point"))
        .doc(LATER, "tolerance budget and sensitivities");
  }

  static Key replay() {
    return section(
            "replay",
            whole("cases", 1, 1_000_000).standard("500").doc(LATER, "test cases replayed"),
            whole("chips", 1, 1_000_000).standard("10").doc(LATER, "chips replayed"))
        .doc(LATER, "replay of a sample through full dynamics");
  }
}
