/**
 * Long computations as work units: small pure computations with a key, run on any number of
 * threads, their results kept in an append-only store, so that a run killed at any instant resumes.
 *
 * <p>Promise: results come back in the order of the units, whatever the threads; what the store has
 * acknowledged survives a crash; a file is either the former one or the complete new one. Engines
 * other than threads are found at run time through {@link torqueloom.model.work.EngineProvider}.
 */
package torqueloom.model.work;
