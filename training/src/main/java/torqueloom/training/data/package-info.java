/**
 * Task tables: reading CSV, IDX and NPY, and splitting rows.
 */
package torqueloom.training.data;
