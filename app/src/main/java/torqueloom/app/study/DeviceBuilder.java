package torqueloom.app.study;

import java.util.Arrays;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.device.EasyPlaneFerromagnet;
import torqueloom.model.device.Film;
import torqueloom.model.device.Outline;
import torqueloom.model.device.Readout;
import torqueloom.model.device.Shape;
import torqueloom.model.device.StripDrive;
import torqueloom.model.device.TemperatureLaw;

/** Turns checked values into a device. */
final class DeviceBuilder {
  private DeviceBuilder() {}

  static DeviceKind easyPlaneFerromagnet(Values values) {
    return new EasyPlaneFerromagnet(
        values.number("device.temperature"),
        film(values),
        outline(values),
        values.number("device.bias-field"),
        drive(values),
        readout(values),
        PlanBuilder.gate(values, "device.gate"));
  }

  private static Film film(Values values) {
    final String block = "device.film.";
    return new Film(
        values.number(block + "saturation-magnetization"),
        values.number(block + "thickness"),
        values.number(block + "interface-anisotropy"),
        values.number(block + "damping"),
        values.number(block + "exchange-stiffness"),
        values.number(block + "resistivity"),
        temperatureLaw(values, block + "temperature-law"));
  }

  private static TemperatureLaw temperatureLaw(Values values, String block) {
    if (values.findText(block).isPresent()) {
      return TemperatureLaw.NONE;
    }
    return new TemperatureLaw(
        TemperatureLaw.Magnetization.BLOCH,
        values.number(block + ".curie-temperature"),
        values.number(block + ".anisotropy-exponent"));
  }

  private static Outline outline(Values values) {
    final String name = values.text("device.outline.shape");
    final Shape shape =
        Arrays.stream(Shape.values())
            .filter(s -> s.studyName().equals(name))
            .findFirst()
            .orElseThrow();
    return new Outline(
        shape, values.number("device.outline.length"), values.number("device.outline.width"));
  }

  private static StripDrive drive(Values values) {
    final String block = "device.drive.";
    return new StripDrive(
        values.number(block + "spin-hall-angle"),
        values.number(block + "field-like-ratio"),
        values.number(block + "strip-thickness"),
        values.number(block + "strip-width"),
        values.number(block + "strip-length"),
        values.number(block + "strip-resistivity"),
        values.number(block + "contact-resistance"),
        values.number(block + "supply-voltage"),
        values.number(block + "thermal-resistance"));
  }

  private static Readout readout(Values values) {
    final String block = "device.readout.";
    final String name = values.text(block + "kind");
    final Readout.Kind kind =
        Arrays.stream(Readout.Kind.values())
            .filter(k -> k.studyName().equals(name))
            .findFirst()
            .orElseThrow();
    return new Readout(
        kind,
        values.number(block + "resistance-area"),
        values.number(block + "magnetoresistance"),
        values.number(block + "polarization"),
        values.number(block + "read-voltage"),
        values.number(block + "barrier"),
        values.number(block + "bandwidth"),
        values.number(block + "load-resistance"),
        values.number(block + "amplifier-temperature"),
        values.number(block + "capacitance"),
        values.number(block + "count-low"),
        values.number(block + "count-high"),
        values.number(block + "electronics-energy"),
        values.number(block + "anisotropic-ratio"),
        values.number(block + "probe-current"));
  }
}
