package torqueloom.training.layer;

import java.io.IOException;
import java.nio.file.Path;

/** A network file that is refused; the message names the file and what was found. */
public final class NetworkFileException extends IOException {
  private static final long serialVersionUID = 1L;

  NetworkFileException(Path path, String found) {
    super(path + ": refused as a network file: " + found);
  }
}
