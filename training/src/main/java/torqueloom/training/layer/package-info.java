/** Layers of the deep-learning library as thin shells over the kernels; network files. */
package torqueloom.training.layer;
