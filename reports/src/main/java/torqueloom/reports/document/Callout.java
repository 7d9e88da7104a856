package torqueloom.reports.document;

import java.util.List;

/**
 * A passage set apart.
 *
 * @param tone why it is set apart
 * @param title its first line
 * @param blocks what it says
 */
public record Callout(Tone tone, String title, List<Block> blocks) implements Block {
  /** Reasons to set a passage apart. */
  public enum Tone {
    /** Worth knowing. */
    NOTE,
    /** Something to be careful with. */
    CAUTION,
    /** The targets are met. */
    MET,
    /** The targets are not met. */
    NOT_MET,
    /** The question is open. */
    UNDECIDED
  }

  /** Copies the list. */
  public Callout {
    blocks = List.copyOf(blocks);
  }
}
