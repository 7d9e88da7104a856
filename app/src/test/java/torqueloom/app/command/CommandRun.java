package torqueloom.app.command;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Arrays;

/**
 * One command line, run in this process.
 *
 * @param code exit code
 * @param out standard output
 * @param err standard error
 */
record CommandRun(int code, String out, String err) {
  static CommandRun of(Object... arguments) {
    final ByteArrayOutputStream out = new ByteArrayOutputStream();
    final ByteArrayOutputStream err = new ByteArrayOutputStream();
    final int code =
        Cli.run(
            new PrintStream(out, true, StandardCharsets.UTF_8),
            new PrintStream(err, true, StandardCharsets.UTF_8),
            Arrays.stream(arguments)
                .map(each -> each instanceof Path path ? path.toString() : (String) each)
                .toArray(String[]::new));
    return new CommandRun(
        code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
  }
}
