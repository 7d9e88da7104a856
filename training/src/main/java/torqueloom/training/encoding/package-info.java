/**
 * Spike encoders: from features of a task row to the levels that drive a network's first layer in
 * each slot. An encoder is fitted to training rows only, is immutable, and gives levels in [0, 1].
 */
package torqueloom.training.encoding;
