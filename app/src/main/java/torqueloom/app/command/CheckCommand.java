package torqueloom.app.command;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import torqueloom.app.study.PlanEstimate;
import torqueloom.app.study.Study;
import torqueloom.app.study.Use;
import torqueloom.model.table.CanonicalJson;
import torqueloom.training.data.TaskLoader;
import torqueloom.training.data.TaskSplit;
import torqueloom.training.study.StudyPlan;

/** Validates a study and its data and prints the plan. */
@Command(
    name = "check",
    description =
        "Validate a study and its data, print stages, time, memory, disk; compute nothing.")
final class CheckCommand implements Callable<Integer> {
  private final Console console;

  @Mixin StudyOptions options;

  CheckCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() throws Exception {
    final Study study = options.read(Use.CHIPS, console);
    final StudyPlan plan = study.plan();
    final TaskSplit task = TaskLoader.load(plan.task().orElseThrow(), plan.seed());
    options.runFolder(study);
    final PlanEstimate estimate = PlanEstimate.of(plan, task, options.threadCount());
    console
        .out()
        .print(
            options.json
                ? CanonicalJson.text(json(study, task, estimate))
                : text(study, task, estimate));
    return ExitCode.DONE;
  }

  private static Map<String, Object> json(Study study, TaskSplit task, PlanEstimate estimate) {
    final Map<String, Object> document = new LinkedHashMap<>();
    document.put("schema", 1);
    final Map<String, Object> named = new LinkedHashMap<>();
    named.put("name", study.name());
    named.put("seed", study.seed());
    named.put("digest", study.digest());
    document.put("study", named);
    document.put("rows", rows(task));
    final List<Object> stages = new ArrayList<>();
    for (final PlanEstimate.Stage stage : estimate.stages()) {
      final Map<String, Object> entry = new LinkedHashMap<>();
      entry.put("name", stage.name());
      entry.put("seconds", stage.seconds());
      stages.add(entry);
    }
    document.put("stages", stages);
    document.put("memoryBytes", estimate.memoryBytes());
    document.put("diskBytes", estimate.diskBytes());
    document.put("notUsed", study.notices());
    return document;
  }

  private static int[] rows(TaskSplit task) {
    return new int[] {task.train().rows(), task.validation().rows(), task.test().rows()};
  }

  private static String text(Study study, TaskSplit task, PlanEstimate estimate) {
    final int[] rows = rows(task);
    final StringBuilder text = new StringBuilder();
    text.append(study.name()).append(": no fault found\n");
    text.append("digest ").append(study.digest()).append('\n');
    text.append("cases: ").append(rows[0]).append(" training, ").append(rows[1]);
    text.append(" validation, ").append(rows[2]).append(" test; ");
    text.append(task.train().featureCount()).append(" features, ");
    text.append(task.train().classCount()).append(" classes\n\nPlan\n");
    for (final PlanEstimate.Stage stage : estimate.stages()) {
      text.append(String.format("  %-10s about %s%n", stage.name(), duration(stage.seconds())));
    }
    text.append("  in all     about ").append(duration(estimate.seconds())).append('\n');
    text.append("  memory     about ").append(megabytes(estimate.memoryBytes())).append('\n');
    text.append("  disk       about ").append(megabytes(estimate.diskBytes())).append('\n');
    text.append("Estimates: half or twice as much is common. Nothing was run.\n");
    return text.toString();
  }

  private static String duration(double seconds) {
    if (seconds < 100) {
      return Math.max(1, Math.round(seconds)) + " s";
    }
    return seconds < 6000 ? Math.round(seconds / 60) + " min" : Math.round(seconds / 3600) + " h";
  }

  private static String megabytes(long bytes) {
    return Math.max(1, Math.round(bytes / 1e6)) + " MB";
  }
}
