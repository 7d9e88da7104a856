package torqueloom.training.chip;

import java.util.Arrays;
import java.util.List;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.device.DeviceSummary;
import torqueloom.model.device.DriveProtocol;
import torqueloom.model.device.ElectricalChain;
import torqueloom.model.device.SlotOutcomes;
import torqueloom.model.device.SlotSimulator;

/**
 * A device of two numbers: an imbalance that {@code film} moves, and a torque. Simulated, it never
 * counts.
 */
public record FakeDevice(double torque, double imbalance) implements DeviceKind {
  /** Torque 2, balanced. */
  public static final FakeDevice NOMINAL = new FakeDevice(2, 0);

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
    return List.of("film", "torque");
  }

  @Override
  public DeviceKind scaled(String parameter, double factor) {
    return parameter.equals("film")
        ? new FakeDevice(torque, imbalance + factor - 1)
        : new FakeDevice(torque * factor, imbalance);
  }

  @Override
  public double balancingShift(double temperature, double target) {
    return imbalance(temperature) - target;
  }

  @Override
  public double imbalance(double temperature) {
    return imbalance + 0.01 * (temperature - 300);
  }

  @Override
  public DeviceKind trimmed(double shift) {
    return new FakeDevice(torque, imbalance - shift);
  }

  @Override
  public double torquePerDrive(double temperature) {
    return torque;
  }

  @Override
  public double[] features(double temperature) {
    return new double[] {imbalance(temperature)};
  }

  @Override
  public List<String> featureNames() {
    return List.of("imbalance");
  }

  @Override
  public DeviceSummary summarize(double temperature, DriveProtocol protocol) {
    throw new UnsupportedOperationException("not needed here");
  }

  @Override
  public ElectricalChain electrical(double temperature, DriveProtocol protocol) {
    return new ElectricalChain(1000, 1e-15, 0.8, protocol.pulse(), 1e-15, 1e-12, 1e-6);
  }

  @Override
  public SlotSimulator simulator(double temperature, DriveProtocol protocol) {
    return request -> {
      final double[] never = new double[request.trials()];
      Arrays.fill(never, Double.NaN);
      return new SlotOutcomes(
          new int[request.trials()],
          new int[request.trials()],
          never,
          new int[request.trials()],
          Double.NaN,
          request.trials());
    };
  }
}
