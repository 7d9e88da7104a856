package torqueloom.model.work;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RunLockTest {
  @TempDir Path folder;

  @Test
  void keepsASecondRunOfThisProcessOut() throws IOException {
    try (RunLock lock = RunLock.acquire(folder)) {
      final RunLock.HeldException held =
          assertThrows(RunLock.HeldException.class, () -> RunLock.acquire(folder.resolve(".")));
      assertTrue(held.getMessage().contains("in use by another run"), held.getMessage());
    }
    RunLock.acquire(folder).close();
  }

  @Test
  void aStaleFileLocksNothing() throws IOException {
    Files.writeString(folder.resolve(RunLock.FILE), "process 1\n");
    RunLock.acquire(folder).close();
  }

  @Test
  void aMissingFolderIsAnError() {
    assertThrows(IOException.class, () -> RunLock.acquire(folder.resolve("none")));
  }

  @Test
  void keepsAnotherProcessOutUntilItEndsHoweverItEnds() throws Exception {
    final Process child = ChildProcess.start("lock", folder);
    try {
      assertEquals("locked", ChildProcess.output(child).readLine());
      final RunLock.HeldException held =
          assertThrows(RunLock.HeldException.class, () -> RunLock.acquire(folder));
      assertTrue(held.getMessage().contains("process " + child.pid()), held.getMessage());
    } finally {
      child.destroyForcibly();
    }
    assertTrue(child.waitFor(10, TimeUnit.SECONDS));
    RunLock.acquire(folder).close();
  }

  /**
   * A refused second attempt must not give the first lock away (POSIX locks belong to a process).
   */
  @Test
  void aRefusedAttemptDoesNotFreeTheFolder() throws Exception {
    try (RunLock lock = RunLock.acquire(folder)) {
      assertThrows(RunLock.HeldException.class, () -> RunLock.acquire(folder));
      final Process child = ChildProcess.start("lock", folder);
      assertEquals(null, ChildProcess.output(child).readLine());
      assertTrue(child.waitFor(10, TimeUnit.SECONDS));
      assertEquals(1, child.exitValue());
    }
  }
}
