/**
 * The demo scenario: condition monitoring of a rotating machine by vibration pucks on its two
 * bearing housings. Seeded generator of the task data; studies and data files stand in the module's
 * folder {@code demo}. Across releases the same seed gives the same file, byte for byte.
 */
package torqueloom.demo;
