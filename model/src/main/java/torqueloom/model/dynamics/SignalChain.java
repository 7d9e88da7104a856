package torqueloom.model.dynamics;

/**
 * What the readout makes of the moment: signal, white noise, second-order Butterworth low pass,
 * comparator with hysteresis.
 *
 * <p>A <em>count</em> is one completed spike: the filtered signal has fallen from above to below the
 * low threshold in this slot and now rises through the high threshold; it is dated to that rise. A
 * signal that starts low counts nothing at its first rise. Two poles, because the crossing rate of a
 * one-pole filter under white noise grows without bound as the step shrinks.
 *
 * @param constant c_0 of the signal c_0 + c_1 m_x + c_2 m_x² (1)
 * @param linear c_1 (1)
 * @param quadratic c_2 (1)
 * @param bandwidth -3 dB frequency (Hz), &gt; 0
 * @param noiseDensity one-sided density of the white noise before the filter (1/Hz), &gt;= 0
 * @param low lower threshold (1), below the upper one
 * @param high upper threshold (1)
 */
public record SignalChain(
    double constant,
    double linear,
    double quadratic,
    double bandwidth,
    double noiseDensity,
    double low,
    double high) {

  /** The filter is updated at least this often in a period of its -3 dB frequency. */
  private static final double UPDATES = 50;

  /** @throws IllegalArgumentException naming the first value that is NaN or out of range */
  public SignalChain {
    if (!Double.isFinite(constant + linear + quadratic)) {
      throw new IllegalArgumentException("signal coefficients must be finite");
    }
    if (!(bandwidth > 0 && Double.isFinite(bandwidth))) {
      throw new IllegalArgumentException("bandwidth must be positive, got " + bandwidth + " Hz");
    }
    if (!(noiseDensity >= 0 && Double.isFinite(noiseDensity))) {
      throw new IllegalArgumentException("noiseDensity must not be negative, got " + noiseDensity);
    }
    if (!(low < high)) {
      throw new IllegalArgumentException("low must be below high, got " + low + " and " + high);
    }
  }

  /** The signal m_x itself. */
  public static SignalChain ofMoment(
      double bandwidth, double noiseDensity, double low, double high) {
    return new SignalChain(0, 1, 0, bandwidth, noiseDensity, low, high);
  }

  /** The signal of a direction (1). */
  public double signal(double mx) {
    return constant + mx * (linear + mx * quadratic);
  }

  /** Longest time between updates of the filter (s). */
  public double longestFrame() {
    return 1 / (UPDATES * bandwidth);
  }

  /** Standard deviation of the filtered noise (1): density times pi f/(2 sqrt 2), square root. */
  public double filteredNoise() {
    return Math.sqrt(noiseDensity * bandwidth * Math.PI / (2 * Math.sqrt(2)));
  }
}
