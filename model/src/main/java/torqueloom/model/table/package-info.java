/**
 * Codecs of model values: canonical JSON, CSV and NPY.
 *
 * <p>Promise: the same values give the same bytes on every Java version and platform. A number is
 * written in the shortest form that reads back to the same double. Files are moved into place
 * whole; a message about a bad file names the file, the place, what was found and what is wanted.
 */
package torqueloom.model.table;
