package torqueloom.app.study;

import static torqueloom.app.study.Key.choice;
import static torqueloom.app.study.Key.flag;
import static torqueloom.app.study.Key.quantity;
import static torqueloom.app.study.Key.section;
import static torqueloom.app.study.Key.whole;
import static torqueloom.app.study.Use.LATER;
import static torqueloom.app.study.Use.TRAIN;
import static torqueloom.model.units.QuantityKind.CURRENT_DENSITY;
import static torqueloom.model.units.QuantityKind.FIELD;
import static torqueloom.model.units.QuantityKind.LENGTH;
import static torqueloom.model.units.QuantityKind.MAGNETIZATION;
import static torqueloom.model.units.QuantityKind.RATIO;
import static torqueloom.model.units.QuantityKind.RESISTANCE;
import static torqueloom.model.units.QuantityKind.RESISTANCE_AREA;
import static torqueloom.model.units.QuantityKind.TIME;
import static torqueloom.model.units.QuantityKind.VOLTAGE;

import java.util.List;

/** Keys of the synapse. */
final class SynapseKeys {
  private static final String JUNCTION = "synapse.junction.";

  private SynapseKeys() {}

  static Key synapse() {
    return section(
            "synapse",
            choice("kind", "junction", "unlimited")
                .later("island")
                .standard("junction")
                .doc(TRAIN, "what turns an anisotropy into a weight"),
            quantity("tuning-range", RATIO, "60 %", "> 0", "< 200 %")
                .standard("60 %")
                .doc(TRAIN, "full span of detuning, of the junction's anisotropy field"),
            whole("levels", 2, 1 << 20).standard("32").doc(TRAIN, "levels over the range"),
            quantity("write-error", RATIO, "1 %", ">= 0", "<= 100 %")
                .standard("1 %")
                .doc(TRAIN, "residual after programming, of the range, one standard deviation"),
            flag("write-verify")
                .standard("true")
                .doc(TRAIN, "programming measures the pair and corrects it"),
            whole("fan-in", 1, 1_000_000).standard("64").doc(TRAIN, "most synapses on one line"),
            quantity("unit-drive", CURRENT_DENSITY, "3.9e10 A/m^2", "> 0 A/m^2", "<= 1e14 A/m^2")
                .must()
                .doc(TRAIN, "strip current density of one full-scale weight for one count"),
            Key.of("gain", new ValueType.WordOr("auto", gain()))
                .standard("auto")
                .doc(TRAIN, "current gain of the input stage"),
            quantity("read-window", TIME, "5 ns", "> 0 s", "<= 10 us")
                .standard("5 ns")
                .doc(TRAIN, "time over which the input stage integrates"),
            quantity("line-resistance", RESISTANCE, "5 ohm", ">= 0 ohm", "<= 1 Mohm")
                .standard("5 ohm")
                .doc(TRAIN, "resistance of one line"),
            DeviceKeys.gate().doc(TRAIN, "gate on the synapse's film"),
            junction(),
            island())
        .must()
        .doc(TRAIN, "the synapse");
  }

  private static ValueType gain() {
    return new ValueType.Quantity(
        RATIO, List.of(Bound.of("> 0", RATIO), Bound.of("<= 1e9", RATIO)), "100");
  }

  private static Key junction() {
    return section(
            "junction",
            quantity("anisotropy-field", FIELD, "100 mT", "> 0 T", "<= 10 T")
                .standard("100 mT")
                .doc(TRAIN, "net perpendicular anisotropy field, demagnetization subtracted"),
            quantity("bias-field", FIELD, "60 mT", "> 0 T", "<= 10 T")
                .standard("60 mT")
                .doc(TRAIN, "field in the plane along the reference layer"),
            quantity("diameter", LENGTH, "80 nm", "> 0 nm", "<= 10 um")
                .standard("80 nm")
                .doc(TRAIN, "diameter"),
            quantity("thickness", LENGTH, "1.6 nm", "> 0 nm", "<= 1 um")
                .standard("1.6 nm")
                .doc(TRAIN, "free-layer thickness"),
            quantity("saturation-magnetization", MAGNETIZATION, "1.0 MA/m", "> 0 A/m", "<= 5 MA/m")
                .standard("1.0 MA/m")
                .doc(TRAIN, "saturation magnetization of the free layer"),
            quantity("damping", RATIO, "0.03", "> 0", "<= 1")
                .standard("0.03")
                .doc(TRAIN, "Gilbert damping of the free layer"),
            quantity(
                    "resistance-area",
                    RESISTANCE_AREA,
                    "50 ohm um^2",
                    "> 0 ohm um^2",
                    "<= 1e6 ohm um^2")
                .standard("50 ohm um^2")
                .doc(TRAIN, "resistance-area product, parallel state"),
            quantity("magnetoresistance", RATIO, "120 %", "> 0", "<= 20")
                .standard("120 %")
                .doc(TRAIN, "tunnel magnetoresistance, (R_AP - R_P)/R_P"),
            quantity("polarization", RATIO, "0.6", "> 0", "<= 1")
                .standard("0.6")
                .doc(TRAIN, "spin polarization"),
            quantity("read-voltage", VOLTAGE, "100 mV", "> 0 V", "<= 5 V")
                .standard("100 mV")
                .doc(TRAIN, "voltage of one count on the line"),
            quantity("barrier", LENGTH, "1.3 nm", "> 0.1 nm", "<= 100 nm")
                .standard("1.3 nm")
                .doc(TRAIN, "barrier thickness"),
            section(
                    "tolerances",
                    spread("resistance-area", RESISTANCE_AREA),
                    spread("diameter", LENGTH),
                    spread("anisotropy-field", FIELD),
                    spread("magnetoresistance", RATIO))
                .doc(TRAIN, "spread of each junction, one standard deviation; left out: none"))
        .standard("{}")
        .doc(TRAIN, "the tunable tunnel junction");
  }

  private static Key spread(String name, torqueloom.model.units.QuantityKind kind) {
    return CalibrationKeys.spread(TRAIN, name, kind, JUNCTION + name, "of the junction's " + name);
  }

  private static Key island() {
    return section(
            "island",
            quantity("length", LENGTH, "50 nm", "> 0 nm", "<= 100 um")
                .standard("50 nm")
                .doc(LATER, "length of the island"),
            quantity("site", LENGTH, "25 nm", "> 0 nm", "<= 1 um")
                .standard("25 nm")
                .doc(LATER, "length of one simulated site"),
            quantity(
                    "continuous-drive",
                    CURRENT_DENSITY,
                    "3.9e10 A/m^2",
                    ">= 0 A/m^2",
                    "<= 1e14 A/m^2")
                .standard("0 A/m^2")
                .doc(LATER, "continuous current everywhere in the chain"))
        .doc(LATER, "a magnetic island between two oscillators");
  }
}
