package torqueloom.app.command;

import java.nio.file.Files;
import java.nio.file.Path;

/** Checks that a folder can be written, without writing. */
final class OutputFolder {
  private OutputFolder() {}

  /**
   * @param folder a folder that exists or can be made
   * @throws BadInputException if it cannot be written or made
   */
  static void check(Path folder) throws BadInputException {
    Path at = folder.toAbsolutePath().normalize();
    if (Files.exists(at) && !Files.isDirectory(at)) {
      throw new BadInputException(
          "output folder " + folder + ": found a file of that name; a folder is needed");
    }
    while (!Files.exists(at)) {
      at = at.getParent();
      if (at == null) {
        throw new BadInputException("output folder " + folder + ": no part of its path exists");
      }
    }
    if (!Files.isDirectory(at)) {
      throw new BadInputException("output folder " + folder + ": " + at + " is not a folder");
    }
    if (!Files.isWritable(at)) {
      throw new BadInputException(
          "output folder "
              + folder
              + " is not writable: no permission to write in "
              + at
              + "; choose another with --out DIR");
    }
  }
}
