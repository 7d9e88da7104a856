package torqueloom.app.command;

import java.io.IOException;
import java.nio.file.FileSystemException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Mixin;
import torqueloom.app.study.Study;
import torqueloom.app.study.Use;
import torqueloom.model.work.Progress;
import torqueloom.training.layer.NativeCheck;
import torqueloom.training.study.StudyPlan;
import torqueloom.training.study.StudyRunner;

/** A command that works in a run folder: reads the study, opens the folder, calls its stage. */
abstract class StageCommand implements Callable<Integer> {
  private final Console console;

  @Mixin StudyOptions options;

  StageCommand(Console console) {
    this.console = console;
  }

  @Override
  public final Integer call() throws Exception {
    final Study study = options.read(goal(), console);
    final Path folder = options.runFolder(study);
    if (usesNetwork()) {
      NativeCheck.ensurePlatform();
    }
    before(study, folder);
    final Progress progress = options.quiet ? Progress.NONE : new ConsoleProgress(console);
    final StudyPlan plan = study.plan();
    try (StudyRunner runner = open(plan, folder, progress)) {
      return work(runner, plan, folder);
    }
  }

  private StudyRunner open(StudyPlan plan, Path folder, Progress progress)
      throws IOException, BadInputException {
    try {
      return StudyRunner.open(plan, folder, options.threadCount(), progress, Version.TEXT);
    } catch (FileSystemException e) {
      // Some systems tell only now that a folder cannot be made or written.
      throw new BadInputException(
          "output folder " + folder + " is not writable: " + Failures.fileWords(e));
    }
  }

  /** The last stage that the study must hold the fields of. */
  Use goal() {
    return Use.CHIPS;
  }

  /** Whether the stage comes to a network, so that a program of another platform stops at once. */
  boolean usesNetwork() {
    return true;
  }

  /** A check before anything is written. */
  void before(Study study, Path folder) throws Exception {}

  /** The stage; returns the exit code. */
  abstract int work(StudyRunner runner, StudyPlan plan, Path folder) throws Exception;

  /** Prints a result: text for people, or a document. */
  final void print(String text) {
    console.out().print(text);
  }
}
