package torqueloom.app.study;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.OptionalLong;

/** Studies for tests. */
final class Studies {
  private Studies() {}

  /** The study in which every key stands. */
  static String full() throws IOException {
    try (InputStream in = Studies.class.getResourceAsStream("/torqueloom/app/full.yaml")) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    }
  }

  /** Writes a study and its data into a folder. */
  static Path write(Path folder, String text) throws IOException {
    Files.writeString(folder.resolve("task.csv"), "a,state\n0.1,on\n0.9,off\n");
    return Files.writeString(folder.resolve("study.yaml"), text);
  }

  static Study read(Path folder, String text) throws IOException, StudyException {
    return StudyFile.read(write(folder, text), Use.CHIPS, OptionalLong.empty());
  }
}
