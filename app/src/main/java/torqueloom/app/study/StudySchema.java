package torqueloom.app.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiConsumer;

/** All keys of a study, format version 1. */
final class StudySchema {
  /** Largest seed, 2^53 - 1: every whole number up to it survives any JSON reader. */
  static final long LARGEST_SEED = (1L << 53) - 1;

  private static final ValueType.Section ROOT =
      new ValueType.Section(
          List.of(
              Key.whole("torqueloom", 1, 1)
                  .must()
                  .doc(Use.STUDY, "format version of the study file"),
              Key.of("name", new ValueType.Text())
                  .doc(Use.STUDY, "name of the proposal; the file's name when left out"),
              Key.whole("seed", 0, LARGEST_SEED)
                  .standard("1")
                  .doc(Use.STUDY, "seed of all random numbers; --seed overrides it"),
              DeviceKeys.device(),
              DeviceKeys.protocol(),
              CalibrationKeys.tolerances(),
              CalibrationKeys.trim(),
              CalibrationKeys.calibration(),
              SynapseKeys.synapse(),
              NetworkKeys.task(),
              NetworkKeys.network(),
              NetworkKeys.training(),
              NetworkKeys.evaluation(),
              NetworkKeys.targets(),
              NetworkKeys.range(),
              NetworkKeys.budget(),
              NetworkKeys.replay()));

  private static final String TOP = "the top level";

  private StudySchema() {}

  static ValueType.Section root() {
    return ROOT;
  }

  /** Whether a dotted key holds a list. */
  static boolean isList(String path) {
    return find(path).map(key -> key.type() instanceof ValueType.Many).orElse(false);
  }

  /** The key of a dotted name. */
  static Optional<Key> find(String path) {
    List<Key> keys = ROOT.keys();
    Optional<Key> found = Optional.empty();
    for (final String name : path.split("\\.")) {
      found = keys.stream().filter(key -> key.name().equals(name)).findFirst();
      keys = found.map(key -> inner(key.type())).orElse(List.of());
    }
    return found;
  }

  /**
   * The block that knows a key, for advice on a key that stands in the wrong one.
   *
   * @param name the key
   * @param wrong the block it stands in; blocks near to it come first
   */
  static Optional<String> blockOf(String name, String wrong) {
    final List<String> blocks = new ArrayList<>();
    walk(
        (path, key) -> {
          if (key.name().equals(name)) {
            blocks.add(path.equals(name) ? TOP : path.substring(0, path.lastIndexOf('.')));
          }
        });
    final List<String> near =
        blocks.stream().filter(block -> !wrong.isEmpty() && top(block).equals(top(wrong))).toList();
    final List<String> best = near.isEmpty() ? blocks : near;
    return best.size() == 1 ? Optional.of(best.get(0)) : Optional.empty();
  }

  private static String top(String path) {
    final int dot = path.indexOf('.');
    return dot < 0 ? path : path.substring(0, dot);
  }

  /** Calls for every key with its dotted name, blocks before their keys. */
  static void walk(BiConsumer<String, Key> visitor) {
    walk("", ROOT.keys(), visitor);
  }

  private static void walk(String block, List<Key> keys, BiConsumer<String, Key> visitor) {
    for (final Key key : keys) {
      final String path = block.isEmpty() ? key.name() : block + "." + key.name();
      visitor.accept(path, key);
      walk(path, inner(key.type()), visitor);
    }
  }

  /** The keys of a block; none for other types. */
  static List<Key> inner(ValueType type) {
    if (type instanceof ValueType.Section section) {
      return section.keys();
    }
    if (type instanceof ValueType.WordOr either) {
      return inner(either.other());
    }
    return type instanceof ValueType.FileOr either ? either.block().keys() : List.of();
  }
}
