package torqueloom.model.provenance;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Map;
import java.util.Properties;
import java.util.TreeMap;

/** What the build wrote down about itself. */
public final class BuildVersions {
  private static final String RESOURCE = "/torqueloom/version.properties";
  private static final String DEPENDENCY = "dependency.";
  private static final String UNKNOWN = "unknown";

  private static final Properties PROPERTIES = load();

  private BuildVersions() {}

  /** The version of the program; {@code unknown} where it was not built by Maven. */
  public static String program() {
    return known(PROPERTIES.getProperty("version"));
  }

  /** Names and versions of the libraries that shape results, sorted by name. */
  public static Map<String, String> dependencies() {
    final Map<String, String> versions = new TreeMap<>();
    for (final String name : PROPERTIES.stringPropertyNames()) {
      if (name.startsWith(DEPENDENCY)) {
        versions.put(name.substring(DEPENDENCY.length()), known(PROPERTIES.getProperty(name)));
      }
    }
    return versions;
  }

  /** A value the build has not filled in still holds its placeholder. */
  private static String known(String value) {
    return value == null || value.contains("${") ? UNKNOWN : value;
  }

  private static Properties load() {
    final Properties properties = new Properties();
    try (InputStream in = BuildVersions.class.getResourceAsStream(RESOURCE)) {
      if (in != null) {
        properties.load(in);
      }
    } catch (final IOException e) {
      throw new UncheckedIOException(e);
    }
    return properties;
  }
}
