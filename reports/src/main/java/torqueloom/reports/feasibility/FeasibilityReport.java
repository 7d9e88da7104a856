package torqueloom.reports.feasibility;

import java.util.List;
import torqueloom.reports.document.Document;
import torqueloom.reports.document.Section;
import torqueloom.training.study.StudyResult;

/** The whole feasibility report as a document. */
public final class FeasibilityReport {
  private FeasibilityReport() {}

  /**
   * Fills the report.
   *
   * @param result the study's result
   * @param run where and how it was computed
   */
  public static Document of(StudyResult result, RunFacts run) {
    final StudyFacts facts = new StudyFacts(result);
    final List<Section> sections =
        List.of(
            AnswerLead.section(facts),
            DeviceSection.device(facts),
            ResponseSection.of(facts),
            DeviceSection.synapse(facts),
            TrainingSection.of(facts),
            ChipSection.of(facts),
            ToleranceSection.of(facts),
            CostSection.of(facts),
            LimitsSection.assumptions(facts),
            LimitsSection.cautions(),
            ProvenanceSection.of(facts, run));
    return new Document(
        result.plan().name(),
        "Feasibility of a spintronic neural network: does it do the task, at these temperatures,"
            + " with these tolerances?",
        AnswerLead.of(facts),
        sections,
        "Made by Torqueloom "
            + result.version()
            + " from study "
            + shortDigest(result)
            + ", seed "
            + result.plan().seed()
            + ". A model estimate.");
  }

  private static String shortDigest(StudyResult result) {
    final String digest = result.plan().digest();
    return digest.substring(0, Math.min(12, digest.length()));
  }
}
