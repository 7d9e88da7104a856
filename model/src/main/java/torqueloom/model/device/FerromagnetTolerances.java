package torqueloom.model.device;

import java.util.List;

/** Parameters of the ferromagnet that a tolerance may scale, by their study-file names. */
final class FerromagnetTolerances {
  static final List<String> NAMES =
      List.of(
          "thickness",
          "interface-anisotropy",
          "saturation-magnetization",
          "damping",
          "length",
          "width",
          "spin-hall-angle",
          "bias-field");

  private FerromagnetTolerances() {}

  static EasyPlaneFerromagnet scaled(EasyPlaneFerromagnet d, String parameter, double factor) {
    Require.positive("factor", factor, "1");
    final Film f = d.film();
    final Outline o = d.outline();
    return switch (parameter) {
      case "thickness" ->
          with(
              d,
              film(
                  f,
                  f.saturationMagnetization(),
                  f.thickness() * factor,
                  f.interfaceAnisotropy(),
                  f.damping()));
      case "interface-anisotropy" ->
          with(
              d,
              film(
                  f,
                  f.saturationMagnetization(),
                  f.thickness(),
                  f.interfaceAnisotropy() * factor,
                  f.damping()));
      case "saturation-magnetization" ->
          with(
              d,
              film(
                  f,
                  f.saturationMagnetization() * factor,
                  f.thickness(),
                  f.interfaceAnisotropy(),
                  f.damping()));
      // A wide spread must not carry the damping beyond what the film allows.
      case "damping" ->
          with(
              d,
              film(
                  f,
                  f.saturationMagnetization(),
                  f.thickness(),
                  f.interfaceAnisotropy(),
                  Math.min(1, f.damping() * factor)));
      case "length" -> with(d, new Outline(o.shape(), o.length() * factor, o.width()));
      case "width" -> with(d, new Outline(o.shape(), o.length(), o.width() * factor));
      case "spin-hall-angle" -> with(d, strip(d.drive(), d.drive().spinHallAngle() * factor));
      case "bias-field" ->
          new EasyPlaneFerromagnet(
              d.referenceTemperature(),
              f,
              o,
              d.biasField() * factor,
              d.drive(),
              d.readout(),
              d.gate(),
              d.trimShift());
      default ->
          throw new IllegalArgumentException(
              "no tolerance parameter " + parameter + "; known are " + String.join(", ", NAMES));
    };
  }

  private static Film film(Film f, double ms, double t, double ki, double alpha) {
    return new Film(ms, t, ki, alpha, f.exchangeStiffness(), f.resistivity(), f.temperatureLaw());
  }

  private static StripDrive strip(StripDrive s, double angle) {
    return new StripDrive(
        angle,
        s.fieldLikeRatio(),
        s.stripThickness(),
        s.stripWidth(),
        s.stripLength(),
        s.stripResistivity(),
        s.contactResistance(),
        s.supplyVoltage(),
        s.thermalResistance());
  }

  private static EasyPlaneFerromagnet with(EasyPlaneFerromagnet d, Film film) {
    return new EasyPlaneFerromagnet(
        d.referenceTemperature(),
        film,
        d.outline(),
        d.biasField(),
        d.drive(),
        d.readout(),
        d.gate(),
        d.trimShift());
  }

  private static EasyPlaneFerromagnet with(EasyPlaneFerromagnet d, Outline outline) {
    return new EasyPlaneFerromagnet(
        d.referenceTemperature(),
        d.film(),
        outline,
        d.biasField(),
        d.drive(),
        d.readout(),
        d.gate(),
        d.trimShift());
  }

  private static EasyPlaneFerromagnet with(EasyPlaneFerromagnet d, StripDrive drive) {
    return new EasyPlaneFerromagnet(
        d.referenceTemperature(),
        d.film(),
        d.outline(),
        d.biasField(),
        drive,
        d.readout(),
        d.gate(),
        d.trimShift());
  }
}
