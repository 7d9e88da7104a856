/** The entry point: starts the command line and ends the process with its exit code. */
package torqueloom.app;
