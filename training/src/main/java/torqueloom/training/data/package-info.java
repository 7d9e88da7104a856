/**
 * Task data: immutable tables of labeled rows, their readers (CSV with a header, IDX plain or
 * gzipped, NPY), and the split into training, validation and test rows.
 *
 * <p>Every reader works on bytes read once, so the SHA-256 digest reported for a file is that of
 * exactly what was parsed. A file that cannot serve raises {@link
 * torqueloom.training.data.TaskDataException}, whose message names file, place, what was found and
 * what is allowed. Across releases the same bytes and the same seed give the same split.
 */
package torqueloom.training.data;
