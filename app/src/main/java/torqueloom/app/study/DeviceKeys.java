package torqueloom.app.study;

import static torqueloom.app.study.Key.choice;
import static torqueloom.app.study.Key.quantity;
import static torqueloom.app.study.Key.section;
import static torqueloom.app.study.Use.DEVICE;
import static torqueloom.app.study.Use.LATER;
import static torqueloom.model.units.QuantityKind.CAPACITANCE;
import static torqueloom.model.units.QuantityKind.CURRENT;
import static torqueloom.model.units.QuantityKind.CURRENT_DENSITY;
import static torqueloom.model.units.QuantityKind.ELECTRIC_FIELD;
import static torqueloom.model.units.QuantityKind.ENERGY;
import static torqueloom.model.units.QuantityKind.EXCHANGE;
import static torqueloom.model.units.QuantityKind.FIELD;
import static torqueloom.model.units.QuantityKind.FREQUENCY;
import static torqueloom.model.units.QuantityKind.LENGTH;
import static torqueloom.model.units.QuantityKind.MAGNETIZATION;
import static torqueloom.model.units.QuantityKind.RATIO;
import static torqueloom.model.units.QuantityKind.RESISTANCE;
import static torqueloom.model.units.QuantityKind.RESISTANCE_AREA;
import static torqueloom.model.units.QuantityKind.RESISTIVITY;
import static torqueloom.model.units.QuantityKind.SURFACE_ENERGY;
import static torqueloom.model.units.QuantityKind.TEMPERATURE;
import static torqueloom.model.units.QuantityKind.THERMAL_RESISTANCE;
import static torqueloom.model.units.QuantityKind.TIME;
import static torqueloom.model.units.QuantityKind.VOLTAGE;
import static torqueloom.model.units.QuantityKind.VOLTAGE_COEFFICIENT;

/** Keys of the device and its drive protocol. */
final class DeviceKeys {
  private DeviceKeys() {}

  static Key device() {
    return section(
            "device",
            choice("kind", "easy-plane-ferromagnet")
                .later(
                    "easy-plane-antiferromagnet",
                    "josephson-junction",
                    "auto-oscillator",
                    "superparamagnetic-junction",
                    "measured")
                .must()
                .doc(DEVICE, "kind of neuron"),
            quantity("temperature", TEMPERATURE, "300 K", "> 0 K", "<= 1000 K")
                .standard("300 K")
                .doc(DEVICE, "temperature at which the device's values are stated"),
            film(),
            outline(),
            quantity("bias-field", FIELD, "4 mT", ">= -1 T", "<= 1 T")
                .standard("0 mT")
                .doc(DEVICE, "magnetic field along the length, x, always"),
            drive(),
            readout(),
            gate().doc(DEVICE, "gate on the neuron's film, used by the trim"))
        .must()
        .doc(DEVICE, "the neuron's device");
  }

  private static Key film() {
    return section(
            "film",
            quantity(
                    "saturation-magnetization", MAGNETIZATION, "0.8 MA/m", ">= 1 kA/m", "<= 5 MA/m")
                .must()
                .doc(DEVICE, "saturation magnetization Ms"),
            quantity("thickness", LENGTH, "1.3 nm", ">= 0.1 nm", "<= 1 um")
                .must()
                .doc(DEVICE, "film thickness t"),
            quantity(
                    "interface-anisotropy",
                    SURFACE_ENERGY,
                    "1.379 mJ/m^2",
                    ">= -20 mJ/m^2",
                    "<= 20 mJ/m^2")
                .standard("0 mJ/m^2")
                .doc(DEVICE, "interfacial anisotropy K_i; positive favors the film normal"),
            quantity("damping", RATIO, "0.1", "> 0", "<= 1").must().doc(DEVICE, "Gilbert damping"),
            quantity("exchange-stiffness", EXCHANGE, "12 pJ/m", "> 0 pJ/m", "<= 1000 pJ/m")
                .standard("12 pJ/m")
                .doc(LATER, "exchange stiffness A"),
            quantity("resistivity", RESISTIVITY, "150 uohm cm", "> 0 uohm cm", "<= 1 ohm m")
                .standard("150 uohm cm")
                .doc(DEVICE, "resistivity of the magnet, which shunts the strip"),
            temperatureLaw())
        .must()
        .doc(DEVICE, "the magnetic film");
  }

  private static Key temperatureLaw() {
    final ValueType.Section law =
        new ValueType.Section(
            java.util.List.of(
                choice("magnetization", "bloch")
                    .standard("bloch")
                    .doc(DEVICE, "Ms(T): bloch is the three-halves law, 1 - (T/Tc)^1.5"),
                quantity("curie-temperature", TEMPERATURE, "1100 K", "> 0 K", "<= 3000 K")
                    .must()
                    .doc(DEVICE, "Curie temperature Tc, above every temperature of the study"),
                quantity("anisotropy-exponent", RATIO, "2.2", ">= 0", "<= 10")
                    .standard("2.2")
                    .doc(DEVICE, "K_i goes as this power of Ms(T)/Ms")));
    return Key.of("temperature-law", new ValueType.WordOr("none", law))
        .standard("none")
        .doc(DEVICE, "how Ms and K_i follow temperature; required with several temperatures");
  }

  private static Key outline() {
    return section(
            "outline",
            choice("shape", "rectangle", "ellipse", "ellipsoid")
                .must()
                .doc(DEVICE, "shape seen from above; ellipsoid is rounded in all directions"),
            quantity("length", LENGTH, "200 nm", ">= 1 nm", "<= 100 um")
                .must()
                .doc(DEVICE, "full length along x, the current"),
            quantity("width", LENGTH, "50 nm", ">= 1 nm", "<= 100 um")
                .must()
                .doc(DEVICE, "full width along y"))
        .must()
        .doc(DEVICE, "outline of the magnet");
  }

  private static Key drive() {
    return section(
            "drive",
            quantity("spin-hall-angle", RATIO, "0.25", ">= -10", "<= 10")
                .must()
                .doc(DEVICE, "effective damping-like efficiency, interface included; not zero"),
            quantity("field-like-ratio", RATIO, "0", ">= -10", "<= 10")
                .standard("0")
                .doc(DEVICE, "field-like torque over damping-like torque"),
            quantity("strip-thickness", LENGTH, "5 nm", ">= 0.1 nm", "<= 10 um")
                .standard("5 nm")
                .doc(DEVICE, "thickness of the heavy-metal strip"),
            quantity("strip-width", LENGTH, "50 nm", ">= 1 nm", "<= 100 um")
                .standard("= device.outline.width")
                .doc(DEVICE, "width of the strip"),
            quantity("strip-length", LENGTH, "200 nm", ">= 1 nm", "<= 1 mm")
                .standard("= device.outline.length")
                .doc(DEVICE, "length of the strip between its contacts"),
            quantity("strip-resistivity", RESISTIVITY, "200 uohm cm", "> 0 uohm cm", "<= 1 ohm m")
                .standard("200 uohm cm")
                .doc(DEVICE, "resistivity of the strip"),
            quantity("contact-resistance", RESISTANCE, "500 ohm", ">= 0 ohm", "<= 1 Mohm")
                .standard("500 ohm")
                .doc(DEVICE, "contacts and wiring in series"),
            quantity("supply-voltage", VOLTAGE, "0.8 V", "> 0 V", "<= 100 V")
                .standard("0.8 V")
                .doc(DEVICE, "supply from which the drive current is drawn"),
            quantity(
                    "thermal-resistance", THERMAL_RESISTANCE, "3.2e6 K/W", ">= 0 K/W", "<= 1e9 K/W")
                .standard("3.2e6 K/W")
                .doc(DEVICE, "temperature rise of the device per mean power"))
        .must()
        .doc(DEVICE, "how current turns the moment");
  }

  private static Key readout() {
    return section(
            "readout",
            choice("kind", "tunnel-junction", "anisotropic-magnetoresistance")
                .standard("tunnel-junction")
                .doc(DEVICE, "what reads the moment"),
            quantity("anisotropic-ratio", RATIO, "2 %", "> 0", "<= 1")
                .standard("2 %")
                .doc(DEVICE, "resistance change over resistance (anisotropic-magnetoresistance)"),
            quantity("probe-current", CURRENT, "10 uA", "> 0 A", "<= 1 A")
                .standard("10 uA")
                .doc(DEVICE, "probe current (anisotropic-magnetoresistance)"),
            quantity(
                    "resistance-area",
                    RESISTANCE_AREA,
                    "100 ohm um^2",
                    "> 0 ohm um^2",
                    "<= 1e6 ohm um^2")
                .standard("100 ohm um^2")
                .doc(DEVICE, "resistance-area product, parallel state"),
            quantity("magnetoresistance", RATIO, "120 %", "> 0", "<= 20")
                .standard("120 %")
                .doc(DEVICE, "tunnel magnetoresistance, (R_AP - R_P)/R_P"),
            quantity("polarization", RATIO, "0.6", "> 0", "<= 1")
                .standard("0.6")
                .doc(DEVICE, "spin polarization of the read current"),
            quantity("read-voltage", VOLTAGE, "100 mV", "> 0 V", "<= 5 V")
                .standard("100 mV")
                .doc(DEVICE, "voltage over the junction while reading"),
            quantity("barrier", LENGTH, "1.4 nm", "> 0.1 nm", "<= 100 nm")
                .standard("1.4 nm")
                .doc(DEVICE, "barrier thickness"),
            quantity("bandwidth", FREQUENCY, "2 GHz", ">= 1 MHz", "<= 10 THz")
                .standard("2 GHz")
                .doc(DEVICE, "bandwidth of the read amplifier"),
            quantity("load-resistance", RESISTANCE, "50 ohm", "> 0 ohm", "<= 1 Mohm")
                .standard("50 ohm")
                .doc(DEVICE, "load of the readout"),
            quantity("amplifier-temperature", TEMPERATURE, "300 K", ">= 0 K", "<= 1e5 K")
                .standard("300 K")
                .doc(DEVICE, "noise temperature of the amplifier"),
            quantity("capacitance", CAPACITANCE, "5 fF", ">= 0 F", "<= 10 pF")
                .standard("5 fF")
                .doc(DEVICE, "capacitance of the read lead"),
            quantity("count-low", RATIO, "-0.3", ">= -1", "<= 1")
                .standard("-0.3")
                .doc(DEVICE, "comparator: the signal must fall through this; see below"),
            quantity("count-high", RATIO, "0.3", ">= -1", "<= 1")
                .standard("0.3")
                .doc(DEVICE, "comparator: and then rise through this, to count"),
            quantity("electronics-energy", ENERGY, "1 pJ", ">= 0 J", "<= 1 J")
                .standard("1 pJ")
                .doc(DEVICE, "comparator, counter and pulse driver, a neuron and slot"))
        .standard("{}")
        .doc(DEVICE, "how a turn of the moment becomes a count");
  }

  /** A gate's three keys, all with defaults. */
  static Key gate() {
    return section(
            "gate",
            quantity("dielectric-thickness", LENGTH, "2 nm", "> 0 nm", "<= 1 um")
                .standard("2 nm")
                .doc(DEVICE, "thickness of the gate dielectric"),
            quantity(
                    "voltage-coefficient",
                    VOLTAGE_COEFFICIENT,
                    "60 fJ/(V m)",
                    "> 0 fJ/(V m)",
                    "<= 1e6 fJ/(V m)")
                .standard("60 fJ/(V m)")
                .doc(DEVICE, "change of K_i per gate field; positive voltage lowers K_i"),
            quantity("breakdown-field", ELECTRIC_FIELD, "1 V/nm", "> 0 V/nm", "<= 100 V/nm")
                .standard("1 V/nm")
                .doc(DEVICE, "breakdown field of the dielectric"))
        .standard("{}");
  }

  static Key protocol() {
    return section(
            "protocol",
            quantity("bias", CURRENT_DENSITY, "0 A/m^2", ">= -1e14 A/m^2", "<= 1e14 A/m^2")
                .standard("0 A/m^2")
                .doc(DEVICE, "continuous current density in the strip; heats always"),
            choice("polarity", "unipolar")
                .later("bipolar")
                .standard("unipolar")
                .doc(DEVICE, "a negative sum gives no pulse"),
            quantity("maximum-drive", CURRENT_DENSITY, "7.8e11 A/m^2", "> 0 A/m^2", "<= 1e14 A/m^2")
                .must()
                .doc(DEVICE, "largest current density of a pulse; larger sums are clipped"),
            quantity("pulse", TIME, "0.5 ns", "> 0 s", "<= 1 us")
                .must()
                .doc(DEVICE, "pulse length"),
            quantity("slot", TIME, "10 ns", "> 0 s", "<= 10 us")
                .must()
                .doc(DEVICE, "slot length, at least the pulse"))
        .must()
        .doc(DEVICE, "how a neuron is driven in one slot");
  }
}
