/**
 * A chip: its drawn neurons and synapses.
 */
package torqueloom.training.chip;
