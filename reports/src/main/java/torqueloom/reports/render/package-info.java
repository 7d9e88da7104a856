/**
 * Writers of a report: one self-contained HTML page that asks nothing of the network, tables as CSV,
 * and results as JSON. What a page shows comes from the document, how it looks from one style sheet.
 */
package torqueloom.reports.render;
