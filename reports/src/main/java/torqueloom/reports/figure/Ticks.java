package torqueloom.reports.figure;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/** Places and labels of an axis's ticks. */
final class Ticks {
  /** Below this many decades a logarithmic axis also marks 2 and 5. */
  private static final double FEW_DECADES = 2.5;

  private Ticks() {}

  /**
   * One tick.
   *
   * @param value place on the axis
   * @param label text beside it
   */
  record Tick(double value, String label) {}

  /**
   * Ticks at multiples of 1, 2, 2.5 or 5 times a power of ten.
   *
   * @param low lower end of the axis, finite
   * @param high upper end, finite, &gt; low
   * @param most about how many
   */
  static List<Tick> linear(double low, double high, int most) {
    final BigDecimal step = niceStep((high - low) / most);
    final double width = step.doubleValue();
    final long first = (long) Math.ceil(low / width - 1e-9);
    final long last = (long) Math.floor(high / width + 1e-9);
    final int decimals = Math.max(0, step.stripTrailingZeros().scale());
    final List<Tick> ticks = new ArrayList<>();
    for (long i = first; i <= last && ticks.size() <= 4 * most; i++) {
      final double value = step.multiply(BigDecimal.valueOf(i)).doubleValue();
      final boolean longLabel = decimals > 6 || Math.abs(value) >= 1e6;
      ticks.add(
          new Tick(
              value, longLabel ? Numbers.significant(value, 4) : Numbers.fixed(value, decimals)));
    }
    return ticks;
  }

  /** Ticks at powers of ten, with 2 and 5 between where few decades are shown; both ends &gt; 0. */
  static List<Tick> logarithmic(double low, double high, int most) {
    final int first = (int) Math.floor(StrictMath.log10(low) + 1e-9);
    final int last = (int) Math.floor(StrictMath.log10(high) + 1e-9);
    final double decades = StrictMath.log10(high / low);
    final int[] factors = decades < FEW_DECADES ? new int[] {1, 2, 5} : new int[] {1};
    final int stride = Math.max(1, (int) Math.ceil(decades / most));
    final List<Tick> ticks = new ArrayList<>();
    for (int exponent = first; exponent <= last; exponent += stride) {
      for (final int factor : factors) {
        final double value = Double.parseDouble(factor + "e" + exponent);
        if (value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9)) {
          ticks.add(new Tick(value, decadeLabel(factor, exponent)));
        }
      }
    }
    return ticks;
  }

  private static String decadeLabel(int factor, int exponent) {
    if (exponent >= -3 && exponent <= 3) {
      return Numbers.significant(Double.parseDouble(factor + "e" + exponent), 2);
    }
    return (factor == 1 ? "" : factor + "×") + "10" + Numbers.superscript(exponent);
  }

  private static BigDecimal niceStep(double rough) {
    final int exponent = (int) Math.floor(StrictMath.log10(rough));
    final BigDecimal power = BigDecimal.ONE.scaleByPowerOfTen(exponent);
    final double mantissa = rough / power.doubleValue();
    final String nice =
        mantissa <= 1.001
            ? "1"
            : mantissa <= 2.001 ? "2" : mantissa <= 2.501 ? "2.5" : mantissa <= 5.001 ? "5" : "10";
    return power.multiply(new BigDecimal(nice));
  }
}
