package torqueloom.training.evaluation;

/**
 * The neurons of one layer on one chip: which library instance answers for each, and its scale.
 *
 * @param instance library instance of each neuron, [neurons]
 * @param driveFactor torque of the neuron's own strip over the instance's, [neurons]
 */
public record NeuronLayer(int[] instance, float[] driveFactor) {
  /** All neurons nominal. */
  public static NeuronLayer nominal(int neurons) {
    final float[] factor = new float[neurons];
    java.util.Arrays.fill(factor, 1f);
    return new NeuronLayer(new int[neurons], factor);
  }
}
