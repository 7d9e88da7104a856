package torqueloom.reports.feasibility;

import java.util.Arrays;
import java.util.List;
import torqueloom.model.response.ResponseCurve;
import torqueloom.reports.figure.Axis;
import torqueloom.reports.figure.Numbers;

/**
 * The drive in a unit that gives readable numbers: the drive unit times a power of ten.
 *
 * @param power exponent of the power of ten
 * @param unit drive unit
 */
record DriveAxis(int power, String unit) {
  static DriveAxis of(List<ResponseCurve> curves, String unit) {
    final double largest =
        curves.stream()
            .flatMapToDouble(c -> Arrays.stream(c.drive()))
            .map(Math::abs)
            .filter(Double::isFinite)
            .max()
            .orElse(1);
    final int exponent = largest > 0 ? (int) Math.floor(StrictMath.log10(largest)) : 0;
    return new DriveAxis(exponent >= -1 && exponent <= 3 ? 0 : exponent, unit);
  }

  /** Drives on the axis. */
  double[] scaled(double[] drives) {
    final double factor = Double.parseDouble("1e" + power);
    return Arrays.stream(drives).map(d -> d / factor).toArray();
  }

  Axis axis() {
    final String power10 = power == 0 ? "" : "10" + Numbers.superscript(power) + " ";
    return Axis.linear("drive", power10 + Words.pretty(unit));
  }

  /** Torque field in mT per step of the axis. */
  double milliteslaPerStep(double torquePerDrive) {
    return torquePerDrive * Double.parseDouble("1e" + power) * 1e3;
  }
}
