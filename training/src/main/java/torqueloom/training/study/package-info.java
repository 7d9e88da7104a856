/**
 * Whole studies: Monte Carlo over chips, intervals, verdict, and the order of the stages.
 */
package torqueloom.training.study;
