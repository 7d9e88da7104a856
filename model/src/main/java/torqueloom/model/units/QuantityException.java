package torqueloom.model.units;

/**
 * A text that is no quantity of the wanted kind. The message says what was found and what is
 * allowed.
 */
public final class QuantityException extends IllegalArgumentException {
  private static final long serialVersionUID = 1L;
  private static final int LONGEST_ECHO = 60;

  private final String found;
  private final String reason;

  QuantityException(String found, String reason) {
    super("found \"" + echo(found) + "\"; " + reason);
    this.found = found;
    this.reason = reason;
  }

  /** The text as it was given. */
  public String found() {
    return found;
  }

  /** What is wrong and what is allowed, without the text found. */
  public String reason() {
    return reason;
  }

  private static String echo(String text) {
    final String plain = text.replaceAll("\\p{Cntrl}", "?");
    return plain.length() <= LONGEST_ECHO ? plain : plain.substring(0, LONGEST_ECHO) + "...";
  }
}
