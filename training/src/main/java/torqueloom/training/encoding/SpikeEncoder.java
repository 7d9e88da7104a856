package torqueloom.training.encoding;

import java.util.List;
import torqueloom.training.data.TaskTable;

/** Turns task rows into input levels of a network, one level per input channel and slot. */
public interface SpikeEncoder {
  /** Input channels of the network. */
  int inputs();

  /**
   * Whether every slot shows the same levels. If so {@link #encode} writes each row's levels once,
   * and one matrix product serves all slots.
   */
  boolean constantOverSlots();

  /**
   * Levels of every row, in [0, 1].
   *
   * @param table rows with the features the encoder was fitted to
   * @param slots slots of one inference, at least 1
   * @return [rows][inputs] flat if {@link #constantOverSlots()}, else [rows][slots][inputs] flat
   * @throws IllegalArgumentException if the number of features differs or slots is below 1
   */
  float[] encode(TaskTable table, int slots);

  /** What a reader should know about the fit, e.g. features that never vary; may be empty. */
  List<String> notes();
}
