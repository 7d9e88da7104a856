package torqueloom.app.command;

import torqueloom.model.work.Progress;

/**
 * Progress on standard error: one line overwritten on a terminal, elsewhere one plain line for every
 * tenth, so that a log stays short and readable.
 */
final class ConsoleProgress implements Progress {
  private static final long NANOS_BETWEEN_LINES = 100_000_000L;

  private final Console console;
  private String stage = "";
  private long tenths;
  private long lastShown;
  private int width;

  ConsoleProgress(Console console) {
    this.console = console;
  }

  @Override
  public synchronized void report(String name, long done, long total, String note) {
    final boolean changed = !name.equals(stage);
    final boolean first = changed || total > 0 && done * 10 / total < tenths;
    if (first) {
      stage = name;
      tenths = -1;
    }
    final long now = total <= 0 ? 0 : done * 10 / total;
    if (console.terminal()) {
      overwrite(first || now == 10 && tenths != 10, done, total, note);
    } else if (now > tenths) {
      console.err().println(line(done, total, note));
    }
    tenths = Math.max(tenths, now);
  }

  private void overwrite(boolean always, long done, long total, String note) {
    final long time = System.nanoTime();
    if (!always && time - lastShown < NANOS_BETWEEN_LINES) {
      return;
    }
    lastShown = time;
    final String line = line(done, total, note);
    final int padding = Math.max(0, width - line.length());
    console.err().print("\r" + line + " ".repeat(padding));
    width = line.length();
    if (done >= total) {
      console.err().println();
      width = 0;
    }
    console.err().flush();
  }

  private String line(long done, long total, String note) {
    final long percent = total <= 0 ? 0 : done * 100 / total;
    return stage + " " + percent + " %" + (note.isEmpty() ? "" : ", " + note);
  }
}
