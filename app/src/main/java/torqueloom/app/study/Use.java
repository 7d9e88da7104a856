package torqueloom.app.study;

/** The first stage that reads a key. Stages run in this order, each needs those before it. */
public enum Use {
  /** The study as a whole. */
  STUDY("all stages"),
  /** Derived quantities of the device. */
  DEVICE("device"),
  /** Response library. */
  CALIBRATE("calibrate"),
  /** Training of the ideal network. */
  TRAIN("train"),
  /** Chips, accuracy, yield and verdict. */
  CHIPS("chips"),
  /** No stage of this version. */
  LATER("accepted, not used yet");

  private final String words;

  Use(String words) {
    this.words = words;
  }

  /** The stage's command, or plain words. */
  public String words() {
    return words;
  }
}
