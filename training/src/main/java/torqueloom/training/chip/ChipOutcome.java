package torqueloom.training.chip;

/**
 * What one chip did at one temperature.
 *
 * @param correct noise passes in which each test row was classified rightly, [rows]
 * @param perPass rows classified rightly in each noise pass, [passes]
 * @param clippedShare share of pulses clipped at the maximum drive (1)
 */
public record ChipOutcome(byte[] correct, int[] perPass, double clippedShare) {
  private static final int FIRST = '0';

  /** Mean accuracy over the noise passes (1). */
  public double accuracy() {
    long right = 0;
    for (final int pass : perPass) {
      right += pass;
    }
    return (double) right / ((long) perPass.length * correct.length);
  }

  /** Variance of the accuracy over the noise passes (1), 0 with a single pass. */
  public double passVariance() {
    if (perPass.length < 2) {
      return 0;
    }
    final double mean = accuracy();
    double sum = 0;
    for (final int pass : perPass) {
      final double deviation = (double) pass / correct.length - mean;
      sum += deviation * deviation;
    }
    return sum / (perPass.length - 1);
  }

  /** The row counts as text, one character a row. */
  String rows() {
    final StringBuilder text = new StringBuilder(correct.length);
    for (final byte count : correct) {
      text.append((char) (FIRST + count));
    }
    return text.toString();
  }

  /** Reads {@link #rows}. */
  static byte[] rows(String text) {
    final byte[] correct = new byte[text.length()];
    for (int i = 0; i < correct.length; i++) {
      correct[i] = (byte) (text.charAt(i) - FIRST);
    }
    return correct;
  }
}
