package torqueloom.app.study;

import static torqueloom.app.study.Key.flag;
import static torqueloom.app.study.Key.quantity;
import static torqueloom.app.study.Key.section;
import static torqueloom.app.study.Key.whole;
import static torqueloom.app.study.Use.CALIBRATE;
import static torqueloom.model.units.QuantityKind.FIELD;
import static torqueloom.model.units.QuantityKind.LENGTH;
import static torqueloom.model.units.QuantityKind.MAGNETIZATION;
import static torqueloom.model.units.QuantityKind.RATIO;
import static torqueloom.model.units.QuantityKind.SURFACE_ENERGY;
import static torqueloom.model.units.QuantityKind.TEMPERATURE;

import torqueloom.model.units.QuantityKind;

/** Keys of the device's tolerances, its trim and the calibration of its responses. */
final class CalibrationKeys {
  private CalibrationKeys() {}

  static Key tolerances() {
    return section(
            "tolerances",
            spread("thickness", LENGTH, "device.film.thickness", "of the film thickness"),
            spread(
                "interface-anisotropy",
                SURFACE_ENERGY,
                "device.film.interface-anisotropy",
                "of the interfacial anisotropy"),
            spread(
                "saturation-magnetization",
                MAGNETIZATION,
                "device.film.saturation-magnetization",
                "of the saturation magnetization"),
            spread("damping", RATIO, "device.film.damping", "of the Gilbert damping"),
            spread("length", LENGTH, "device.outline.length", "of the outline's length"),
            spread("width", LENGTH, "device.outline.width", "of the outline's width"),
            spread(
                "spin-hall-angle",
                RATIO,
                "device.drive.spin-hall-angle",
                "of the damping-like efficiency"),
            spread("bias-field", FIELD, "device.bias-field", "of the bias field"))
        .doc(
            CALIBRATE, "spread of the device's parameters, one standard deviation; left out: none");
  }

  /** Tolerance of one parameter, chip to chip and device to device. */
  static Key spread(Use use, String name, QuantityKind kind, String nominal, String line) {
    final ValueType share = new ValueType.Deviation(kind, nominal);
    return section(
            name,
            Key.of("chip", share).standard("0 %").doc(use, "part shared by a chip's devices"),
            Key.of("device", share).standard("0 %").doc(use, "part of each device"))
        .doc(use, line);
  }

  private static Key spread(String name, QuantityKind kind, String nominal, String line) {
    return spread(CALIBRATE, name, kind, nominal, line);
  }

  static Key trim() {
    return section(
            "trim",
            quantity("range", SURFACE_ENERGY, "0.03 mJ/m^2", "> 0 mJ/m^2", "<= 20 mJ/m^2")
                .must()
                .doc(CALIBRATE, "largest shift of K_i, plus and minus"),
            whole("levels", 2, 1 << 20)
                .standard("64")
                .doc(CALIBRATE, "number of levels over the whole range"),
            quantity("temperature", TEMPERATURE, "300 K", "> 0 K", "<= 1000 K")
                .standard("= device.temperature")
                .doc(CALIBRATE, "temperature of a trim made once"),
            flag("retrim").standard("true").doc(CALIBRATE, "trim anew at each temperature"))
        .doc(CALIBRATE, "correction of each neuron's imbalance through its gate; left out: none");
  }

  static Key calibration() {
    return section(
            "calibration",
            whole("instances", 1, 10_000)
                .standard("64")
                .doc(
                    CALIBRATE,
                    "device instances in the response library, the nominal one included"),
            whole("drives", 2, 1000).standard("24").doc(CALIBRATE, "drives from 0 to the largest"),
            quantity("half-width", RATIO, "2 %", ">= 0.1 %", "< 50 %")
                .standard("2 %")
                .doc(CALIBRATE, "wanted half-width of the 95 % interval of each P(n)"),
            whole("maximum-trials", 16, 10_000_000)
                .standard("4000")
                .doc(CALIBRATE, "most trials at one drive"))
        .standard("{}")
        .doc(CALIBRATE, "how finely responses are calibrated");
  }
}
