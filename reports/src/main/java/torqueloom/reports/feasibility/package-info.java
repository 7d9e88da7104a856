/**
 * The report of a feasibility study: the verdict in words, why, what would change it, and the
 * sections that show the numbers behind it. Every number comes from the result; this package
 * computes nothing but shares, differences and the size of a sample that would decide.
 */
package torqueloom.reports.feasibility;
