package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.List;
import torqueloom.reports.document.Block;
import torqueloom.reports.document.Cell;
import torqueloom.reports.document.Definitions;
import torqueloom.reports.document.Definitions.Entry;
import torqueloom.reports.document.Paragraph;
import torqueloom.reports.document.Section;
import torqueloom.reports.document.Table;
import torqueloom.reports.document.Text;
import torqueloom.reports.figure.Numbers;
import torqueloom.reports.render.StageTime;
import torqueloom.training.study.StudyResult;

/** Where the numbers come from. */
final class ProvenanceSection {
  private ProvenanceSection() {}

  static Section of(StudyFacts facts, RunFacts run) {
    final StudyResult result = facts.result();
    final List<Entry> entries = new ArrayList<>();
    entries.add(Entry.of("Study", result.plan().name()));
    entries.add(new Entry(Text.of("Digest of study and data"), Text.code(result.plan().digest())));
    entries.add(new Entry(Text.of("Seed"), Text.code(Long.toString(result.plan().seed()))));
    entries.add(Entry.of("Torqueloom", result.version()));
    entries.add(
        new Entry(Text.of("Digest of the response library"), Text.code(result.library().digest())));
    entries.add(Entry.of("Integrator", result.library().kernel()));
    entries.add(Entry.of("Integration steps", Words.count(result.library().replicaSteps())));
    run.provenance().forEach((name, value) -> entries.add(Entry.of(name, value)));
    final List<Block> blocks = new ArrayList<>();
    blocks.add(
        Paragraph.of(
            "The same study, data, seed and version give the same results bit for bit on any number"
                + " of threads of one kind of processor. Times and platform are of this run."));
    blocks.add(new Definitions(entries));
    if (!run.stages().isEmpty()) {
      blocks.add(times(run.stages()));
    }
    return new Section("provenance", "Provenance", blocks);
  }

  private static Table times(List<StageTime> stages) {
    final List<List<Cell>> rows = new ArrayList<>();
    double total = 0;
    for (final StageTime stage : stages) {
      rows.add(row(stage.name(), stage.seconds()));
      total += stage.seconds();
    }
    rows.add(row("all stages", total));
    return new Table(
        "time-table",
        "Time of each stage.",
        List.of(Table.Column.text("Stage"), Table.Column.number("Seconds", "s")),
        rows);
  }

  private static List<Cell> row(String name, double seconds) {
    final String shown = Double.isFinite(seconds) ? Numbers.fixed(seconds, 1) : Words.UNKNOWN;
    return List.of(Cell.of(name), Cell.number(shown, seconds));
  }
}
