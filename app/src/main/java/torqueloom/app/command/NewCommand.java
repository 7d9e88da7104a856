package torqueloom.app.command;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import torqueloom.demo.PuckDataset;
import torqueloom.model.work.AtomicFiles;

/** Writes a commented starter study with a small task, ready to run. */
@Command(
    name = "new",
    description = "Write a commented starter study and a small task into a folder, ready to run.")
final class NewCommand implements Callable<Integer> {
  /** Name of the study written. */
  static final String STUDY = "starter.yaml";

  /** Name of the task's data written. */
  static final String DATA = "starter.csv";

  /** Rows of the task's data: a run takes about half a minute. */
  private static final int ROWS = 3000;

  private final Console console;

  @Parameters(paramLabel = "DIR", description = "folder to write into; made when it is missing")
  Path folder;

  @Option(names = "--quiet", description = "print nothing")
  boolean quiet;

  NewCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() throws IOException, BadInputException {
    final Path study = folder.resolve(STUDY);
    final Path data = folder.resolve(DATA);
    refuse(study);
    refuse(data);
    OutputFolder.check(folder);
    Files.createDirectories(folder);
    AtomicFiles.write(data, PuckDataset.csv(PuckDataset.SEED, ROWS));
    AtomicFiles.write(study, starter());
    if (!quiet) {
      console.out().println("wrote " + study + " and " + data);
      console.out().println("next: torqueloom run " + study);
    }
    return ExitCode.DONE;
  }

  private static void refuse(Path file) throws BadInputException {
    if (Files.exists(file)) {
      throw new BadInputException(
          file + " exists already and is not overwritten; name another folder");
    }
  }

  /** The starter study. */
  static byte[] starter() throws IOException {
    try (InputStream in = NewCommand.class.getResourceAsStream(STUDY)) {
      return in.readAllBytes();
    }
  }
}
