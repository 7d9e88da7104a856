package torqueloom.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

class ConsoleProgressTest {
  private static String shown(boolean terminal) {
    final ByteArrayOutputStream out = new ByteArrayOutputStream();
    final PrintStream err = new PrintStream(out, true, StandardCharsets.UTF_8);
    final ConsoleProgress progress = new ConsoleProgress(new Console(System.out, err, terminal));
    for (final String stage : new String[] {"calibrate", "train"}) {
      for (int i = 0; i <= 200; i++) {
        progress.report(stage, i, 200, "");
      }
    }
    return out.toString(StandardCharsets.UTF_8);
  }

  @Test
  void plainLinesStandForTenths() {
    final String text = shown(false);
    assertFalse(text.contains("\r"));
    assertEquals(22, text.lines().count(), text);
    assertTrue(text.startsWith("calibrate 0 %"), text);
    assertTrue(text.stripTrailing().endsWith("train 100 %"), text);
  }

  @Test
  void aTerminalLineIsOverwrittenAndEndsAtTheStagesEnd() {
    final String text = shown(true);
    assertTrue(text.startsWith("\rcalibrate 0 %"), text);
    assertEquals(2, text.lines().filter(line -> line.contains("100 %")).count(), text);
  }
}
