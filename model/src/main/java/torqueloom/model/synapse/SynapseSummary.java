package torqueloom.model.synapse;

import java.util.List;
import torqueloom.model.device.DerivedQuantity;
import torqueloom.model.device.DeviceWarning;

/**
 * Derived quantities and warnings of the synapse.
 *
 * @param quantities in printing order
 * @param warnings in order of weight
 */
public record SynapseSummary(List<DerivedQuantity> quantities, List<DeviceWarning> warnings) {
  /** Copies the lists. */
  public SynapseSummary {
    quantities = List.copyOf(quantities);
    warnings = List.copyOf(warnings);
  }
}
