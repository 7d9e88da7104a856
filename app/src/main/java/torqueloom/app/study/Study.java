package torqueloom.app.study;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.device.DeviceSummary;
import torqueloom.model.device.DeviceWarning;
import torqueloom.model.device.DriveProtocol;
import torqueloom.model.device.EasyPlaneFerromagnet;
import torqueloom.training.study.StudyPlan;

/** A study that passed all checks; yields the plain values of the lower packages. Immutable. */
public final class Study {
  private final Path file;
  private final Values values;
  private final List<String> notices;
  private final String digest;
  private final boolean withTask;

  Study(Path file, Values values, List<String> notices, String digest, boolean withTask) {
    this.withTask = withTask;
    this.file = file;
    this.values = values;
    this.notices = List.copyOf(notices);
    this.digest = digest;
  }

  /** The study file. */
  public Path file() {
    return file;
  }

  /** The proposal's name. */
  public String name() {
    return values.text("name");
  }

  /** Seed of all random numbers. */
  public long seed() {
    return values.longWhole("seed");
  }

  /** SHA-256 of the effective study and its data, lower-case hex. */
  public String digest() {
    return digest;
  }

  /** Keys that stand in the study but are not used by this version, one sentence each. */
  public List<String> notices() {
    return notices;
  }

  /** The run folder unless another is asked for: NAME.run beside the study. */
  public Path defaultRunFolder() {
    return StudyFile.folderOf(file).resolve(StudyFile.nameOf(file) + ".run");
  }

  /** The nominal device. */
  public DeviceKind device() {
    return PlanBuilder.device(values);
  }

  /**
   * Derived quantities and warnings of the device at its own temperature; where the study trims,
   * the gate must reach the trim's range, and a warning says when it cannot.
   */
  public DeviceSummary summary() {
    final DeviceKind device = device();
    final DeviceSummary summary = device.summarize(temperature(), protocol());
    final List<DeviceWarning> warnings = new ArrayList<>(summary.warnings());
    if (device instanceof EasyPlaneFerromagnet ferromagnet) {
      values
          .findNumber("trim.range")
          .flatMap(ferromagnet::gateWarning)
          .filter(warning -> warnings.stream().noneMatch(w -> w.code().equals(warning.code())))
          .ifPresent(warnings::add);
    }
    return new DeviceSummary(
        summary.kind(),
        summary.temperatureKelvin(),
        summary.device(),
        summary.electrical(),
        warnings);
  }

  /** How a neuron is driven. */
  public DriveProtocol protocol() {
    return PlanBuilder.protocol(values);
  }

  private double temperature() {
    return values.number("device.temperature");
  }

  /**
   * Everything the study asks for; without its task when it was read for an earlier stage than the
   * training.
   *
   * @throws IllegalStateException if the study was read for an earlier stage than the chips
   */
  public StudyPlan plan() {
    return new PlanBuilder(values, StudyFile.folderOf(file)).plan(digest, notices, withTask);
  }
}
