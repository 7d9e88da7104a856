package torqueloom.model.device;

/**
 * Readout of the moment: sensor, amplifier and comparator. All values are SI.
 *
 * <p>The signal is scaled so that a tunnel junction gives m_x (1 parallel, -1 antiparallel), and an
 * anisotropic magnetoresistance 2 m_x² - 1 (1 for the moment along the current, -1 across it); the
 * comparator's thresholds are in these units.
 *
 * @param kind sensor
 * @param resistanceArea resistance-area product of the parallel state (ohm m²), &gt; 0; junction only
 * @param magnetoresistance (R_AP - R_P)/R_P (1), &gt; 0; junction only
 * @param polarization effective spin polarization of the read current (1), in (0, 1]; junction only
 * @param readVoltage across the junction (V), &gt; 0; junction only
 * @param barrier thickness of the barrier (m), &gt; 0; junction only
 * @param bandwidth -3 dB frequency of the amplifier (Hz), &gt; 0
 * @param loadResistance input resistance of the amplifier (ohm), &gt; 0
 * @param amplifierTemperature noise temperature of load and amplifier (K), &gt;= 0
 * @param capacitance at the amplifier's input (F), &gt;= 0
 * @param countLow comparator's lower threshold (1), below the upper one
 * @param countHigh comparator's upper threshold (1)
 * @param electronicsEnergy comparator, counter and pulse driver, a neuron and slot (J), &gt;= 0
 * @param anisotropicRatio (R_par - R_perp)/R_perp (1), &gt; 0; anisotropic magnetoresistance only
 * @param probeCurrent through strip and film (A), &gt; 0; anisotropic magnetoresistance only
 */
public record Readout(
    Kind kind,
    double resistanceArea,
    double magnetoresistance,
    double polarization,
    double readVoltage,
    double barrier,
    double bandwidth,
    double loadResistance,
    double amplifierTemperature,
    double capacitance,
    double countLow,
    double countHigh,
    double electronicsEnergy,
    double anisotropicRatio,
    double probeCurrent) {

  /** Sensors. */
  public enum Kind {
    /** Tunnel junction on the film; its signal follows the cosine. */
    TUNNEL_JUNCTION("tunnel-junction"),
    /** Resistance of the film itself; its signal follows the squared cosine. */
    ANISOTROPIC_MAGNETORESISTANCE("anisotropic-magnetoresistance");

    private final String studyName;

    Kind(String studyName) {
      this.studyName = studyName;
    }

    /** Name in a study file. */
    public String studyName() {
      return studyName;
    }
  }

  /**
   * Checks what the kind uses; the fields of the other kind may hold anything.
   *
   * @throws IllegalArgumentException naming the first value that is NaN or out of range
   */
  public Readout {
    Require.present("kind", kind);
    if (kind == Kind.TUNNEL_JUNCTION) {
      Require.positive("resistance-area", resistanceArea, "ohm m^2");
      Require.positive("magnetoresistance", magnetoresistance, "1");
      Require.above("polarization", polarization, 0, 1, "1");
      Require.positive("read-voltage", readVoltage, "V");
      Require.positive("barrier", barrier, "m");
    } else {
      Require.positive("anisotropic-ratio", anisotropicRatio, "1");
      Require.positive("probe-current", probeCurrent, "A");
    }
    Require.positive("bandwidth", bandwidth, "Hz");
    Require.positive("load-resistance", loadResistance, "ohm");
    Require.notNegative("amplifier-temperature", amplifierTemperature, "K");
    Require.notNegative("capacitance", capacitance, "F");
    Require.finite("count-low", countLow, "1");
    Require.finite("count-high", countHigh, "1");
    if (!(countLow < countHigh)) {
      throw new IllegalArgumentException(
          "count-low must be below count-high, got " + countLow + " and " + countHigh);
    }
    Require.notNegative("electronics-energy", electronicsEnergy, "J");
  }

  /** A tunnel junction; arguments as in the record. */
  public static Readout tunnelJunction(
      double resistanceArea,
      double magnetoresistance,
      double polarization,
      double readVoltage,
      double barrier,
      double bandwidth,
      double loadResistance,
      double amplifierTemperature,
      double capacitance,
      double countLow,
      double countHigh,
      double electronicsEnergy) {
    return new Readout(
        Kind.TUNNEL_JUNCTION,
        resistanceArea,
        magnetoresistance,
        polarization,
        readVoltage,
        barrier,
        bandwidth,
        loadResistance,
        amplifierTemperature,
        capacitance,
        countLow,
        countHigh,
        electronicsEnergy,
        Double.NaN,
        Double.NaN);
  }

  /** An anisotropic magnetoresistance; arguments as in the record. */
  public static Readout anisotropicMagnetoresistance(
      double anisotropicRatio,
      double probeCurrent,
      double bandwidth,
      double loadResistance,
      double amplifierTemperature,
      double capacitance,
      double countLow,
      double countHigh,
      double electronicsEnergy) {
    return new Readout(
        Kind.ANISOTROPIC_MAGNETORESISTANCE,
        Double.NaN,
        Double.NaN,
        Double.NaN,
        Double.NaN,
        Double.NaN,
        bandwidth,
        loadResistance,
        amplifierTemperature,
        capacitance,
        countLow,
        countHigh,
        electronicsEnergy,
        anisotropicRatio,
        probeCurrent);
  }
}
