package torqueloom.training.layer;

/** The native matrix library cannot be used here; the message says why in one sentence. */
public final class UnfitNativesException extends RuntimeException {

  /**
   * Makes the exception.
   *
   * @param message one sentence for the user
   */
  public UnfitNativesException(String message) {
    super(message);
  }
}
