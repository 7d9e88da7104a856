/**
 * Energy, latency, power and heating of an inference, by part.
 */
package torqueloom.model.energy;
