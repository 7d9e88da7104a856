package torqueloom.training.study;

import java.util.List;

/**
 * The answer to the study.
 *
 * @param kind met, not met or undecided
 * @param reasons plain sentences, the most important first
 */
public record Verdict(Kind kind, List<String> reasons) {
  /** The three answers, by the two intervals of the yield and its target. */
  public enum Kind {
    /** Both intervals, on this test set and on new cases, lie above it at every temperature. */
    MET("met"),
    /**
     * Both intervals lie below the target at some temperature, be the others open or above: a chip
     * has to work at all of them.
     */
    NOT_MET("not-met"),
    /** Neither; the reasons begin with what would decide at each open temperature. */
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
