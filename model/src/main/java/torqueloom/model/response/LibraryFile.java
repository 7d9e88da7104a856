package torqueloom.model.response;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import torqueloom.model.table.CanonicalJson;
import torqueloom.model.table.FileContentException;
import torqueloom.model.table.JsonFields;
import torqueloom.model.table.JsonReader;

/**
 * A response library as a JSON file: the curves as {@link ResponseJson} writes them, and beside them
 * the digest of what it was calibrated from, temperatures, features and their weights, the torque
 * per drive of every instance, carry-over and matching error. A library that is read back equals the
 * written one to the last bit. Which kernel ran is left out: its bits do not depend on it.
 */
public final class LibraryFile {
  /** Name of the file in a run folder. */
  public static final String NAME = "library.json";

  private LibraryFile() {}

  /**
   * Writes a library, whole file or nothing.
   *
   * @throws IOException if the file cannot be written
   */
  public static void write(Path path, ResponseLibrary library) throws IOException {
    CanonicalJson.write(path, document(library));
  }

  /**
   * Reads a library.
   *
   * @throws FileContentException if the file does not hold one
   * @throws IOException if it cannot be read
   */
  public static ResponseLibrary read(Path path) throws IOException {
    return library(JsonReader.readObject(path));
  }

  /**
   * The library of a file if it was calibrated from just this; empty if there is none, it was
   * calibrated from something else, or it is damaged: then it is calibrated anew.
   *
   * @param digest as {@link Calibrator#digest}
   * @throws IOException if a file is there but cannot be read
   */
  public static Optional<ResponseLibrary> reusable(Path path, String digest) throws IOException {
    if (!Files.exists(path)) {
      return Optional.empty();
    }
    try {
      return Optional.of(read(path)).filter(library -> library.digest().equals(digest));
    } catch (final FileContentException e) {
      return Optional.empty();
    }
  }

  static Map<String, Object> document(ResponseLibrary library) {
    final Map<String, Object> document = new LinkedHashMap<>();
    document.put("schema", ResponseJson.SCHEMA);
    document.put("digest", library.digest());
    document.put("driveUnit", library.driveUnit());
    document.put("temperatures", library.temperatures());
    document.put("featureNames", library.featureNames());
    document.put("featureWeights", library.featureWeights());
    document.put("carryOver", library.carryOver());
    document.put("carryOverFloor", library.carryOverFloor());
    document.put("matchingError", library.matchingError());
    document.put("replicaSteps", library.replicaSteps());
    document.put("instances", library.instances().stream().map(LibraryFile::entry).toList());
    document.put("response", ResponseJson.entries(library));
    return document;
  }

  static Map<String, Object> entry(LibraryInstance instance) {
    final Map<String, Object> entry = new LinkedHashMap<>();
    entry.put("instance", instance.instance());
    entry.put("temperatureKelvin", instance.temperatureKelvin());
    entry.put("torqueTeslaPerDrive", instance.torquePerDrive());
    entry.put("features", instance.features());
    return entry;
  }

  private static ResponseLibrary library(JsonFields file) throws FileContentException {
    if (file.integer("schema") != ResponseJson.SCHEMA) {
      throw file.wrong("schema", "schema " + ResponseJson.SCHEMA);
    }
    final List<String> names = file.texts("featureNames");
    final List<LibraryInstance> instances = new ArrayList<>();
    for (final JsonFields entry : file.objects("instances")) {
      instances.add(instance(entry, names.size()));
    }
    final List<ResponseCurve> curves = new ArrayList<>();
    for (final JsonFields entry : file.objects("response")) {
      curves.add(ResponseJson.curve(entry));
    }
    final List<Double> temperatures = new ArrayList<>();
    for (final double temperature : file.numbers("temperatures")) {
      temperatures.add(temperature);
    }
    final ResponseLibrary library =
        new ResponseLibrary(
            file.text("digest"),
            file.text("driveUnit"),
            temperatures,
            names,
            file.numbers("featureWeights"),
            instances,
            curves,
            file.number("carryOver"),
            file.number("carryOverFloor"),
            file.number("matchingError"),
            file.whole("replicaSteps"),
            "not run: the library was read from the run folder");
    if (library.featureWeights().length != names.size()) {
      throw file.wrong("featureWeights", "one number a feature");
    }
    requireComplete(file, library);
    return library;
  }

  static LibraryInstance instance(JsonFields entry, int features) throws FileContentException {
    final LibraryInstance instance =
        new LibraryInstance(
            entry.integer("instance"),
            entry.number("temperatureKelvin"),
            entry.number("torqueTeslaPerDrive"),
            entry.numbers("features"));
    if (features >= 0 && instance.features().length != features) {
      throw entry.wrong("features", "one number a feature name (" + features + ")");
    }
    return instance;
  }

  private static void requireComplete(JsonFields file, ResponseLibrary library)
      throws FileContentException {
    try {
      CountTables.of(library);
    } catch (final IllegalArgumentException e) {
      throw file.wrong("response", "a complete library (" + e.getMessage() + ")");
    }
  }
}
