/**
 * Trainers: surrogate gradients, and the logistic-regression baseline.
 */
package torqueloom.training.learning;
