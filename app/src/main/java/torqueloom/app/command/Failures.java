package torqueloom.app.command;

import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.util.List;
import java.util.concurrent.CancellationException;
import torqueloom.app.study.Problem;
import torqueloom.app.study.StudyException;
import torqueloom.model.table.FileContentException;
import torqueloom.model.work.RunLock;
import torqueloom.training.data.TaskDataException;
import torqueloom.training.layer.UnfitNativesException;

/** Turns what went wrong into one message and an exit code; stack traces only on demand. */
final class Failures {
  /** When this variable of the environment is set, stack traces are shown. */
  static final String DEBUG = "TORQUELOOM_DEBUG";

  private Failures() {}

  /**
   * Reports a failure.
   *
   * @param failure what a command threw
   * @param err where the message goes
   * @return the exit code
   */
  static int report(Throwable failure, PrintStream err) {
    if (System.getenv(DEBUG) != null) {
      failure.printStackTrace(err);
    }
    if (failure instanceof StudyException bad) {
      return badInput(bad.problems().stream().map(Problem::format).toList(), err);
    }
    if (failure instanceof TaskDataException bad) {
      return badInput(bad.faults(), err);
    }
    if (isBadInput(failure)) {
      err.println("torqueloom: " + failure.getMessage());
      err.println("Nothing was run, nothing was written.");
      return ExitCode.BAD_INPUT;
    }
    if (failure instanceof InterruptedException || failure instanceof CancellationException) {
      err.println("torqueloom: stopped");
      return ExitCode.STOPPED;
    }
    if (failure instanceof UnfitNativesException) {
      err.println("torqueloom: " + failure.getMessage());
      return ExitCode.FAILED;
    }
    err.println("torqueloom: failed: " + words(failure));
    if (System.getenv(DEBUG) == null) {
      err.println("(set " + DEBUG + "=1 to see where)");
    }
    return ExitCode.FAILED;
  }

  private static boolean isBadInput(Throwable failure) {
    return failure instanceof BadInputException
        || failure instanceof FileContentException
        || failure instanceof RunLock.HeldException;
  }

  private static int badInput(List<String> problems, PrintStream err) {
    problems.forEach(err::println);
    final String count = problems.size() == 1 ? "1 problem" : problems.size() + " problems";
    err.println(count + "; nothing was run, nothing was written.");
    return ExitCode.BAD_INPUT;
  }

  private static String words(Throwable failure) {
    if (failure instanceof OutOfMemoryError) {
      return "not enough memory; set TORQUELOOM_JAVA_OPTS=-Xmx2g, say, to allow more";
    }
    if (failure instanceof UncheckedIOException wrapped) {
      return words(wrapped.getCause());
    }
    if (failure instanceof FileSystemException file) {
      return fileWords(file);
    }
    final String message = failure.getMessage();
    return message == null || message.isBlank() ? failure.getClass().getSimpleName() : message;
  }

  /** A file fault in words; Java's own message is often the bare path. */
  static String fileWords(FileSystemException file) {
    final String reason;
    if (file instanceof AccessDeniedException) {
      reason = "permission denied";
    } else if (file instanceof NoSuchFileException) {
      reason = "no such file or folder";
    } else if (file instanceof FileAlreadyExistsException) {
      reason = "a file of that name stands in the way";
    } else {
      reason = file.getReason() == null ? "cannot be used" : file.getReason();
    }
    return file.getFile() + ": " + reason;
  }
}
