package torqueloom.reports.feasibility;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Map;
import torqueloom.model.provenance.Provenance;
import torqueloom.reports.render.ResultFiles;
import torqueloom.training.study.StudyResult;

/** Writes everything that a finished study leaves in its run folder for people and programs. */
public final class ReportFolder {
  private ReportFolder() {}

  /**
   * Writes {@code report.html}, {@code tables/*.csv}, {@code provenance.json}, {@code timing.json},
   * and last {@code results.json}, so that results stand only beside a report of their own.
   *
   * @param folder run folder, which exists
   * @param result the study's result
   * @param provenance how it was made
   * @param seconds seconds by stage, in order
   * @return path of the report
   * @throws IOException if a file cannot be written
   */
  public static Path write(
      Path folder, StudyResult result, Provenance provenance, Map<String, Double> seconds)
      throws IOException {
    final RunFacts run = RunFacts.of(provenance, seconds);
    ResultFiles.writeReport(folder, FeasibilityReport.of(result, run));
    ResultFiles.writeProvenance(folder, provenance.asMap());
    ResultFiles.writeTiming(folder, run.stages());
    ResultFiles.writeResults(folder, result);
    return folder.resolve(ResultFiles.REPORT);
  }
}
