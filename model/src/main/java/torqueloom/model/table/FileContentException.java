package torqueloom.model.table;

import java.io.IOException;

/** A file that could be read but does not hold what it should; the message says where and what. */
public final class FileContentException extends IOException {
  private static final long serialVersionUID = 1L;

  private final String file;
  private final long line;

  /**
   * @param file name of the file as messages show it
   * @param line line from 1, or 0 if there is no single line
   * @param found what stands there
   * @param wanted what should stand there
   */
  public FileContentException(String file, long line, String found, String wanted) {
    super(file + (line > 0 ? ":" + line : "") + ": found " + found + "; " + wanted);
    this.file = file;
    this.line = line;
  }

  /** Name of the file. */
  public String file() {
    return file;
  }

  /** Line from 1, or 0 if there is no single line. */
  public long line() {
    return line;
  }
}
