package torqueloom.app.command;

import torqueloom.model.provenance.BuildVersions;

/** The program's version. */
final class Version {
  /** As the build wrote it down. */
  static final String TEXT = BuildVersions.program();

  private Version() {}
}
