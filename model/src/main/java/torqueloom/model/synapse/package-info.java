/**
 * Synapses: how a tunable anisotropy becomes a weight, with levels, reach, mismatch and gate voltage.
 *
 * <p>Promise: a weight is the difference of two normalized conductances in units of one full-scale
 * weight, and every error of it (write error, mismatch, gain) is stated in the same unit.
 */
package torqueloom.model.synapse;
