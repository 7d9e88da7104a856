package torqueloom.app;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.Dependency;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import torqueloom.app.PackageMap.Module;

/**
 * Holds the program to its {@link PackageMap} and to the rules of the house that a compiler does
 * not see. Packages that do not exist yet are allowed; what exists must obey.
 */
class ArchitectureTest {
  private static JavaClasses classes;

  /** Full package name to the module folders whose main sources hold it. */
  private static Map<String, Set<String>> sources;

  @BeforeAll
  static void read() throws IOException {
    classes =
        new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("torqueloom");
    sources = new TreeMap<>();
    for (Module module : PackageMap.MODULES) {
      final Path root = sourceRoot(module);
      if (Files.isDirectory(root)) {
        try (Stream<Path> files = Files.walk(root)) {
          files
              .filter(file -> file.toString().endsWith(".java"))
              .map(file -> packageOf(root, file))
              .forEach(
                  name -> sources.computeIfAbsent(name, k -> new TreeSet<>()).add(module.folder()));
        }
      }
    }
  }

  /** Guards the other tests against looking at nothing. */
  @Test
  void everyPackageWithSourcesIsSeen() {
    final Set<String> seen =
        classes.stream().map(JavaClass::getPackageName).collect(Collectors.toSet());
    assertTrue(seen.contains("torqueloom.model.random"), "no class of the model is seen");
    assertTrue(seen.contains("torqueloom.training.layer"), "no class of the training is seen");
    final Set<String> unseen = new TreeSet<>();
    for (String name : sources.keySet()) {
      if (!seen.contains(name) && hasClasses(name)) {
        unseen.add(name);
      }
    }
    assertEquals(Set.of(), unseen, "packages whose classes are not on the test's class path");
  }

  @Test
  void everyPackageStandsInTheMapInOneModule() {
    for (Map.Entry<String, Set<String>> entry : sources.entrySet()) {
      assertEquals(
          Set.of(PackageMap.moduleOf(entry.getKey()).folder()), entry.getValue(), entry.getKey());
    }
    for (JavaClass type : classes) {
      PackageMap.moduleOf(type.getPackageName());
    }
  }

  @Test
  void aPackageUsesOnlyPackagesBeforeIt() {
    final Map<String, List<String>> allowed = PackageMap.allowed();
    final Set<String> faults = new TreeSet<>();
    for (JavaClass type : classes) {
      final List<String> usable = allowed.getOrDefault(type.getPackageName(), List.of());
      for (Dependency dependency : type.getDirectDependenciesFromSelf()) {
        final String target = dependency.getTargetClass().getBaseComponentType().getPackageName();
        if (target.startsWith("torqueloom") && !usable.contains(target)) {
          faults.add(type.getName() + " uses " + dependency.getTargetClass().getName());
        }
      }
    }
    assertEquals(Set.of(), faults);
  }

  @Test
  void aModuleUsesOnlyItsOwnLibraries() {
    final Set<String> faults = new TreeSet<>();
    for (JavaClass type : classes) {
      final List<String> libraries = PackageMap.moduleOf(type.getPackageName()).libraries();
      for (Dependency dependency : type.getDirectDependenciesFromSelf()) {
        final String target = dependency.getTargetClass().getBaseComponentType().getPackageName();
        if (isForeign(target) && libraries.stream().noneMatch(name -> isIn(target, name))) {
          faults.add(type.getName() + " uses " + dependency.getTargetClass().getName());
        }
      }
    }
    assertEquals(Set.of(), faults);
  }

  @Test
  void packagesFormNoRing() {
    slices().matching("torqueloom.(**)").should().beFreeOfCycles().check(classes);
  }

  /** All randomness comes from the numbered streams, so that a result depends only on its seed. */
  @Test
  void noOtherRandomNumbers() {
    noClasses()
        .should()
        .dependOnClassesThat()
        .haveNameMatching(
            "java\\.util\\.(Random|SplittableRandom|concurrent\\.ThreadLocalRandom)"
                + "|java\\.security\\.SecureRandom|org\\.apache\\.commons\\.math3\\.random\\..*")
        .orShould()
        .callMethod(Math.class, "random")
        .check(classes);
  }

  /** Only the command line talks to the terminal and ends the process. */
  @Test
  void onlyTheAppPrintsAndExits() {
    noClasses()
        .that()
        .resideOutsideOfPackage("torqueloom.app..")
        .should()
        .accessField(System.class, "out")
        .orShould()
        .accessField(System.class, "err")
        .orShould()
        .callMethod(System.class, "exit", int.class)
        .check(classes);
  }

  /** A network file may come from anybody, and the library's loader runs what it finds in one. */
  @Test
  void onlyTheLayerPackageOpensNetworkFiles() {
    noClasses()
        .that()
        .resideOutsideOfPackage("torqueloom.training.layer")
        .should()
        .dependOnClassesThat()
        .haveFullyQualifiedName("org.deeplearning4j.util.ModelSerializer")
        .orShould()
        .dependOnClassesThat()
        .haveFullyQualifiedName("java.io.ObjectInputStream")
        .check(classes);
  }

  /** The line with which a reader of a package starts: what it promises. */
  @Test
  void everyPackageStatesItsPromise() throws IOException {
    assertFalse(sources.isEmpty());
    for (Map.Entry<String, Set<String>> entry : sources.entrySet()) {
      final Path file = folder(entry.getKey()).resolve("package-info.java");
      assertTrue(Files.exists(file), () -> entry.getKey() + " has no package-info.java");
      final String text = Files.readString(file);
      assertTrue(text.contains("/**"), () -> file + " has no documentation");
      assertTrue(text.contains("package " + entry.getKey() + ";"), () -> file + " names another");
    }
  }

  /** The second page of docs/architecture.md lists every package of the map with a line. */
  @Test
  void everyPackageStandsInTheArchitecturePage() throws IOException {
    final String page = Files.readString(Path.of("..", "docs", "architecture.md"));
    for (String name : PackageMap.allowed().keySet()) {
      final String line = "| `" + name.substring("torqueloom.".length()) + "` |";
      assertTrue(page.contains(line), () -> "docs/architecture.md has no line " + line);
    }
  }

  private static boolean isForeign(String packageName) {
    return !packageName.isEmpty()
        && Stream.of("torqueloom", "java", "javax", "jdk.incubator", "jdk.jfr", "org.w3c.dom")
            .noneMatch(name -> isIn(packageName, name));
  }

  private static boolean isIn(String packageName, String parent) {
    return packageName.equals(parent) || packageName.startsWith(parent + ".");
  }

  private static Path sourceRoot(Module module) {
    return Path.of("..", module.folder(), "src", "main", "java");
  }

  private static Path folder(String packageName) {
    return sourceRoot(PackageMap.moduleOf(packageName)).resolve(packageName.replace('.', '/'));
  }

  private static boolean hasClasses(String packageName) {
    final String[] files = folder(packageName).toFile().list();
    return files != null
        && Arrays.stream(files)
            .anyMatch(name -> name.endsWith(".java") && !name.equals("package-info.java"));
  }

  private static String packageOf(Path root, Path file) {
    return root.relativize(file.getParent()).toString().replace('\\', '.').replace('/', '.');
  }
}
