/**
 * Stateless formulas of small magnets, each with its source: demagnetizing factors, anisotropy
 * fields and their order, compensation, equilibria and barriers in the plane of rotation,
 * resonance, temperature laws. All values are SI and fields are in tesla (B = mu_0 H). Across
 * releases a formula keeps its argument order and units.
 */
package torqueloom.model.magnet;
