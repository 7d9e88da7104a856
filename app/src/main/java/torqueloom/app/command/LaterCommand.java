package torqueloom.app.command;

import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Unmatched;

/** A command whose name is fixed but which this version does not have. Says so, does nothing. */
abstract class LaterCommand implements Callable<Integer> {
  private final String name;

  @Parameters(paramLabel = "FILE", arity = "0..*", description = "studies or finished runs")
  List<String> files;

  @Option(names = "--json", description = "not used")
  boolean json;

  @Unmatched List<String> rest;

  LaterCommand(String name) {
    this.name = name;
  }

  @Override
  public Integer call() throws BadInputException {
    throw new BadInputException(
        name
            + " is not in this version, which has: new, check, device, calibrate, train, chips, report, run");
  }

  /** Tuning range. */
  @Command(name = "range", description = "(not in this version) Tuning range of the synapses.")
  static final class Range extends LaterCommand {
    Range(Console console) {
      super("range");
    }
  }

  /** Tolerance budget. */
  @Command(
      name = "budget",
      description = "(not in this version) Tolerance budget and sensitivities.")
  static final class Budget extends LaterCommand {
    Budget(Console console) {
      super("budget");
    }
  }

  /** Replay. */
  @Command(name = "replay", description = "(not in this version) Full-dynamics replay of a sample.")
  static final class Replay extends LaterCommand {
    Replay(Console console) {
      super("replay");
    }
  }

  /** Comparison. */
  @Command(name = "compare", description = "(not in this version) Finished runs side by side.")
  static final class Compare extends LaterCommand {
    Compare(Console console) {
      super("compare");
    }
  }

  /** Sweep. */
  @Command(
      name = "sweep",
      description = "(not in this version) A design over study fields, or many studies.")
  static final class Sweep extends LaterCommand {
    Sweep(Console console) {
      super("sweep");
    }
  }
}
