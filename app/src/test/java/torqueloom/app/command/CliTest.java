package torqueloom.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** What no command expects still ends in one sentence and the exit code of a failure. */
class CliTest {
  private final ByteArrayOutputStream err = new ByteArrayOutputStream();
  private final PrintStream stream = new PrintStream(err, true, StandardCharsets.UTF_8);
  private final Console console = new Console(stream, stream, false);

  private String failing(Error error) {
    assertEquals(
        ExitCode.FAILED,
        Cli.guarded(
            console,
            () -> {
              throw error;
            }));
    return err.toString(StandardCharsets.UTF_8);
  }

  @Test
  void tooLittleMemoryIsSaidInWords() {
    final String said = failing(new OutOfMemoryError("Java heap space"));
    assertTrue(said.contains("not enough memory"), said);
    assertFalse(said.contains("at torqueloom"), said);
  }

  @Test
  void otherErrorsAreFailuresWithoutAStackTrace() {
    final String said = failing(new StackOverflowError());
    assertTrue(said.contains("StackOverflowError"), said);
    assertFalse(said.contains("at torqueloom"), said);
  }
}
