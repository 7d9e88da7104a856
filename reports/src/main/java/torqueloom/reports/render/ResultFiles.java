package torqueloom.reports.render;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import torqueloom.model.table.CanonicalJson;
import torqueloom.model.work.AtomicFiles;
import torqueloom.reports.document.Document;
import torqueloom.reports.document.Table;
import torqueloom.training.study.StudyResult;

/** Writes the files of a run folder that hold results, whole or not at all. */
public final class ResultFiles {
  /** The results. */
  public static final String RESULTS = "results.json";

  /** The page for people. */
  public static final String REPORT = "report.html";

  /** Where and with what the results were computed. */
  public static final String PROVENANCE = "provenance.json";

  /** How long each stage took. */
  public static final String TIMING = "timing.json";

  /** Folder of the report's tables. */
  public static final String TABLES = "tables";

  private ResultFiles() {}

  /** Text of {@code results.json}; the same result gives the same bytes. */
  public static String resultsJson(StudyResult result) {
    return CanonicalJson.text(ResultsTree.of(result));
  }

  /**
   * Writes {@code results.json}, keeping a former one that differs.
   *
   * @throws IOException if it cannot be written
   */
  public static void writeResults(Path folder, StudyResult result) throws IOException {
    KeptFiles.write(folder.resolve(RESULTS), resultsJson(result));
  }

  /**
   * Writes {@code report.html}, keeping a former one that differs, and each table of the document as
   * {@code tables/ID.csv}.
   *
   * @throws IOException if a file cannot be written
   */
  public static void writeReport(Path folder, Document document) throws IOException {
    KeptFiles.write(folder.resolve(REPORT), HtmlPage.of(document));
    final Path tables = Files.createDirectories(folder.resolve(TABLES));
    for (final Table table : document.tables()) {
      AtomicFiles.write(tables.resolve(table.id() + ".csv"), TableCsv.of(table));
    }
  }

  /**
   * Writes {@code provenance.json}.
   *
   * @param provenance facts by name, in order
   * @throws IOException if it cannot be written
   */
  public static void writeProvenance(Path folder, Map<String, ?> provenance) throws IOException {
    CanonicalJson.write(folder.resolve(PROVENANCE), provenance);
  }

  /**
   * Writes {@code timing.json}: {@code [{"name","seconds"}]}.
   *
   * @throws IOException if it cannot be written
   */
  public static void writeTiming(Path folder, List<StageTime> stages) throws IOException {
    CanonicalJson.write(folder.resolve(TIMING), stages);
  }
}
