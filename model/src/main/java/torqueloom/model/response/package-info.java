/**
 * Calibrated spike responses: how many counts a slot gives at each drive, and the library of many
 * device instances that the network's neurons draw from.
 *
 * <p>Promise: a library depends on its {@link torqueloom.model.response.Calibration} alone, not on
 * threads, batches or stored parts; every share of counts carries the number of trials behind it;
 * nothing is extrapolated beyond the calibrated drives. Start at {@link
 * torqueloom.model.response.Calibrator}; networks read {@link
 * torqueloom.model.response.CountTables} and {@link torqueloom.model.response.ResponseMatcher}.
 */
package torqueloom.model.response;
