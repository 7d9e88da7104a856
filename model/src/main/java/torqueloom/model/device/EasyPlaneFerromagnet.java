package torqueloom.model.device;

import java.util.List;
import java.util.Optional;
import torqueloom.model.magnet.Compensation;

/**
 * Easy-plane ferromagnet driven by the spin Hall effect: a film whose interfacial anisotropy nearly
 * compensates its shape along the normal, so that the moment turns in the plane of the current (x)
 * and the normal (z) and the width (y), along which the strip's spins point, is the hard axis.
 *
 * <p>All parameters are stated at the reference temperature, with the read voltage applied: its own
 * shift of the anisotropy is reported and is part of the stated value. A temperature handed to a
 * method is the device's own, heating included; the rises by drive and read are reported. The read
 * current's spin torque is reported and warned of, and left out of the simulation. SI.
 *
 * @param referenceTemperature at which the film is stated (K), &gt; 0
 * @param film free film
 * @param outline its outline
 * @param biasField B_b along x (T), finite
 * @param drive strip
 * @param readout sensor, amplifier, comparator
 * @param gate gate that trims the interfacial anisotropy
 * @param trimShift shift of the interfacial anisotropy by the gate (J/m²), the same at every
 *     temperature; 0 for an untrimmed device
 */
public record EasyPlaneFerromagnet(
    double referenceTemperature,
    Film film,
    Outline outline,
    double biasField,
    StripDrive drive,
    Readout readout,
    Gate gate,
    double trimShift)
    implements DeviceKind {

  /** Name of the kind in a study file. */
  public static final String KIND = "easy-plane-ferromagnet";

  private static final List<String> FEATURES =
      List.of("imbalance", "bias-field", "pole-field", "damping", "thermal-field");

  /**
   * @throws IllegalArgumentException naming the first value that is NaN or out of range
   */
  public EasyPlaneFerromagnet {
    Require.positive("temperature", referenceTemperature, "K");
    Require.present("film", film);
    Require.present("outline", outline);
    Require.finite("bias-field", biasField, "T");
    Require.present("drive", drive);
    Require.present("readout", readout);
    Require.present("gate", gate);
    Require.finite("trim shift", trimShift, "J/m^2");
    film.temperatureLaw().magnetizationRatio(referenceTemperature, referenceTemperature);
  }

  /** An untrimmed device; arguments as in the record. */
  public EasyPlaneFerromagnet(
      double referenceTemperature,
      Film film,
      Outline outline,
      double biasField,
      StripDrive drive,
      Readout readout,
      Gate gate) {
    this(referenceTemperature, film, outline, biasField, drive, readout, gate, 0);
  }

  @Override
  public String kindName() {
    return KIND;
  }

  @Override
  public String driveUnit() {
    return "A/m^2";
  }

  @Override
  public List<String> toleranceParameters() {
    return FerromagnetTolerances.NAMES;
  }

  @Override
  public EasyPlaneFerromagnet scaled(String parameter, double factor) {
    return FerromagnetTolerances.scaled(this, parameter, factor);
  }

  @Override
  public double balancingShift(double temperature, double target) {
    final FerromagnetState state = at(temperature);
    return 0.5 * (state.fields().imbalance() - target) * state.magnetization() * film.thickness();
  }

  @Override
  public boolean restsOutOfFilm(double temperature) {
    return Math.abs(at(temperature).restDirections()[0][2]) > 0.5;
  }

  @Override
  public double imbalance(double temperature) {
    return at(temperature).fields().imbalance();
  }

  @Override
  public EasyPlaneFerromagnet trimmed(double shift) {
    return new EasyPlaneFerromagnet(
        referenceTemperature, film, outline, biasField, drive, readout, gate, trimShift + shift);
  }

  @Override
  public double torquePerDrive(double temperature) {
    return at(temperature).torquePerDrive();
  }

  /**
   * Imbalance D (T), bias field (T), B_y - B_x (T), damping (1), k_B T/(M_s V) (T): with the drive
   * as a torque field these decide the motion. The readout's noise in units of its swing, which
   * also follows the area, is left out.
   */
  @Override
  public double[] features(double temperature) {
    final FerromagnetState state = at(temperature);
    return new double[] {
      state.fields().imbalance(), biasField, state.excessY(), film.damping(), state.thermalField()
    };
  }

  @Override
  public List<String> featureNames() {
    return FEATURES;
  }

  @Override
  public DeviceSummary summarize(double temperature, DriveProtocol protocol) {
    final FerromagnetState state = at(temperature);
    return new DeviceSummary(
        KIND,
        temperature,
        FerromagnetQuantities.of(this, state),
        new ElectricalQuantities(this, state, protocol).list(),
        new FerromagnetWarnings(this, state, protocol).list());
  }

  @Override
  public ElectricalChain electrical(double temperature, DriveProtocol protocol) {
    return new ElectricalQuantities(this, at(temperature), protocol).chain();
  }

  @Override
  public SlotSimulator simulator(double temperature, DriveProtocol protocol) {
    return FerromagnetSlots.of(this, at(temperature), protocol);
  }

  /**
   * The warning that belongs to a gate voltage, if any.
   *
   * @param shift shift of the interfacial anisotropy the gate has to give, e.g. the trim range
   *     (J/m²), of either sign
   */
  public Optional<DeviceWarning> gateWarning(double shift) {
    return FerromagnetWarnings.gateField(gate, shift);
  }

  /** Thickness at which D = 0 at a temperature (m), NaN when the outline has none. */
  double compensationThickness(FerromagnetState state) {
    return Compensation.thickness(
            t -> outline.shape().demagnetizingFactors(outline.length(), outline.width(), t),
            state.anisotropy(),
            state.magnetization())
        .orElse(Double.NaN);
  }

  private FerromagnetState at(double temperature) {
    return FerromagnetState.of(this, temperature);
  }
}
