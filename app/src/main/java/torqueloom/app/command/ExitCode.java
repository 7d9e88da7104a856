package torqueloom.app.command;

/** What a command's exit code means. */
public final class ExitCode {
  /** Targets met, or the command is done. */
  public static final int DONE = 0;

  /** Ran well; the targets are not met, or it is undecided. */
  public static final int NOT_MET = 1;

  /** Bad input; nothing was run, nothing was written. */
  public static final int BAD_INPUT = 2;

  /** Failed. */
  public static final int FAILED = 3;

  /** Stopped by Ctrl-C. */
  public static final int STOPPED = 130;

  private ExitCode() {}
}
