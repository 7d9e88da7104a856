package torqueloom.app.study;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Collects the faults of one study. */
final class Faults {
  private final String file;
  private final List<Problem> problems = new ArrayList<>();

  /** @param file the file as the user named it */
  Faults(String file) {
    this.file = file;
  }

  void add(Values.Place place, String field, String text) {
    problems.add(new Problem(file, place.line(), place.column(), field, text));
  }

  void add(Problem problem) {
    problems.add(problem);
  }

  boolean isEmpty() {
    return problems.isEmpty();
  }

  /** @throws StudyException with all faults in the order of the file, if there is one */
  void raise() throws StudyException {
    if (!problems.isEmpty()) {
      problems.sort(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column));
      throw new StudyException(problems);
    }
  }
}
