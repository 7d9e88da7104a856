package torqueloom.model.device;

/** Devices of the tests. */
final class Ferromagnets {
  static final TemperatureLaw BLOCH =
      new TemperatureLaw(TemperatureLaw.Magnetization.BLOCH, 1100, 2.2);

  private Ferromagnets() {}

  /** The working point: pinned by a bias field of 4 mT. */
  static EasyPlaneFerromagnet pinned() {
    return pinned(TemperatureLaw.NONE);
  }

  static EasyPlaneFerromagnet pinned(TemperatureLaw law) {
    return device(1.379e-3, law, 4e-3, readout(50, .1, -.3, .3));
  }

  static EasyPlaneFerromagnet withReadVoltage(double volts) {
    return device(1.379e-3, TemperatureLaw.NONE, 4e-3, readout(50, volts, -.3, .3));
  }

  /** The same film pinned by its easy field alone. */
  static EasyPlaneFerromagnet balanced() {
    return device(1.3724e-3, TemperatureLaw.NONE, 0, readout(50, .1, -.3, .3));
  }

  /** The working point with next to no noise in the readout (half a per cent of the half swing). */
  static EasyPlaneFerromagnet noiselessReadout(double anisotropy) {
    return device(anisotropy, TemperatureLaw.NONE, 4e-3, readout(50, 10, -.3, .3));
  }

  /** The working point read through the film's own resistance. */
  static EasyPlaneFerromagnet anisotropicReadout() {
    return device(
        1.379e-3,
        TemperatureLaw.NONE,
        4e-3,
        Readout.anisotropicMagnetoresistance(.02, 1, 5e9, 50, 300, 5e-15, -.3, .3, 1e-12));
  }

  private static EasyPlaneFerromagnet device(
      double anisotropy, TemperatureLaw law, double bias, Readout readout) {
    return new EasyPlaneFerromagnet(
        300,
        new Film(8e5, 4e-9, anisotropy, .1, 12e-12, 150e-8, law),
        new Outline(Shape.RECTANGLE, 200e-9, 50e-9),
        bias,
        new StripDrive(.25, 0, 5e-9, 50e-9, 200e-9, 200e-8, 500, .8, 3.2e6),
        readout,
        new Gate(2e-9, 60e-15, 1e9));
  }

  static Film film(double damping, double thickness) {
    return new Film(8e5, thickness, 1.379e-3, damping, 12e-12, 150e-8, TemperatureLaw.NONE);
  }

  static Readout readout(double load, double volts, double low, double high) {
    return Readout.tunnelJunction(
        100e-12, 1.2, .6, volts, 1.4e-9, 2e9, load, 300, 5e-15, low, high, 1e-12);
  }
}
