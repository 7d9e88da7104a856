package torqueloom.training.study;

/**
 * Accuracy of the chips at one temperature.
 *
 * @param temperatureKelvin (K)
 * @param accuracies mean accuracy of each chip over the noise passes (1), [chips]
 * @param median median accuracy with its anytime-valid interval (1)
 * @param standardDeviation spread of the chips' accuracies (1)
 * @param quantile05 5 % quantile of the accuracies (1)
 * @param quantile95 95 % quantile of the accuracies (1)
 * @param withinChipDeviation standard deviation over noise passes on one chip, averaged (1)
 * @param yield share of chips that reach the target on this test set, anytime-valid interval
 * @param yieldOnNewCases the same with test cases resampled too (pigeonhole bootstrap)
 * @param wilson Wilson interval of the yield; valid because the number of chips was fixed before
 * @param meanClippedShare share of pulses clipped at the maximum drive (1)
 */
public record TemperatureOutcome(
    double temperatureKelvin,
    double[] accuracies,
    Interval median,
    double standardDeviation,
    double quantile05,
    double quantile95,
    double withinChipDeviation,
    Interval yield,
    Interval yieldOnNewCases,
    Interval wilson,
    double meanClippedShare) {}
