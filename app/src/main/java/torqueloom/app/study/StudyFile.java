package torqueloom.app.study;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import org.snakeyaml.engine.v2.nodes.MappingNode;

/** Reads study files. */
public final class StudyFile {
  private static final List<String> DEFECTS =
      List.of(
          "evaluation.faults.dead",
          "evaluation.faults.always-firing",
          "evaluation.faults.stuck-synapse");

  private StudyFile() {}

  /**
   * Reads a study with all its checks.
   *
   * @param path the study file
   * @param goal last stage wanted; blocks that only later stages read need not stand, and the
   *     task's data files are looked for from {@link Use#TRAIN} on
   * @param seed replaces the study's seed
   * @return the study, defaults filled in
   * @throws StudyException with every fault found
   */
  public static Study read(Path path, Use goal, OptionalLong seed) throws StudyException {
    final String shown = path.toString();
    final MappingNode root = YamlSource.read(path, shown);
    final Faults faults = new Faults(shown);
    final Values values = new Values();
    final List<String> notices = new SchemaReader(goal, faults, values).read(root);
    override(shown, values, seed);
    new CrossChecks(values, faults, goal).run();
    final Path folder = folderOf(path);
    final boolean data = goal.compareTo(Use.TRAIN) >= 0;
    final Map<String, String> digests = data ? DataFiles.digests(values, folder, faults) : Map.of();
    faults.raise();
    if (DEFECTS.stream().anyMatch(key -> values.number(key) > 0)) {
      notices.add("chips are drawn without defects, although evaluation.faults asks for some");
    }
    return new Study(path, values, notices, StudyDigest.of(values, digests), data);
  }

  /** Name of a study: the file's name without its ending. */
  static String nameOf(Path path) {
    final String file = path.getFileName().toString();
    final int dot = file.lastIndexOf('.');
    return dot > 0 ? file.substring(0, dot) : file;
  }

  static Path folderOf(Path path) {
    final Path parent = path.getParent();
    return parent == null ? Path.of("") : parent;
  }

  private static void override(String shown, Values values, OptionalLong seed)
      throws StudyException {
    if (values.find("name").isEmpty() && !values.isWritten("name")) {
      values.put("name", nameOf(Path.of(shown)));
    }
    if (seed.isPresent()) {
      if (seed.getAsLong() < 0 || seed.getAsLong() > StudySchema.LARGEST_SEED) {
        throw new StudyException(
            new Problem(
                "--seed",
                0,
                0,
                "",
                "found "
                    + seed.getAsLong()
                    + "; a whole number from 0 to "
                    + StudySchema.LARGEST_SEED
                    + " is needed"));
      }
      values.put("seed", seed.getAsLong());
    }
  }
}
