package torqueloom.model.device;

/**
 * A plain-language warning about a device.
 *
 * @param code fixed short name, lower case with hyphens, e.g. {@code rest-out-of-film}
 * @param text one or two sentences for a device engineer, with the numbers that caused it
 */
public record DeviceWarning(String code, String text) {}
