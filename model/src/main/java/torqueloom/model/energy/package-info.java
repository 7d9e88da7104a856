/**
 * Energy, latency and power of an inference, by part, and published energies to hold it against.
 *
 * <p>Promise: what is not counted is named where the sum is formed.
 */
package torqueloom.model.energy;
