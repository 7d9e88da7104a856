package torqueloom.training.data;

import java.nio.file.Path;
import java.util.Optional;

/**
 * Where the task's data stand and how they are split. Exactly one of {@code data}, the pair {@code
 * features}/{@code labels} and the pair {@code train}/{@code test} is given.
 *
 * @param data one CSV with all rows
 * @param features IDX or NPY features
 * @param labels IDX or NPY labels
 * @param train CSV with training rows (validation rows are taken from it)
 * @param test CSV with test rows
 * @param label name of the label column
 * @param trainShare share of training rows (1)
 * @param validationShare share of validation rows (1)
 * @param testShare share of test rows (1)
 */
public record TaskSettings(
    Optional<Path> data,
    Optional<Path> features,
    Optional<Path> labels,
    Optional<Path> train,
    Optional<Path> test,
    String label,
    double trainShare,
    double validationShare,
    double testShare) {}
