package torqueloom.app.command;

import java.io.PrintStream;

/**
 * Where a command prints.
 *
 * @param out results
 * @param err everything else
 * @param terminal whether {@code err} is a terminal, so that a line may be overwritten
 */
record Console(PrintStream out, PrintStream err, boolean terminal) {}
