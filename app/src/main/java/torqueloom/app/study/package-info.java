/**
 * The study file: its keys in one schema, the reader that reports every fault at once with file,
 * line and column, and the plain values of the lower packages it yields. Units end here; everything
 * handed on is SI.
 */
package torqueloom.app.study;
