package torqueloom.demo;

import java.util.Arrays;

/**
 * Spectra of one record: the power spectrum, and the spectrum of the squared envelope of the band
 * around the housing's resonance, where the period of a bearing's impacts stands out even though
 * the impacts themselves ring at the resonance (Randall and Antoni 2011,
 * doi:10.1016/j.ymssp.2010.07.017, from memory).
 */
final class RecordSpectra {
  private static final Fourier FOURIER = new Fourier(BearingRecord.LENGTH);
  private static final double BIN = BearingRecord.RATE / BearingRecord.LENGTH;

  /** The band around the resonance (Hz). */
  private static final double BAND_LOW = 1200;

  private static final double BAND_HIGH = 2100;

  /** Lines are sought this far to either side of where the geometry puts them (1). */
  private static final double SEARCH = 0.012;

  private final double[] power;
  private final double[] envelope;
  private final double floor;
  private final double shaftRate;

  private RecordSpectra(double[] power, double[] envelope, double shaftRate) {
    this.power = power;
    this.envelope = envelope;
    this.shaftRate = shaftRate;
    this.floor = median(envelope, bin(0.25), bin(9));
  }

  static RecordSpectra of(double[] samples, double shaftRate) {
    final double[] real = samples.clone();
    final double[] imaginary = new double[samples.length];
    FOURIER.forward(real, imaginary);
    final double[] power = new double[samples.length / 2];
    for (int i = 0; i < power.length; i++) {
      power[i] = real[i] * real[i] + imaginary[i] * imaginary[i];
    }
    keepBand(real, imaginary);
    FOURIER.backward(real, imaginary);
    return new RecordSpectra(power, envelopeSpectrum(real, imaginary), shaftRate);
  }

  /** Leaves only positive frequencies of the band, whose inverse is the analytic signal. */
  private static void keepBand(double[] real, double[] imaginary) {
    for (int i = 0; i < real.length; i++) {
      if (i * BIN < BAND_LOW || i * BIN > BAND_HIGH) {
        real[i] = 0;
        imaginary[i] = 0;
      }
    }
  }

  private static double[] envelopeSpectrum(double[] real, double[] imaginary) {
    double mean = 0;
    for (int i = 0; i < real.length; i++) {
      real[i] = real[i] * real[i] + imaginary[i] * imaginary[i];
      mean += real[i] / real.length;
    }
    for (int i = 0; i < real.length; i++) {
      final double window = 0.5 - 0.5 * StrictMath.cos(2 * Math.PI * i / real.length);
      real[i] = (real[i] - mean) * window;
      imaginary[i] = 0;
    }
    FOURIER.forward(real, imaginary);
    final double[] spectrum = new double[real.length / 4];
    for (int i = 0; i < spectrum.length; i++) {
      spectrum[i] = Math.sqrt(real[i] * real[i] + imaginary[i] * imaginary[i]);
    }
    return spectrum;
  }

  private int bin(double order) {
    return (int) Math.rint(order * shaftRate / BIN);
  }

  private static double median(double[] values, int from, int to) {
    final double[] sorted = Arrays.copyOfRange(values, from, to);
    Arrays.sort(sorted);
    return sorted[sorted.length / 2];
  }

  /** Height of the envelope's line at an order above the median of its spectrum (dB). */
  double line(double order) {
    final int from = (int) Math.floor(order * (1 - SEARCH) * shaftRate / BIN);
    final int to = (int) Math.ceil(order * (1 + SEARCH) * shaftRate / BIN);
    double highest = 0;
    for (int i = from; i <= to; i++) {
      highest = Math.max(highest, envelope[i]);
    }
    return 20 * StrictMath.log10(highest / floor);
  }

  /** Mean square of the record between two frequencies in Hz, in dB above 1 (m/s^2)^2. */
  double level(double low, double high) {
    double sum = 0;
    for (int i = (int) Math.ceil(low / BIN); i * BIN <= high; i++) {
      sum += power[i];
    }
    final double length = BearingRecord.LENGTH;
    return 10 * StrictMath.log10(2 * sum / (length * length));
  }
}
