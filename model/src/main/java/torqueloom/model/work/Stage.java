package torqueloom.model.work;

import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;

/**
 * The units of one step of a run, which all give the same kind of result.
 *
 * @param name name of the stage, such as {@code calibrate}
 * @param digest digest of all that the results depend on; a stored result of another digest is
 *     stale
 * @param units the units, each with its own key
 * @param codec how results are stored
 * @param <R> what a unit computes
 */
public record Stage<R>(
    String name, String digest, List<? extends WorkUnit<R>> units, Codec<R> codec) {

  /**
   * @throws IllegalArgumentException if two units have the same key
   */
  public Stage {
    Objects.requireNonNull(name, "name");
    Objects.requireNonNull(digest, "digest");
    Objects.requireNonNull(codec, "codec");
    units = List.copyOf(units);
    final Set<String> keys = new HashSet<>();
    for (final WorkUnit<R> unit : units) {
      if (!keys.add(unit.key())) {
        throw new IllegalArgumentException("stage " + name + " has two units " + unit.key());
      }
    }
  }
}
