package torqueloom.model.device;

import java.util.List;

/**
 * A neuron device of some kind with all its parameters, immutable. A new kind is one implementation
 * and one test.
 */
public interface DeviceKind {
  /** The kind's name in a study file, e.g. {@code easy-plane-ferromagnet}. */
  String kindName();

  /**
   * Every parameter that a response may depend on, as records, maps, lists, text, enums, optionals
   * and numbers (SI), for digests; the kind itself where it is a record of such values.
   */
  default Object parameters() {
    return this;
  }

  /** Temperature at which the parameters are stated (K). */
  double referenceTemperature();

  /** Unit of a drive, e.g. {@code A/m^2}. */
  String driveUnit();

  /** Names of the parameters that may carry a tolerance, as in a study file. */
  List<String> toleranceParameters();

  /**
   * The same device with one parameter multiplied.
   *
   * @param parameter one of {@link #toleranceParameters()}
   * @param factor (1), &gt; 0
   * @throws IllegalArgumentException for an unknown parameter
   */
  DeviceKind scaled(String parameter, double factor);

  /**
   * Interfacial anisotropy shift that would balance the device at a temperature (J/m²): added to
   * the interfacial anisotropy it makes the imbalance D zero (or the nominal one, see {@code
   * target}).
   *
   * @param temperature (K)
   * @param target wanted imbalance D (T)
   */
  double balancingShift(double temperature, double target);

  /** Imbalance D at a temperature (T). */
  double imbalance(double temperature);

  /**
   * Whether the moment rests more than 30 degrees out of the film, where a readout in the film
   * loses its signal; false for kinds without a film.
   */
  default boolean restsOutOfFilm(double temperature) {
    return false;
  }

  /** The same device with its interfacial anisotropy at a temperature shifted (J/m²). */
  DeviceKind trimmed(double shift);

  /** Spin-torque field per unit of drive at a temperature (T per drive unit). */
  double torquePerDrive(double temperature);

  /**
   * Parameters on which the response depends once drives are expressed as torque fields, e.g.
   * imbalance, bias field, hard field, damping, thermal energy over moment; used to find the
   * library instance nearest to a drawn device. Names by {@link #featureNames()}.
   */
  double[] features(double temperature);

  /** Names of {@link #features}, same order. */
  List<String> featureNames();

  /** Derived quantities and warnings. */
  DeviceSummary summarize(double temperature, DriveProtocol protocol);

  /** Electrical chain and energy per slot. */
  ElectricalChain electrical(double temperature, DriveProtocol protocol);

  /** A simulator of slots at one temperature. */
  SlotSimulator simulator(double temperature, DriveProtocol protocol);
}
