/**
 * Device kinds behind one interface: protocol and replicas in, counts and latency out; their derived quantities, electrical chain and warnings. SI inside.
 */
package torqueloom.model.device;
