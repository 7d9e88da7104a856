package torqueloom.training.encoding;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import torqueloom.training.data.TaskTable;

/**
 * Amplitude encoder: each feature is a constant level in every slot. The level is the feature scaled
 * so that the 1st percentile of the training rows is 0 and the 99th is 1, clipped to [0, 1], and
 * rounded to one of a number of equally spaced input levels. A feature whose two percentiles
 * coincide carries no usable range and gives level 0, with a note.
 *
 * <p>Percentiles interpolate linearly between order statistics: with n rows, percentile q stands at
 * position q(n−1) counted from 0 (definition 7 of R. J. Hyndman and Y. Fan, Am. Stat. 50, 361
 * (1996), doi:10.1080/00031305.1996.10473566; from memory).
 */
public final class AmplitudeEncoder implements SpikeEncoder {
  /** Input levels where a study names none: five bits, which costs the demo tasks nothing. */
  public static final int DEFAULT_LEVELS = 32;

  /** Number that stands for a continuous level. */
  public static final int CONTINUOUS = 0;

  private static final double LOWER = 0.01;
  private static final double UPPER = 0.99;

  private final float[] lower;
  private final float[] upper;
  private final int levels;
  private final List<String> notes;

  private AmplitudeEncoder(float[] lower, float[] upper, int levels, List<String> notes) {
    this.lower = lower;
    this.upper = upper;
    this.levels = levels;
    this.notes = List.copyOf(notes);
  }

  /**
   * Fits the scaling to training rows.
   *
   * @param train at least one row
   * @param levels number of input levels, at least 2, or {@link #CONTINUOUS}
   * @throws IllegalArgumentException if there is no row or levels is 1 or negative
   */
  public static AmplitudeEncoder fit(TaskTable train, int levels) {
    if (train.rows() == 0) {
      throw new IllegalArgumentException("an encoder needs at least one training row");
    }
    final float[] lower = new float[train.featureCount()];
    final float[] upper = new float[train.featureCount()];
    final List<String> flat = new ArrayList<>();
    final float[] column = new float[train.rows()];
    for (int f = 0; f < lower.length; f++) {
      for (int row = 0; row < column.length; row++) {
        column[row] = train.feature(row, f);
      }
      Arrays.sort(column);
      lower[f] = percentile(column, LOWER);
      upper[f] = percentile(column, UPPER);
      if (!(upper[f] > lower[f])) {
        flat.add(train.featureNames().get(f));
      }
    }
    return new AmplitudeEncoder(lower, upper, checked(levels), notes(flat));
  }

  /**
   * An encoder with known scaling, as stored with a network.
   *
   * @param lower feature value of level 0, one a feature
   * @param upper feature value of level 1, one a feature
   * @param levels number of input levels, at least 2, or {@link #CONTINUOUS}
   * @throws IllegalArgumentException if lengths differ, a value is not finite, upper is below
   *     lower, or levels is 1 or negative
   */
  public static AmplitudeEncoder of(float[] lower, float[] upper, int levels) {
    if (lower.length != upper.length || lower.length == 0) {
      throw new IllegalArgumentException(
          "found " + lower.length + " lower and " + upper.length + " upper values");
    }
    for (int f = 0; f < lower.length; f++) {
      if (!Float.isFinite(lower[f]) || !Float.isFinite(upper[f]) || upper[f] < lower[f]) {
        throw new IllegalArgumentException(
            "feature " + f + ": range " + lower[f] + " to " + upper[f] + " is not usable");
      }
    }
    return new AmplitudeEncoder(lower.clone(), upper.clone(), checked(levels), List.of());
  }

  private static int checked(int levels) {
    if (levels != CONTINUOUS && levels < 2) {
      throw new IllegalArgumentException(
          "levels must be 0 (continuous) or at least 2, got " + levels);
    }
    return levels;
  }

  private static List<String> notes(List<String> flat) {
    if (flat.isEmpty()) {
      return List.of();
    }
    return List.of(
        flat.size()
            + (flat.size() == 1 ? " feature does" : " features do")
            + " not vary between the 1st and the 99th percentile of the training rows and "
            + (flat.size() == 1 ? "is" : "are")
            + " held at level 0: "
            + String.join(", ", flat));
  }

  private static float percentile(float[] sorted, double share) {
    final double position = share * (sorted.length - 1);
    final int below = (int) position;
    final int above = Math.min(below + 1, sorted.length - 1);
    final double weight = position - below;
    return (float) (sorted[below] + weight * ((double) sorted[above] - sorted[below]));
  }

  @Override
  public int inputs() {
    return lower.length;
  }

  @Override
  public boolean constantOverSlots() {
    return true;
  }

  @Override
  public float[] encode(TaskTable table, int slots) {
    if (table.featureCount() != lower.length || slots < 1) {
      throw new IllegalArgumentException(
          "fitted to "
              + lower.length
              + " features and at least 1 slot, got "
              + table.featureCount()
              + " features and "
              + slots
              + " slots");
    }
    final float[] levelsOfRows = table.features();
    for (int i = 0; i < levelsOfRows.length; i++) {
      levelsOfRows[i] = level(levelsOfRows[i], i % lower.length);
    }
    return levelsOfRows;
  }

  private float level(float value, int feature) {
    final double range = (double) upper[feature] - lower[feature];
    if (range <= 0) {
      return 0;
    }
    final double scaled = Math.max(0, Math.min(1, (value - (double) lower[feature]) / range));
    return (float)
        (levels == CONTINUOUS ? scaled : Math.floor(scaled * (levels - 1) + 0.5) / (levels - 1));
  }

  @Override
  public List<String> notes() {
    return notes;
  }

  /** A copy of the feature values of level 0. */
  public float[] lower() {
    return lower.clone();
  }

  /** A copy of the feature values of level 1. */
  public float[] upper() {
    return upper.clone();
  }

  /** Number of input levels; {@link #CONTINUOUS} if levels are not rounded. */
  public int levels() {
    return levels;
  }
}
