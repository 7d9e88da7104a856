/**
 * Stochastic dynamics of macrospins: an ensemble kernel in float for many replicas, scalar and
 * vectorized with equal bits, and a reference integrator in double. Fields are in tesla, the
 * polarization of the spin current points along y, the applied field may point anywhere. Across
 * releases a trial's outcome depends only on its parameters, its segments and its stream key, never
 * on the batch, the thread or the kernel.
 */
package torqueloom.model.dynamics;
