/**
 * Synapses: how a tunable anisotropy becomes a weight, with levels, reach, mismatch and gate voltage.
 */
package torqueloom.model.synapse;
