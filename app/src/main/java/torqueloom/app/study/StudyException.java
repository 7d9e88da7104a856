package torqueloom.app.study;

import java.util.List;
import java.util.stream.Collectors;

/** Bad input: every fault found in a study, in the order of the file. */
public final class StudyException extends Exception {
  private static final long serialVersionUID = 1L;

  private final transient List<Problem> problems;

  /** @param problems at least one */
  public StudyException(List<Problem> problems) {
    super(problems.stream().map(Problem::format).collect(Collectors.joining("\n")));
    this.problems = List.copyOf(problems);
  }

  /** @param problem the only fault */
  public StudyException(Problem problem) {
    this(List.of(problem));
  }

  /** The faults, in the order of the file. */
  public List<Problem> problems() {
    return problems;
  }
}
