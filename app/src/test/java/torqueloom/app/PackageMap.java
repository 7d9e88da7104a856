package torqueloom.app;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The package map of the program, as the architecture test enforces it.
 *
 * <p>Modules and the packages inside each stand in the order in which they may use each other: a
 * package uses only packages of modules that its own module may use, and packages listed before it
 * in its own. A new package is entered here, with the line in docs/architecture.md.
 */
final class PackageMap {

  /**
   * One module.
   *
   * @param folder its folder beside the root POM
   * @param uses names of the modules it may use
   * @param libraries packages from outside that it may use, besides the Java platform's own
   * @param packages its packages below {@code torqueloom}, each after those it may use
   */
  record Module(String folder, List<String> uses, List<String> libraries, List<String> packages) {}

  private static final List<String> JSON = List.of("tools.jackson", "com.fasterxml.jackson");

  static final List<Module> MODULES =
      List.of(
          new Module(
              "model",
              List.of(),
              with(JSON, "org.apache.commons.math3", "de.siegmar.fastcsv"),
              List.of(
                  "model.units",
                  "model.constants",
                  "model.provenance",
                  "model.random",
                  "model.work",
                  "model.table",
                  "model.magnet",
                  "model.dynamics",
                  "model.device",
                  "model.tolerance",
                  "model.response",
                  "model.synapse",
                  "model.energy")),
          new Module(
              "training",
              List.of("model"),
              with(
                  JSON,
                  "org.apache.commons.math3",
                  "de.siegmar.fastcsv",
                  "org.deeplearning4j",
                  "org.nd4j",
                  "org.bytedeco"),
              List.of(
                  "training.data",
                  "training.encoding",
                  "training.evaluation",
                  "training.chip",
                  "training.layer",
                  "training.learning",
                  "training.oscillator",
                  "training.study")),
          new Module(
              "reports",
              List.of("model", "training"),
              with(JSON, "de.siegmar.fastcsv"),
              List.of(
                  "reports.document", "reports.figure", "reports.render", "reports.feasibility")),
          new Module(
              "datasets-synthetic",
              List.of("model"),
              List.of("org.apache.commons.math3", "de.siegmar.fastcsv"),
              List.of("demo")),
          new Module(
              "app",
              List.of("model", "training", "reports", "datasets-synthetic"),
              with(JSON, "org.snakeyaml.engine", "picocli"),
              List.of("app.study", "app.command", "app")));

  private PackageMap() {}

  private static List<String> with(List<String> some, String... more) {
    final List<String> all = new ArrayList<>(some);
    all.addAll(List.of(more));
    return List.copyOf(all);
  }

  /** Full package name to the full names of the program's packages it may use, itself included. */
  static Map<String, List<String>> allowed() {
    final Map<String, List<String>> allowed = new LinkedHashMap<>();
    for (Module module : MODULES) {
      final List<String> usable = new ArrayList<>();
      MODULES.stream()
          .filter(other -> module.uses().contains(other.folder()))
          .forEach(other -> other.packages().forEach(name -> usable.add("torqueloom." + name)));
      for (String name : module.packages()) {
        usable.add("torqueloom." + name);
        allowed.put("torqueloom." + name, List.copyOf(usable));
      }
    }
    return allowed;
  }

  /** The module that holds a package, by the package's full name. */
  static Module moduleOf(String packageName) {
    return MODULES.stream()
        .filter(
            module ->
                module.packages().stream().anyMatch(p -> packageName.equals("torqueloom." + p)))
        .findFirst()
        .orElseThrow(() -> new AssertionError(packageName + " does not stand in the package map"));
  }
}
