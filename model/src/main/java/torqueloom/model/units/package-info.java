/**
 * Unit symbols and prefixes; text to SI number and back. The only place that knows "nm", "Oe" or a
 * field given in A/m: everything else computes in SI, fields in tesla.
 *
 * <p>Promise: decimal text is scaled exactly before it is rounded once to a double, so {@code 60
 * nm} is the double nearest to 6e-8. What could be read in two ways is refused, never guessed.
 */
package torqueloom.model.units;
