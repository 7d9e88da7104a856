package torqueloom.app.command;

/** Input that cannot be used, other than a fault in a study file; the message is for the user. */
final class BadInputException extends Exception {
  private static final long serialVersionUID = 1L;

  BadInputException(String message) {
    super(message);
  }
}
