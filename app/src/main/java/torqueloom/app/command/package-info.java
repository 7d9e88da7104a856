/**
 * The command line: reads a study, calls a stage, prints the answer. Computes nothing. Results go to
 * standard output, everything else to standard error; exit codes as {@link
 * torqueloom.app.command.ExitCode} says.
 */
package torqueloom.app.command;
