package torqueloom.training.learning;

/**
 * How the network is trained.
 *
 * @param epochs most passes over the training rows, &gt;= 1
 * @param batch rows per step, &gt;= 1
 * @param learningRate step of the updater (1), &gt; 0
 * @param variationAware whether each step draws new device instances and write errors
 * @param surrogateWidth width (drive over unit drive) by which the response's derivative is widened,
 *     NaN for automatic
 * @param patience epochs without a better validation accuracy before training stops, &gt;= 1
 */
public record TrainingSettings(
    int epochs,
    int batch,
    double learningRate,
    boolean variationAware,
    double surrogateWidth,
    int patience) {}
