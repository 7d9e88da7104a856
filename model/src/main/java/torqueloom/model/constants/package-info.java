/** Physical constants with the year of their adjustment. A constant's unit never changes. */
package torqueloom.model.constants;
