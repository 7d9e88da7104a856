package torqueloom.model.provenance;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** What Java itself does not tell about the machine. */
final class Platform {
  private static final Path LINUX_PROCESSORS = Path.of("/proc/cpuinfo");
  private static final String UNKNOWN = "unknown";

  /** Read by the native libraries; each can change the last bits of a matrix product. */
  private static final List<String> KERNEL_VARIABLES =
      List.of("OPENBLAS_CORETYPE", "OPENBLAS_NUM_THREADS", "OMP_NUM_THREADS", "MKL_NUM_THREADS");

  private Platform() {}

  /** Those of the given variables that choose native kernels and are set. */
  static Map<String, String> kernelVariables(Map<String, String> environment) {
    final Map<String, String> chosen = new TreeMap<>();
    for (final String name : KERNEL_VARIABLES) {
      if (environment.containsKey(name)) {
        chosen.put(name, environment.get(name));
      }
    }
    return chosen;
  }

  /** The processor's model where the system tells it, else {@code unknown}. */
  static String processor() {
    try {
      if (Files.isReadable(LINUX_PROCESSORS)) {
        return model(Files.readAllLines(LINUX_PROCESSORS, StandardCharsets.ISO_8859_1));
      }
    } catch (final IOException e) {
      // Not worth failing a run for.
    }
    final String windows = System.getenv("PROCESSOR_IDENTIFIER");
    return windows == null ? UNKNOWN : windows;
  }

  static String model(List<String> lines) {
    for (final String line : lines) {
      final int colon = line.indexOf(':');
      if (colon > 0 && line.substring(0, colon).strip().equals("model name")) {
        return line.substring(colon + 1).strip();
      }
    }
    return UNKNOWN;
  }
}
