package torqueloom.model.device;

/**
 * Current, voltage and heat of the strip with the film in parallel on it.
 *
 * <p>Under the film strip and film conduct in parallel along x, so a current density J in the strip
 * needs I = J w_s t_s (1 + sigma), sigma being the ratio of film to strip conductance per length;
 * the rest of the strip carries the same current alone. The film counts with its mean width. Heat
 * counts in strip and film; the contacts' heat is taken to leave through the leads.
 *
 * @param shuntRatio sigma (1)
 * @param sectionResistance strip and film without contacts (ohm)
 * @param resistance with contacts (ohm)
 * @param currentPerDrive I/J (A per A/m²)
 * @param thermalResistance (K/W)
 * @param heatCapacity of strip section and film (J/K)
 */
record StripChain(
    double shuntRatio,
    double sectionResistance,
    double resistance,
    double currentPerDrive,
    double thermalResistance,
    double heatCapacity) {

  /** Heat capacity per volume of a heavy or magnetic metal, 3 R per mole in round numbers (J/(m³ K)). */
  static final double HEAT_PER_VOLUME = 3e6;

  static StripChain of(EasyPlaneFerromagnet device) {
    final StripDrive strip = device.drive();
    final Film film = device.film();
    final Outline outline = device.outline();
    final double perLength = strip.stripResistivity() / strip.crossSection();
    final double filmSection = outline.area() / outline.length() * film.thickness();
    final double shunt = filmSection / film.resistivity() * perLength;
    final double covered = Math.min(outline.length(), strip.stripLength());
    final double section = perLength * (strip.stripLength() - covered + covered / (1 + shunt));
    final double capacity =
        HEAT_PER_VOLUME
            * (strip.crossSection() * strip.stripLength() + outline.volume(film.thickness()));
    return new StripChain(
        shunt,
        section,
        section + strip.contactResistance(),
        strip.crossSection() * (1 + shunt),
        strip.thermalResistance(),
        capacity);
  }

  /** Heat in strip and film at a drive (W). */
  double heat(double drive) {
    final double current = drive * currentPerDrive;
    return current * current * sectionResistance;
  }

  /** Temperature rise at the end of a pulse: one time constant R_th C (K). */
  double pulseRise(double drive, double pulse) {
    final double constant = thermalResistance * heatCapacity;
    return constant == 0
        ? 0
        : heat(drive) * thermalResistance * -StrictMath.expm1(-pulse / constant);
  }

  /** Mean rise with a pulse in every slot and a continuous bias (K). */
  double meanRise(double drive, DriveProtocol protocol) {
    final double duty = protocol.pulse() / protocol.slot();
    return thermalResistance
        * (heat(drive + protocol.bias()) * duty + heat(protocol.bias()) * (1 - duty));
  }
}
