package torqueloom.model.work;

import java.util.List;
import java.util.ServiceLoader;

/**
 * Another way to run units than threads of this process, found through {@link ServiceLoader} if its
 * module is on the class path. Implementations have a public constructor without arguments.
 */
public interface EngineProvider {
  /** The name by which a user asks for it. */
  String name();

  /** Whether it can run here. */
  boolean available();

  /**
   * Starts the engine.
   *
   * @param threads units that may run at once, at least 1
   * @param store where results are found and kept, or null
   * @param progress told how far the work is
   */
  Engine open(int threads, RunStore store, Progress progress);

  /** The providers on the class path that can run here. */
  static List<EngineProvider> installed() {
    return ServiceLoader.load(EngineProvider.class).stream()
        .map(ServiceLoader.Provider::get)
        .filter(EngineProvider::available)
        .toList();
  }
}
