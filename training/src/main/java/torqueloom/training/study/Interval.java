package torqueloom.training.study;

/**
 * An estimate with its interval.
 *
 * @param estimate (unit of the quantity)
 * @param low lower end
 * @param high upper end
 */
public record Interval(double estimate, double low, double high) {}
