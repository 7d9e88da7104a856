/**
 * Counter-based random streams. A random number is a pure function of (study seed, purpose, any
 * number of indices, counter), so no result depends on the order in which work is done. Across
 * releases the numbers written beside each {@link torqueloom.model.random.Purpose} never change.
 */
package torqueloom.model.random;
