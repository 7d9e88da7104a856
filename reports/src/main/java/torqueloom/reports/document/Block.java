package torqueloom.reports.document;

/** A piece of a report that stands on its own lines. */
public sealed interface Block
    permits Bullets, Callout, Definitions, Figure, Paragraph, Section, Table, Tiles {}
