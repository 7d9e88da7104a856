package torqueloom.app.command;

/** The program's version. */
final class Version {
  /** From the jar's manifest; a class path without jar is a development build. */
  static final String TEXT = text();

  private Version() {}

  private static String text() {
    final String text = Version.class.getPackage().getImplementationVersion();
    return text == null ? "development" : text;
  }
}
