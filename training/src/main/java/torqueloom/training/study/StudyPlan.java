package torqueloom.training.study;

import java.util.List;
import java.util.Optional;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.device.DriveProtocol;
import torqueloom.model.response.CalibrationSettings;
import torqueloom.model.synapse.SynapseSettings;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.model.tolerance.Trim;
import torqueloom.training.data.TaskSettings;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.learning.TrainingSettings;

/**
 * Everything a study asks for, as plain values of the lower packages; SI.
 *
 * @param name the study's name
 * @param seed study seed, 0 to 2^53 - 1
 * @param digest SHA-256 of the effective study and its data, lower-case hex
 * @param device the nominal device
 * @param protocol drive protocol
 * @param tolerances of the device
 * @param trim of the neurons, empty when not trimmed
 * @param calibration of the responses
 * @param synapse the synapse
 * @param task task data; empty when only responses are asked for
 * @param network shape of the network
 * @param training trainer
 * @param evaluation chips
 * @param targets targets
 * @param notices fields accepted but not used by this version, in plain words
 */
public record StudyPlan(
    String name,
    long seed,
    String digest,
    DeviceKind device,
    DriveProtocol protocol,
    Tolerances tolerances,
    Optional<Trim> trim,
    CalibrationSettings calibration,
    SynapseSettings synapse,
    Optional<TaskSettings> task,
    NetworkSettings network,
    TrainingSettings training,
    EvaluationSettings evaluation,
    Targets targets,
    List<String> notices) {}
