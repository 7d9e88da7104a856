package torqueloom.reports.render;

/**
 * How long one stage of a run took.
 *
 * @param name the stage
 * @param seconds wall-clock time (s)
 */
public record StageTime(String name, double seconds) {}
