package torqueloom.demo;

import java.util.List;

/**
 * The features of one row, as the pucks' electronics would send them: levels of bands and lines in
 * dB, kurtosis, and the direction (cosine, sine) of each channel's vibration at shaft rate.
 */
final class PuckFeatures {
  /** Names in column order. */
  static final List<String> NAMES =
      List.of(
          "shaft_rate",
          "kurtosis",
          "level_low",
          "level_mid",
          "level_high",
          "line_cage",
          "line_outer",
          "line_outer_2",
          "line_inner",
          "line_inner_side",
          "line_ball",
          "line_ball_side",
          "line_shaft",
          "shaft_1",
          "shaft_2",
          "shaft_axial",
          "cos_1h",
          "sin_1h",
          "cos_1v",
          "sin_1v",
          "cos_2h",
          "sin_2h",
          "cos_2v",
          "sin_2v");

  private PuckFeatures() {}

  /** Values of one row in the order of {@link #NAMES}. */
  static double[] of(BearingGeometry bearing, long seed, int row, MachineState state) {
    final Operation operation = Operation.draw(seed, row, state);
    final ShaftMotion motion = ShaftMotion.draw(seed, row, state, operation);
    final double[] samples =
        BearingRecord.synthesize(
            bearing, seed, row, state, operation, motion.amplitude(0), motion.phase(0));
    final RecordSpectra spectra = RecordSpectra.of(samples, operation.shaftRate());
    final double[] values = new double[NAMES.size()];
    values[0] = operation.shaftRate();
    values[1] = kurtosis(samples);
    values[2] = spectra.level(10, 300);
    values[3] = spectra.level(300, 1200);
    values[4] = spectra.level(1200, 2100);
    putLines(values, bearing, spectra);
    putShaft(values, motion);
    return values;
  }

  private static void putLines(double[] values, BearingGeometry bearing, RecordSpectra spectra) {
    final double cage = bearing.cageOrder();
    final double outer = bearing.outerRaceOrder();
    final double inner = bearing.innerRaceOrder();
    final double ball = 2 * bearing.ballSpinOrder();
    values[5] = spectra.line(cage);
    values[6] = spectra.line(outer);
    values[7] = spectra.line(2 * outer);
    values[8] = spectra.line(inner);
    values[9] = 0.5 * (spectra.line(inner - 1) + spectra.line(inner + 1));
    values[10] = spectra.line(ball);
    values[11] = 0.5 * (spectra.line(ball - cage) + spectra.line(ball + cage));
    values[12] = spectra.line(1);
  }

  private static void putShaft(double[] values, ShaftMotion motion) {
    values[13] = decibel(motion.amplitude(0), motion.amplitude(1));
    values[14] = decibel(motion.amplitude(2), motion.amplitude(3));
    values[15] = decibel(motion.amplitude(4), 0);
    for (int channel = 0; channel < 4; channel++) {
      values[16 + 2 * channel] = motion.cosine(channel);
      values[17 + 2 * channel] = motion.sine(channel);
    }
  }

  private static double decibel(double first, double second) {
    return 10 * StrictMath.log10(first * first + second * second);
  }

  /** Fourth moment over the square of the second; 3 for normal noise. */
  private static double kurtosis(double[] samples) {
    double mean = 0;
    for (final double sample : samples) {
      mean += sample / samples.length;
    }
    double second = 0;
    double fourth = 0;
    for (final double sample : samples) {
      final double square = (sample - mean) * (sample - mean);
      second += square;
      fourth += square * square;
    }
    return fourth * samples.length / (second * second);
  }
}
