package torqueloom.app.command;

import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The program as a whole. */
@Command(
    name = "torqueloom",
    description = {
      "Hardware-feasibility reports for networks of spintronic neurons:",
      "one study file in, one report out."
    },
    synopsisSubcommandLabel = "COMMAND",
    commandListHeading = "%nCommands:%n",
    footer = {
      "",
      "Exit codes: 0 targets met or command done, 1 targets not met or undecided,",
      "2 bad input, 3 failed, 130 stopped by Ctrl-C.",
      "Begin with: torqueloom new DIR"
    },
    subcommands = {
      NewCommand.class,
      CheckCommand.class,
      DeviceCommand.class,
      CalibrateCommand.class,
      TrainCommand.class,
      ResultCommand.Chips.class,
      ResultCommand.Report.class,
      ResultCommand.Run.class,
      LaterCommand.Range.class,
      LaterCommand.Budget.class,
      LaterCommand.Replay.class,
      LaterCommand.Compare.class,
      LaterCommand.Sweep.class,
      CommandLine.HelpCommand.class
    })
final class TorqueloomCommand implements Runnable {
  @Spec CommandSpec spec;

  @Override
  public void run() {
    throw new ParameterException(spec.commandLine(), "a command is needed");
  }
}
