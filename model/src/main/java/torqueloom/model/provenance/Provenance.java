package torqueloom.model.provenance;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;

/**
 * The record of how a run was made. Two runs with equal study digest, seed, version, processor and
 * kernel give equal results; where the processor or kernel differs, results of matrix products may
 * differ in their last bits.
 *
 * @param version version of the program
 * @param studyDigest SHA-256 of the effective study and its data
 * @param seed seed of the study
 * @param kernel which kernels computed, in words
 * @param javaVersion version of the Java runtime
 * @param javaVirtualMachine name and version of the virtual machine
 * @param operatingSystem name and version
 * @param architecture processor architecture as Java names it
 * @param processor model of the processor, or {@code unknown}
 * @param processorCount processors that Java may use
 * @param environment variables that choose native kernels, only those that are set
 * @param dependencies names and versions of libraries that shape results
 */
public record Provenance(
    String version,
    String studyDigest,
    long seed,
    String kernel,
    String javaVersion,
    String javaVirtualMachine,
    String operatingSystem,
    String architecture,
    String processor,
    int processorCount,
    Map<String, String> environment,
    Map<String, String> dependencies) {

  /**
   * @throws NullPointerException if a part is null
   */
  public Provenance {
    Objects.requireNonNull(version, "version");
    Objects.requireNonNull(studyDigest, "studyDigest");
    Objects.requireNonNull(kernel, "kernel");
    environment = Collections.unmodifiableMap(new TreeMap<>(environment));
    dependencies = Collections.unmodifiableMap(new TreeMap<>(dependencies));
  }

  /**
   * The record of a run in this process.
   *
   * @param studyDigest SHA-256 of the effective study and its data
   * @param seed seed of the study
   * @param kernel which kernels compute, such as {@code scalar; OpenBLAS Haswell}
   */
  public static Provenance ofThisProcess(String studyDigest, long seed, String kernel) {
    return new Provenance(
        BuildVersions.program(),
        studyDigest,
        seed,
        kernel,
        System.getProperty("java.version"),
        System.getProperty("java.vm.name") + " " + System.getProperty("java.vm.version"),
        System.getProperty("os.name") + " " + System.getProperty("os.version"),
        System.getProperty("os.arch"),
        Platform.processor(),
        Runtime.getRuntime().availableProcessors(),
        Platform.kernelVariables(System.getenv()),
        BuildVersions.dependencies());
  }

  /** The fields in documented order, with {@code schema}, for {@code provenance.json}. */
  public Map<String, Object> asMap() {
    final Map<String, Object> map = new LinkedHashMap<>();
    map.put("schema", 1);
    map.put("version", version);
    map.put("studyDigest", studyDigest);
    map.put("seed", seed);
    map.put("kernel", kernel);
    map.put("javaVersion", javaVersion);
    map.put("javaVirtualMachine", javaVirtualMachine);
    map.put("operatingSystem", operatingSystem);
    map.put("architecture", architecture);
    map.put("processor", processor);
    map.put("processorCount", processorCount);
    map.put("environment", environment);
    map.put("dependencies", dependencies);
    return map;
  }
}
