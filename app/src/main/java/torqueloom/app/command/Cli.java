package torqueloom.app.command;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.function.IntSupplier;
import picocli.CommandLine;
import picocli.CommandLine.IFactory;
import picocli.CommandLine.ParameterException;

/** Runs one command line. */
public final class Cli {
  private Cli() {}

  /**
   * Runs a command line as the program does: on the process's own streams, stopped cleanly by
   * Ctrl-C.
   *
   * @param arguments the words after the program's name
   * @return the exit code
   */
  public static int runProcess(String... arguments) {
    final PrintStream out = utf8(FileDescriptor.out);
    final PrintStream err = utf8(FileDescriptor.err);
    // Whatever a library prints must not get between a result's bytes.
    System.setOut(err);
    System.setErr(err);
    final Console console = new Console(out, err, Terminal.isStandardError());
    return StopSignal.guard(() -> run(console, arguments));
  }

  /**
   * Runs a command line on given streams.
   *
   * @param out results
   * @param err everything else
   * @param arguments the words after the program's name
   * @return the exit code
   */
  public static int run(PrintStream out, PrintStream err, String... arguments) {
    return run(new Console(out, err, false), arguments);
  }

  private static int run(Console console, String... arguments) {
    return guarded(
        console,
        () -> {
          if (isVersion(arguments)) {
            console.out().println("torqueloom " + Version.TEXT);
            return ExitCode.DONE;
          }
          return commandLine(console).execute(arguments);
        });
  }

  /** The parser passes on exceptions of commands, but not errors such as too little memory. */
  static int guarded(Console console, IntSupplier work) {
    try {
      return work.getAsInt();
    } catch (Throwable e) {
      return Failures.report(e, console.err());
    } finally {
      console.out().flush();
      console.err().flush();
    }
  }

  /** The version is asked for often and needs no parser. */
  private static boolean isVersion(String... arguments) {
    return arguments.length > 0 && (arguments[0].equals("--version") || arguments[0].equals("-V"));
  }

  private static CommandLine commandLine(Console console) {
    final CommandLine line = new CommandLine(new TorqueloomCommand(), factory(console));
    for (final CommandLine each : line.getSubcommands().values()) {
      if (!(each.getCommand() instanceof CommandLine.HelpCommand)) {
        each.getCommandSpec().mixinStandardHelpOptions(true);
      }
    }
    line.getCommandSpec().mixinStandardHelpOptions(true);
    line.getCommandSpec().version("torqueloom " + Version.TEXT);
    line.setOut(new PrintWriter(console.out(), true, StandardCharsets.UTF_8));
    line.setErr(new PrintWriter(console.err(), true, StandardCharsets.UTF_8));
    line.setParameterExceptionHandler((e, args) -> badCommandLine(e, console));
    line.setExecutionExceptionHandler((e, commandLine, parse) -> Failures.report(e, console.err()));
    return line;
  }

  private static int badCommandLine(ParameterException e, Console console) {
    final String command = e.getCommandLine().getCommandSpec().qualifiedName();
    console.err().println("torqueloom: " + e.getMessage());
    console.err().println("(see: " + command + " --help)");
    return ExitCode.BAD_INPUT;
  }

  /** Commands get the console; everything else is made the usual way. */
  private static IFactory factory(Console console) {
    final IFactory usual = CommandLine.defaultFactory();
    return new IFactory() {
      @Override
      public <K> K create(Class<K> type) throws Exception {
        try {
          final var constructor = type.getDeclaredConstructor(Console.class);
          constructor.setAccessible(true);
          return constructor.newInstance(console);
        } catch (NoSuchMethodException e) {
          return usual.create(type);
        }
      }
    };
  }

  private static PrintStream utf8(FileDescriptor descriptor) {
    return new PrintStream(new FileOutputStream(descriptor), false, StandardCharsets.UTF_8);
  }
}
