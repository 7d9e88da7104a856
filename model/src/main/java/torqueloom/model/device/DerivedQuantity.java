package torqueloom.model.device;

/**
 * One derived quantity of a device, as printed by the {@code device} command and the report.
 *
 * @param key name in machine-readable results, e.g. {@code thresholdTesla}
 * @param label plain words, e.g. "threshold field of the damping-like torque"
 * @param symbol symbol in the literature, e.g. "B_DL,c"; may be empty
 * @param value a {@link Double}, a {@code double[]} or a {@link String}; SI
 * @param unit SI unit, "1" for a pure number, empty for text
 */
public record DerivedQuantity(String key, String label, String symbol, Object value, String unit) {}
