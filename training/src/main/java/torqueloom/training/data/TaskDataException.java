package torqueloom.training.data;

import java.io.Serial;
import java.util.ArrayList;
import java.util.List;

/**
 * Task data that cannot be used. The message is meant for the user as it stands: each fault names
 * the file, the line and column where there is one, what was found and what is allowed.
 */
public final class TaskDataException extends RuntimeException {
  @Serial private static final long serialVersionUID = 1L;

  private final transient List<String> faults;

  /** One fault. */
  public TaskDataException(String fault) {
    this(List.of(fault));
  }

  /**
   * Several faults, one a line.
   *
   * @param faults at least one
   */
  public TaskDataException(List<String> faults) {
    super(String.join(System.lineSeparator(), faults));
    this.faults = List.copyOf(faults);
  }

  /** The faults one by one, in the order of the file. */
  public List<String> faults() {
    return faults == null ? List.of(getMessage()) : faults;
  }

  /**
   * A fault in the layout used for study files: place and name in the first line, found and allowed
   * in the second.
   */
  static String fault(String place, String name, String found, String allowed) {
    return place + (name.isEmpty() ? "" : "  " + name) + "\n    found " + found + "; " + allowed;
  }

  /** Collects the first faults of a file and counts the rest. */
  static final class Collector {
    /** More faults than this help nobody. */
    private static final int SHOWN = 10;

    private final List<String> faults = new ArrayList<>();
    private long count;

    void add(String place, String name, String found, String allowed) {
      if (count++ < SHOWN) {
        faults.add(fault(place, name, found, allowed));
      }
    }

    /** Throws what was collected, if anything. */
    void throwIfAny(String file) {
      if (count == 0) {
        return;
      }
      if (count > SHOWN) {
        faults.add(file + ": " + (count - SHOWN) + " more faults of this kind are not shown");
      }
      throw new TaskDataException(faults);
    }
  }
}
