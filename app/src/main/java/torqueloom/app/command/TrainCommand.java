package torqueloom.app.command;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import picocli.CommandLine.Command;
import torqueloom.model.table.CanonicalJson;
import torqueloom.model.units.QuantityFormat;
import torqueloom.training.learning.TrainingHistory;
import torqueloom.training.study.StudyPlan;
import torqueloom.training.study.StudyRunner;
import torqueloom.training.study.TrainingOutcome;

/** The network on the ideal chip. */
@Command(name = "train", description = "Train the network; its accuracy on the ideal chip.")
final class TrainCommand extends StageCommand {
  TrainCommand(Console console) {
    super(console);
  }

  @Override
  int work(StudyRunner runner, StudyPlan plan, Path folder) throws Exception {
    final TrainingOutcome outcome = runner.train();
    print(options.json ? CanonicalJson.text(json(outcome)) : text(outcome));
    return ExitCode.DONE;
  }

  private static Map<String, Object> json(TrainingOutcome outcome) {
    final Map<String, Object> document = new LinkedHashMap<>();
    document.put("schema", 1);
    document.put("ideal", Map.of("accuracy", outcome.ideal()));
    final Map<String, Object> baseline = new LinkedHashMap<>();
    baseline.put("accuracy", outcome.baseline());
    baseline.put("strength", outcome.baselineStrength());
    document.put("baseline", baseline);
    document.put("bestEpoch", outcome.history().bestEpoch());
    document.put("epochs", outcome.history().epochs());
    return document;
  }

  private static String text(TrainingOutcome outcome) {
    final TrainingHistory history = outcome.history();
    final TrainingHistory.Epoch best = history.epochs().get(history.bestEpoch());
    return "Training: "
        + history.epochs().size()
        + " epochs, the weights of epoch "
        + (history.bestEpoch() + 1)
        + " kept\n"
        + "  validation accuracy  "
        + QuantityFormat.percent(best.validationAccuracy())
        + "\n"
        + "  test accuracy        "
        + QuantityFormat.percent(outcome.ideal())
        + " (ideal chip)\n"
        + "  logistic regression  "
        + QuantityFormat.percent(outcome.baseline())
        + " on the same cases\n";
  }
}
