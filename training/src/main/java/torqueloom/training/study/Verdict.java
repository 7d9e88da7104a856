package torqueloom.training.study;

import java.util.List;

/**
 * The answer to the study.
 *
 * @param kind met, not met or undecided
 * @param reasons plain sentences, the most important first
 */
public record Verdict(Kind kind, List<String> reasons) {
  /** The three answers. */
  public enum Kind {
    /** Both intervals lie above the target at every temperature. */
    MET("met"),
    /** Both intervals lie below the target at some temperature. */
    NOT_MET("not-met"),
    /** Neither. */
    UNDECIDED("undecided");

    private final String text;

    Kind(String text) {
      this.text = text;
    }

    /** The word in results. */
    public String text() {
      return text;
    }
  }
}
