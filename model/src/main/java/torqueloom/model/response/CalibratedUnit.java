package torqueloom.model.response;

/**
 * Result of one work unit: one instance at one temperature.
 *
 * @param instance its parameters
 * @param curve its response after a quiet slot
 * @param replicaSteps integration steps spent (1)
 */
record CalibratedUnit(LibraryInstance instance, ResponseCurve curve, long replicaSteps) {}
