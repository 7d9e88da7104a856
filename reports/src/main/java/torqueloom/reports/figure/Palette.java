package torqueloom.reports.figure;

/**
 * Colors of the pictures. Series colors differ in lightness as well as in hue, so that readers with
 * any of the common color-vision deficiencies, and gray prints, tell them apart.
 */
public final class Palette {
  /** Text and axes. */
  public static final String INK = "#1d2733";

  /** Secondary text and grid. */
  public static final String MUTED = "#66707c";

  /** Grid lines. */
  public static final String GRID = "#dde2e6";

  /** Targets. */
  public static final String TARGET = "#a3182f";

  /** Background of the drawing area. */
  public static final String GROUND = "#fbfbf8";

  private static final String[] SERIES = {
    "#17406d", "#d9822b", "#4f9d8a", "#8c3b6b", "#b9a22b", "#5b6573"
  };

  private static final String[] DASHES = {"", "7 3", "2 3", "9 3 2 3", "", "5 5"};

  /** Stops of the ordered ramp, dark to light. */
  private static final int[][] RAMP = {
    {0x1b, 0x2a, 0x52},
    {0x5a, 0x3a, 0x7e},
    {0xa8, 0x45, 0x6c},
    {0xdf, 0x72, 0x45},
    {0xee, 0xb5, 0x4a}
  };

  private Palette() {}

  /** Style of the series with a number, counted from 0. */
  public static Style series(int index) {
    final int i = Math.floorMod(index, SERIES.length);
    return new Style(SERIES[i], DASHES[i], Marker.of(index), 1.8, 1);
  }

  /** Style of member {@code index} of an ordered family of {@code size}, from dark to light. */
  public static Style ordered(int index, int size) {
    final double place = size <= 1 ? 0 : 0.9 * index / (size - 1);
    return new Style(ramp(place), DASHES[Math.floorMod(index, 4)], Marker.of(index), 1.8, 1);
  }

  /** Color of the ordered ramp at a place in [0, 1], from dark to light. */
  public static String ramp(double place) {
    final double scaled = Math.max(0, Math.min(1, place)) * (RAMP.length - 1);
    final int below = Math.min(RAMP.length - 2, (int) scaled);
    final StringBuilder color = new StringBuilder("#");
    for (int channel = 0; channel < 3; channel++) {
      final int low = RAMP[below][channel];
      final int high = RAMP[below + 1][channel];
      final int mixed = (int) Math.rint(low + (high - low) * (scaled - below));
      color.append(Character.forDigit(mixed >> 4, 16)).append(Character.forDigit(mixed & 15, 16));
    }
    return color.toString();
  }
}
