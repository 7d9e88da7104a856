/**
 * Calibrated spike responses: curves of counts against drive, and the library of many device instances that the network's neurons draw from.
 */
package torqueloom.model.response;
