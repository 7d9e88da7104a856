package torqueloom.training.study;

import java.util.List;
import torqueloom.model.device.DeviceSummary;
import torqueloom.model.energy.InferenceCost;
import torqueloom.model.response.ResponseLibrary;
import torqueloom.model.synapse.SynapseSummary;
import torqueloom.training.learning.TrainingHistory;

/**
 * Everything a report shows.
 *
 * @param plan what was asked
 * @param version version of the program
 * @param device derived quantities at the reference temperature
 * @param synapse derived quantities of the synapse
 * @param library calibrated responses
 * @param history course of the training
 * @param rows rows of the task: training, validation, test, [3]
 * @param features number of features
 * @param classes class names
 * @param ideal accuracy of the ideal network on the test rows (1)
 * @param baseline accuracy of logistic regression on the same test rows (1)
 * @param baselineStrength chosen strength of its penalty (1)
 * @param chips one entry a temperature
 * @param toleranceEffect what the tolerances cost
 * @param trim what trim buys
 * @param cost energy and latency of one inference
 * @param verdict the answer
 */
public record StudyResult(
    StudyPlan plan,
    String version,
    DeviceSummary device,
    SynapseSummary synapse,
    ResponseLibrary library,
    TrainingHistory history,
    int[] rows,
    int features,
    List<String> classes,
    double ideal,
    double baseline,
    double baselineStrength,
    List<TemperatureOutcome> chips,
    ToleranceEffect toleranceEffect,
    TrimComparison trim,
    InferenceCost cost,
    Verdict verdict) {}
