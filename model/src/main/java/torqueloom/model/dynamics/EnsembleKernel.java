package torqueloom.model.dynamics;

/**
 * The inner loops of the ensemble. All implementations give the same bits: they perform the same
 * float operations in the same order, with {@link Math#fma} wherever the reference has it, and no
 * library transcendental.
 *
 * <p>A kernel works on the first {@code active} replicas of a tile and may compute padding beyond.
 */
interface EnsembleKernel {
  /** Short name for logs and provenance. */
  String name();

  /**
   * Draws {@link Tile#gaussian} for two steps.
   *
   * @param counter place in the replicas' streams; this call uses counter, +1 and +2
   */
  void drawGaussians(Tile tile, int active, int counter);

  /** Draws {@link Tile#readNoise} at one place of the streams. */
  void drawReadNoise(Tile tile, int active, int counter);

  /** One Heun step with three of the drawn Gaussians, the first at {@code offset}: 0 or 3. */
  void step(Tile tile, int active, int offset);

  /**
   * Signal, filter, comparator and winding at the end of a frame.
   *
   * @param time slot time (s), the date of a count completed now
   */
  void read(Tile tile, int active, ReadConstants constants, float time);
}
