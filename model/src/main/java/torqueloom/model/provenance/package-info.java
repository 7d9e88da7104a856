/**
 * Where a result comes from: versions, platform, seed, digests of the inputs, kernels used. Kept
 * apart from the results, which must not change with the machine; across releases fields are added,
 * none renamed.
 */
package torqueloom.model.provenance;
