/**
 * A report as an immutable tree: sections, paragraphs, tables, pictures, callouts. It knows what is
 * said, not how it looks; every text is plain and is escaped by whoever writes it out.
 */
package torqueloom.reports.document;
