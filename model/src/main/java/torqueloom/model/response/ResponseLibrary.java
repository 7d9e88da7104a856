package torqueloom.model.response;

import java.util.List;

/**
 * Calibrated responses of many device instances drawn from the tolerances (after trim), indexed by
 * temperature. Instance 0 is the nominal device.
 *
 * @param digest digest of everything that the calibration depends on
 * @param driveUnit unit of the drives
 * @param temperatures (K), ascending as the study states them
 * @param featureNames names of the features in {@code instances}
 * @param featureWeights weight of each feature in the distance between devices, by its effect on the
 *     counts (counts per unit of the feature), [features]
 * @param instances one entry an instance and temperature
 * @param curves one entry an instance, temperature and state
 * @param carryOver largest total variation between P after a quiet slot and after a busy one, nominal
 *     device (1), see {@link CarryOver}
 * @param carryOverFloor what chance alone would stay below in 95 of 100 measurements (1)
 * @param matchingError mean absolute difference in mean count between an instance and the other
 *     instance nearest to it (1), NaN with one instance: how well matching replaces simulation
 * @param replicaSteps integration steps spent (1)
 * @param kernel which integrator ran, in plain words; for the provenance only
 */
public record ResponseLibrary(
    String digest,
    String driveUnit,
    List<Double> temperatures,
    List<String> featureNames,
    double[] featureWeights,
    List<LibraryInstance> instances,
    List<ResponseCurve> curves,
    double carryOver,
    double carryOverFloor,
    double matchingError,
    long replicaSteps,
    String kernel) {

  /** Copies the lists. */
  public ResponseLibrary {
    temperatures = List.copyOf(temperatures);
    featureNames = List.copyOf(featureNames);
    instances = List.copyOf(instances);
    curves = List.copyOf(curves);
  }

  ResponseLibrary withMatchingError(double error) {
    return new ResponseLibrary(
        digest,
        driveUnit,
        temperatures,
        featureNames,
        featureWeights,
        instances,
        curves,
        carryOver,
        carryOverFloor,
        error,
        replicaSteps,
        kernel);
  }
}
