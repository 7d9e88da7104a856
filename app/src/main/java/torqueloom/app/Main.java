package torqueloom.app;

import torqueloom.app.command.Cli;

/** Entry point of the program. */
public final class Main {
  private Main() {}

  /**
   * Starts the program and ends the process with its exit code.
   *
   * @param args the command line
   */
  public static void main(String[] args) {
    System.exit(Cli.runProcess(args));
  }
}
