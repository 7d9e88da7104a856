package torqueloom.app.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** Tells whether standard error is a terminal. Java knows it of all streams together only. */
final class Terminal {
  private Terminal() {}

  static boolean isStandardError() {
    if ("dumb".equals(System.getenv("TERM"))) {
      return false;
    }
    try {
      final String target = Files.readSymbolicLink(Path.of("/proc/self/fd/2")).toString();
      return target.startsWith("/dev/pts/") || target.startsWith("/dev/tty");
    } catch (IOException | UnsupportedOperationException e) {
      return System.console() != null;
    }
  }
}
