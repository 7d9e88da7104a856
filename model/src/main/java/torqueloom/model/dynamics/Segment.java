package torqueloom.model.dynamics;

/**
 * A stretch of time under a constant torque, cut into frames of equal length; the readout is
 * updated once a frame, the moment several times.
 *
 * @param torque spin torque
 * @param frames number of frames, &gt;= 1
 * @param stepsPerFrame integration steps in a frame, even, &gt;= 2
 * @param step length of a step (s)
 */
public record Segment(TorqueField torque, int frames, int stepsPerFrame, double step) {
  /** @throws IllegalArgumentException if a number is out of range */
  public Segment {
    if (frames < 1 || stepsPerFrame < 2 || stepsPerFrame % 2 != 0 || !(step > 0)) {
      throw new IllegalArgumentException(
          "a segment needs frames, an even number of steps and a positive step, got "
              + frames
              + ", "
              + stepsPerFrame
              + ", "
              + step);
    }
  }

  /** A frame may be this much longer than asked if the step would otherwise have to shrink. */
  private static final double STRETCH = 2.5;

  /**
   * The segment of a duration whose steps are at most as long as given, and its frames too, but for
   * a stretch up to {@value #STRETCH} where two full steps would not fit a frame.
   *
   * @param torque spin torque
   * @param duration (s), &gt; 0
   * @param frame longest frame (s), &gt; 0
   * @param step longest step (s), &gt; 0
   */
  public static Segment of(TorqueField torque, double duration, double frame, double step) {
    final double longest = Math.max(frame, Math.min(2 * step, STRETCH * frame));
    final int frames = (int) Math.max(1, Math.ceil(duration / longest - 1e-9));
    final double length = duration / frames;
    final int steps = 2 * (int) Math.max(1, Math.ceil(length / (2 * step) - 1e-9));
    return new Segment(torque, frames, steps, length / steps);
  }

  /** Length of a frame (s). */
  public double frame() {
    return step * stepsPerFrame;
  }

  /** Length of the whole segment (s). */
  public double duration() {
    return frame() * frames;
  }

  /** Integration steps of the whole segment. */
  public long steps() {
    return (long) frames * stepsPerFrame;
  }
}
