/**
 * Forward and backward kernels of device layers on plain arrays; accuracy.
 */
package torqueloom.training.evaluation;
