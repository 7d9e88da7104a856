package torqueloom.app.command;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.OptionalLong;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import torqueloom.app.study.Study;
import torqueloom.app.study.StudyException;
import torqueloom.app.study.StudyFile;
import torqueloom.app.study.Use;

/** The study and the options of every command that takes one. */
final class StudyOptions {
  /** Most threads that make sense to ask for. */
  private static final int MOST_THREADS = 1024;

  @Parameters(paramLabel = "STUDY", description = "the study file (YAML)")
  Path study;

  @Option(
      names = "--json",
      description = "print one JSON document on standard output, nothing else")
  boolean json;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      description = "run folder; default: NAME.run beside the study")
  Path out;

  @Option(
      names = "--threads",
      paramLabel = "N",
      description = "threads; default: one for each processor. Results do not depend on it")
  Integer threads;

  @Option(names = "--seed", paramLabel = "N", description = "seed instead of the study's")
  Long seed;

  @Option(names = "--resume", description = "take up a stopped run; refused where none was begun")
  boolean resume;

  @Option(names = "--quiet", description = "no progress, no notices")
  boolean quiet;

  /** Reads the study for a stage; notices go to the console. */
  Study read(Use goal, Console console) throws StudyException, BadInputException {
    checkThreads();
    final Study read =
        StudyFile.read(study, goal, seed == null ? OptionalLong.empty() : OptionalLong.of(seed));
    if (!quiet) {
      read.notices().forEach(notice -> console.err().println("note: " + notice));
    }
    return read;
  }

  /** Threads to use. */
  int threadCount() {
    return threads == null ? Runtime.getRuntime().availableProcessors() : threads;
  }

  /** The run folder, checked to be writable before any work; nothing is created yet. */
  Path runFolder(Study read) throws BadInputException {
    final Path folder = out == null ? read.defaultRunFolder() : out;
    OutputFolder.check(folder);
    if (resume && !Files.isDirectory(folder)) {
      throw new BadInputException(
          "--resume: nothing was begun in " + folder + "; leave --resume out to begin");
    }
    return folder;
  }

  private void checkThreads() throws BadInputException {
    if (threads != null && (threads < 1 || threads > MOST_THREADS)) {
      throw new BadInputException(
          "--threads: found "
              + threads
              + "; a whole number from 1 to "
              + MOST_THREADS
              + " is needed");
    }
  }
}
