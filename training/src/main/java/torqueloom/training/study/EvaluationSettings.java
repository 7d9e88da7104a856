package torqueloom.training.study;

import java.util.List;

/**
 * What is evaluated on chips.
 *
 * @param chips number of chips, &gt;= 1
 * @param noisePasses thermal draws of the test set per chip, &gt;= 1
 * @param temperatures (K), at least one
 */
public record EvaluationSettings(int chips, int noisePasses, List<Double> temperatures) {}
