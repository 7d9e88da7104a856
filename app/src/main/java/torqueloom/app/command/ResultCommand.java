package torqueloom.app.command;

import java.nio.file.Files;
import java.nio.file.Path;
import picocli.CommandLine.Command;
import torqueloom.app.study.Study;
import torqueloom.model.provenance.Provenance;
import torqueloom.model.units.QuantityFormat;
import torqueloom.model.units.QuantityKind;
import torqueloom.reports.feasibility.ReportFolder;
import torqueloom.reports.feasibility.VerdictText;
import torqueloom.reports.render.ResultFiles;
import torqueloom.training.study.Interval;
import torqueloom.training.study.StudyPlan;
import torqueloom.training.study.StudyResult;
import torqueloom.training.study.StudyRunner;
import torqueloom.training.study.TemperatureOutcome;
import torqueloom.training.study.Verdict;

/** Commands that end with a whole result: chips, report and run. */
abstract class ResultCommand extends StageCommand {
  ResultCommand(Console console) {
    super(console);
  }

  @Override
  final int work(StudyRunner runner, StudyPlan plan, Path folder) throws Exception {
    final StudyResult result = runner.result();
    final Provenance provenance =
        Provenance.ofThisProcess(plan.digest(), plan.seed(), result.library().kernel());
    ReportFolder.write(folder, result, provenance, runner.seconds());
    print(options.json ? ResultFiles.resultsJson(result) : text(result, folder));
    return code(result);
  }

  /** What is printed for people. */
  String text(StudyResult result, Path folder) {
    final StringBuilder text = new StringBuilder();
    VerdictText.lines(result).forEach(line -> text.append(line).append('\n'));
    return text.append("Report: ")
        .append(folder.resolve(ResultFiles.REPORT))
        .append('\n')
        .toString();
  }

  /** Met or not. */
  int code(StudyResult result) {
    return result.verdict().kind() == Verdict.Kind.MET ? ExitCode.DONE : ExitCode.NOT_MET;
  }

  /** Everything, from study file to report. */
  @Command(name = "run", description = "Everything: device, calibrate, train, chips, report.")
  static final class Run extends ResultCommand {
    Run(Console console) {
      super(console);
    }
  }

  /** Chips, accuracy, yield. */
  @Command(name = "chips", description = "Chips, their accuracy, and the yield.")
  static final class Chips extends ResultCommand {
    Chips(Console console) {
      super(console);
    }

    @Override
    String text(StudyResult result, Path folder) {
      final StringBuilder text = new StringBuilder();
      for (final TemperatureOutcome chips : result.chips()) {
        text.append(QuantityFormat.text(chips.temperatureKelvin(), QuantityKind.TEMPERATURE));
        text.append(": ").append(chips.accuracies().length).append(" chips\n");
        line(text, "median accuracy     ", chips.median());
        line(text, "yield               ", chips.yield());
        line(text, "yield on new cases  ", chips.yieldOnNewCases());
      }
      VerdictText.lines(result).forEach(line -> text.append(line).append('\n'));
      return text.toString();
    }

    private static void line(StringBuilder text, String name, Interval interval) {
      text.append("  ").append(name).append(QuantityFormat.percent(interval.estimate()));
      text.append("  [").append(QuantityFormat.percent(interval.low())).append(", ");
      text.append(QuantityFormat.percent(interval.high())).append("]\n");
    }
  }

  /** The report from what is there. */
  @Command(
      name = "report",
      description = "The report from what is there; computes no stage that is missing.")
  static final class Report extends ResultCommand {
    Report(Console console) {
      super(console);
    }

    @Override
    void before(Study study, Path folder) throws BadInputException {
      if (!Finished.isFor(study, folder)) {
        throw new BadInputException(
            folder
                + " holds no results of this study as it stands now; nothing to report. "
                + "Compute them with: torqueloom run "
                + study.file());
      }
    }

    @Override
    int code(StudyResult result) {
      return ExitCode.DONE;
    }
  }

  /** Whether a folder holds results of a study. */
  private static final class Finished {
    static boolean isFor(Study study, Path folder) {
      final Path results = folder.resolve(ResultFiles.RESULTS);
      try {
        // The digest stands in the results as text; nothing else has its form.
        return Files.isRegularFile(results)
            && Files.readString(results).contains('"' + study.digest() + '"');
      } catch (java.io.IOException e) {
        return false;
      }
    }
  }
}
