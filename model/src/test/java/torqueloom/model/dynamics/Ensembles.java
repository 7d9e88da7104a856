package torqueloom.model.dynamics;

import java.util.function.Consumer;
import torqueloom.model.random.Streams;

/** Free-running ensembles of one macrospin for statistical tests, straight on a kernel. */
final class Ensembles {
  private final Tile[] tiles;
  private final Segment segment;
  private final EnsembleKernel kernel;
  private final int[] pair;

  /** Replicas (a multiple of the tile) that start along a direction; steps at most the given one. */
  Ensembles(
      MacrospinParameters spin,
      TorqueField torque,
      int replicas,
      double step,
      long key,
      EnsembleKernel kernel,
      double... direction) {
    this.kernel = kernel;
    this.segment = new Segment(torque, 1, 2, step);
    this.tiles = new Tile[replicas / Tile.CAPACITY];
    this.pair = new int[tiles.length];
    for (int t = 0; t < tiles.length; t++) {
      final Tile tile = new Tile();
      for (int i = 0; i < Tile.CAPACITY; i++) {
        final long own = Streams.subKey(key, t * Tile.CAPACITY + i);
        tile.key0[i] = (int) own;
        tile.key1[i] = (int) (own >>> 32);
        tile.spin[i] = spin;
        tile.direct(i, direction[0], direction[1], direction[2]);
      }
      tile.enter(segment);
      tiles[t] = tile;
    }
  }

  /** Largest step by the automatic rule. */
  static double step(MacrospinParameters spin) {
    return StepSize.largest(spin, TorqueField.NONE);
  }

  /** Advances all replicas by at least a time. */
  Ensembles run(double duration) {
    final int pairs = (int) Math.ceil(duration / (2 * segment.step()));
    for (int t = 0; t < tiles.length; t++) {
      for (int p = 0; p < pairs; p++) {
        kernel.drawGaussians(tiles[t], Tile.CAPACITY, 4 * pair[t]++);
        kernel.step(tiles[t], Tile.CAPACITY, 0);
        kernel.step(tiles[t], Tile.CAPACITY, 3);
      }
    }
    return this;
  }

  /** Time that a call of {@link #run} really advances (s). */
  double advance(double duration) {
    return 2 * segment.step() * Math.ceil(duration / (2 * segment.step()));
  }

  /** Hands every direction to a consumer. */
  void forEach(Consumer<double[]> consumer) {
    for (final Tile tile : tiles) {
      for (int i = 0; i < Tile.CAPACITY; i++) {
        consumer.accept(new double[] {tile.mx[i], tile.my[i], tile.mz[i]});
      }
    }
  }

  /** Mean of one component over the ensemble. */
  double mean(int component) {
    final double[] sum = new double[1];
    forEach(m -> sum[0] += m[component]);
    return sum[0] / (tiles.length * Tile.CAPACITY);
  }
}
