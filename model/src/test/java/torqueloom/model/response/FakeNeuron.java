package torqueloom.model.response;

import java.util.List;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.device.DeviceSummary;
import torqueloom.model.device.DriveProtocol;
import torqueloom.model.device.ElectricalChain;
import torqueloom.model.device.SlotOutcomes;
import torqueloom.model.device.SlotRequest;
import torqueloom.model.device.SlotSimulator;
import torqueloom.model.random.Streams;
import torqueloom.model.work.Progress;
import torqueloom.model.work.UnitExecutor;

/**
 * A neuron with a law known in closed form: with z standard normal, it gives max(0, floor((torque x
 * drive - threshold - |imbalance|/2)/spacing + noise z + 1)) counts. The threshold carries the
 * tolerance {@code threshold}, the torque {@code torque}; the imbalance moves with {@code imbalance}
 * and can be trimmed. A drive in the slot before adds {@code memory} times its torque field.
 */
record FakeNeuron(
    double torque, double threshold, double imbalance, double anisotropy, double memory)
    implements DeviceKind {
  static final double SPACING = 2;
  static final double NOISE = 0.3;
  static final FakeNeuron NOMINAL = new FakeNeuron(1, 4, 0.5, 100, 0);

  /** The library of a calibration, on one thread, without a store. */
  static ResponseLibrary library(Calibration calibration) {
    try {
      return new Calibrator(calibration).calibrate(new UnitExecutor(1, null, Progress.NONE));
    } catch (final InterruptedException e) {
      throw new IllegalStateException("nothing cancels a test", e);
    }
  }

  @Override
  public String kindName() {
    return "fake";
  }

  @Override
  public double referenceTemperature() {
    return 300;
  }

  @Override
  public String driveUnit() {
    return "A/m^2";
  }

  @Override
  public List<String> toleranceParameters() {
    return List.of("anisotropy", "threshold", "torque");
  }

  @Override
  public DeviceKind scaled(String parameter, double factor) {
    return switch (parameter) {
      case "anisotropy" ->
          new FakeNeuron(
              torque, threshold, imbalance - anisotropy * (factor - 1), anisotropy, memory);
      case "threshold" -> new FakeNeuron(torque, threshold * factor, imbalance, anisotropy, memory);
      case "torque" -> new FakeNeuron(torque * factor, threshold, imbalance, anisotropy, memory);
      default -> throw new IllegalArgumentException("unknown parameter " + parameter);
    };
  }

  @Override
  public double balancingShift(double temperature, double target) {
    return imbalance(temperature) - target;
  }

  @Override
  public double imbalance(double temperature) {
    return imbalance + 0.05 * (temperature - 300);
  }

  @Override
  public DeviceKind trimmed(double shift) {
    return new FakeNeuron(torque, threshold, imbalance - shift, anisotropy, memory);
  }

  @Override
  public double torquePerDrive(double temperature) {
    return torque * (1 - 0.001 * (temperature - 300));
  }

  @Override
  public double[] features(double temperature) {
    return new double[] {imbalance(temperature), threshold, 7};
  }

  @Override
  public List<String> featureNames() {
    return List.of("imbalance", "threshold", "constant");
  }

  @Override
  public DeviceSummary summarize(double temperature, DriveProtocol protocol) {
    throw new UnsupportedOperationException();
  }

  @Override
  public ElectricalChain electrical(double temperature, DriveProtocol protocol) {
    throw new UnsupportedOperationException();
  }

  /** Position of the law's center (counts) at a drive. */
  double center(double temperature, double drive, double previousDrive) {
    final double kick = Double.isNaN(previousDrive) ? 0 : memory * previousDrive;
    final double field = torquePerDrive(temperature) * (drive + kick);
    return (field - threshold - Math.abs(imbalance(temperature)) / 2) / SPACING;
  }

  @Override
  public SlotSimulator simulator(double temperature, DriveProtocol protocol) {
    return request -> outcomes(temperature, request);
  }

  private SlotOutcomes outcomes(double temperature, SlotRequest request) {
    final int trials = request.trials();
    final int[] counts = new int[trials];
    final int[] halfTurns = new int[trials];
    final double[] latency = new double[trials];
    final double center = center(temperature, request.drive(), request.previousDrive());
    for (int i = 0; i < trials; i++) {
      final double z = Streams.normal(request.streamKey(), request.firstTrial() + i);
      counts[i] = (int) Math.max(0, Math.floor(center + NOISE * z + 1));
      halfTurns[i] = -2 * counts[i];
      latency[i] = counts[i] == 0 ? Double.NaN : 1e-9 * (1 + 0.1 * z);
    }
    return new SlotOutcomes(counts, halfTurns, latency, new int[trials], Double.NaN, trials * 10L);
  }
}
