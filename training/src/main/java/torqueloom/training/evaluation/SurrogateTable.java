package torqueloom.training.evaluation;

/**
 * Derivative of the mean count with respect to the drive, widened by a Gaussian so that it does not
 * vanish on the plateaus of a sharp staircase (the physical surrogate). Outside the calibrated
 * drives the mean count is held at its end values, so the widened slope fades there.
 *
 * <p>The surrogate-gradient idea: E. O. Neftci, H. Mostafa, F. Zenke, IEEE Signal Process. Mag. 36,
 * 51 (2019), doi:10.1109/MSP.2019.2931595 (from memory).
 */
public final class SurrogateTable {
  private static final int PER_WIDTH = 4;
  private static final int PAD_WIDTHS = 3;

  private final float low;
  private final float step;
  private final int points;
  private final float[] slope;

  private SurrogateTable(float low, float step, int points, float[] slope) {
    this.low = low;
    this.step = step;
    this.points = points;
    this.slope = slope;
  }

  /**
   * Width for {@code auto}: a quarter of the drive that one more count takes on average, so that
   * neighbouring steps of the staircase meet.
   *
   * @return width (unit drives)
   */
  public static float automaticWidth(NeuronBank bank) {
    float most = 0;
    for (int p = 0; p < bank.points(); p++) {
      most = Math.max(most, bank.mean()[p]);
    }
    return 0.25f * bank.maximumDrive() / Math.max(1f, most);
  }

  /**
   * @param bank responses
   * @param width standard deviation of the Gaussian (unit drives), &gt; 0
   */
  public static SurrogateTable of(NeuronBank bank, float width) {
    if (!(width > 0)) {
      throw new IllegalArgumentException("the surrogate's width must be positive, got " + width);
    }
    final float step = width / PER_WIDTH;
    final float low = -PAD_WIDTHS * width;
    final float high = bank.maximumDrive() + PAD_WIDTHS * width;
    final int points = (int) Math.ceil((high - low) / step) + 1;
    final float[] slope = new float[bank.instances() * points];
    final int reach = PAD_WIDTHS * PER_WIDTH;
    final double[] kernel = gaussian(reach);
    for (int i = 0; i < bank.instances(); i++) {
      for (int p = 0; p < points; p++) {
        double sum = 0;
        for (int q = -reach; q <= reach; q++) {
          final float at = low + (p + q) * step;
          sum +=
              kernel[q + reach]
                  * (bank.meanAt(i, at + 0.5f * step) - bank.meanAt(i, at - 0.5f * step));
        }
        slope[i * points + p] = (float) (sum / step);
      }
    }
    return new SurrogateTable(low, step, points, slope);
  }

  /** Widened slope of an instance's mean count at a drive (counts per unit drive). */
  public float at(int instance, float drive) {
    final float place = (drive - low) / step;
    if (!(place >= 0 && place < points - 1)) {
      return 0f;
    }
    final int left = (int) place;
    final int base = instance * points + left;
    return slope[base] + (place - left) * (slope[base + 1] - slope[base]);
  }

  private static double[] gaussian(int reach) {
    final double[] kernel = new double[2 * reach + 1];
    double sum = 0;
    for (int q = -reach; q <= reach; q++) {
      final double x = (double) q / PER_WIDTH;
      kernel[q + reach] = StrictMath.exp(-0.5 * x * x);
      sum += kernel[q + reach];
    }
    for (int i = 0; i < kernel.length; i++) {
      kernel[i] /= sum;
    }
    return kernel;
  }
}
