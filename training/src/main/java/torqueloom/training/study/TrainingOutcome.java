package torqueloom.training.study;

import torqueloom.training.learning.TrainingHistory;

/**
 * What the {@code train} command reports.
 *
 * @param history course of the training
 * @param ideal accuracy of the ideal network on the test rows (1)
 * @param baseline accuracy of logistic regression on the same rows (1)
 * @param baselineStrength chosen strength of its penalty (1)
 */
public record TrainingOutcome(
    TrainingHistory history, double ideal, double baseline, double baselineStrength) {}
