package torqueloom.training.study;

/**
 * What the proposal must reach.
 *
 * @param accuracy accuracy that a chip must reach (1)
 * @param yield share of chips that must reach it (1)
 * @param confidence confidence of the decision (1)
 */
public record Targets(double accuracy, double yield, double confidence) {}
