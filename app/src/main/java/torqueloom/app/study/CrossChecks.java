package torqueloom.app.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import torqueloom.model.constants.PhysicalConstants;
import torqueloom.model.units.QuantityFormat;
import torqueloom.model.units.QuantityKind;

/** Checks that need more than one value. A check whose values have a fault already is skipped. */
final class CrossChecks {
  /** Rounding of three decimal shares that add up to one (1). */
  private static final double SUM_ROUNDING = 1e-9;

  /** Largest anisotropy or torque field (T): ten times what films and strips are known to give. */
  private static final double LARGEST_FIELD = 20;

  private final Values values;
  private final Faults faults;
  private final Use goal;

  CrossChecks(Values values, Faults faults, Use goal) {
    this.values = values;
    this.faults = faults;
    this.goal = goal;
  }

  void run() {
    atLeast("protocol.slot", "protocol.pulse", "the pulse", QuantityKind.TIME);
    above("device.readout.count-high", "device.readout.count-low", "count-low", QuantityKind.RATIO);
    spinHallAngle();
    strengths();
    temperatures();
    if (goal.compareTo(Use.TRAIN) >= 0) {
      unitDrive();
      readWindow();
      source();
      split();
      inputLevels();
    }
  }

  private void atLeast(String key, String limitKey, String words, QuantityKind kind) {
    final Optional<Double> value = values.findNumber(key);
    final Optional<Double> limit = values.findNumber(limitKey);
    if (value.isPresent() && limit.isPresent() && value.get() < limit.get()) {
      fault(
          key,
          found(value.get(), kind)
              + "; at least "
              + words
              + ", "
              + shown(limit.get(), kind)
              + ", is needed");
    }
  }

  /** Counts are read within their slot; a slot that is at fault itself is not blamed twice. */
  private void readWindow() {
    final String key = "synapse.read-window";
    final Optional<Double> window = values.findNumber(key);
    final Optional<Double> slot = values.findNumber("protocol.slot");
    final Optional<Double> pulse = values.findNumber("protocol.pulse");
    final boolean sound = slot.isPresent() && pulse.isPresent() && slot.get() >= pulse.get();
    if (values.isWritten(key) && sound && window.isPresent() && window.get() > slot.get()) {
      fault(
          key,
          found(window.get(), QuantityKind.TIME)
              + "; at most the slot, "
              + shown(slot.get(), QuantityKind.TIME)
              + ", is allowed");
    }
  }

  private void above(String key, String limitKey, String words, QuantityKind kind) {
    final Optional<Double> value = values.findNumber(key);
    final Optional<Double> limit = values.findNumber(limitKey);
    if (value.isPresent() && limit.isPresent() && value.get() <= limit.get()) {
      fault(
          key,
          found(value.get(), kind)
              + "; more than "
              + words
              + ", "
              + shown(limit.get(), kind)
              + ", is needed");
    }
  }

  private void spinHallAngle() {
    final String key = "device.drive.spin-hall-angle";
    if (values.findNumber(key).filter(angle -> angle == 0).isPresent()) {
      fault(key, "found 0; a strip that turns the moment, with another angle than 0, is needed");
    }
  }

  /**
   * Fields no film or strip reaches come from a slip of units, and would make the integration steps
   * so short that a simulation never ends.
   */
  private void strengths() {
    final Optional<Double> anisotropy = values.findNumber("device.film.interface-anisotropy");
    final Optional<Double> angle = values.findNumber("device.drive.spin-hall-angle");
    final double moment =
        values.findNumber("device.film.saturation-magnetization").orElse(Double.NaN)
            * values.findNumber("device.film.thickness").orElse(Double.NaN);
    // 2 K_i/(Ms t)
    anisotropy.ifPresent(
        k ->
            strength(
                "device.film.interface-anisotropy",
                shown(k, QuantityKind.SURFACE_ENERGY),
                "an anisotropy field of ",
                2 * Math.abs(k) / moment));
    final double perDensity =
        PhysicalConstants.REDUCED_PLANCK
            * Math.abs(angle.orElse(Double.NaN))
            / (2 * PhysicalConstants.ELEMENTARY_CHARGE * moment);
    for (final String key : new String[] {"protocol.maximum-drive", "protocol.bias"}) {
      // hbar theta J/(2 e Ms t)
      values
          .findNumber(key)
          .ifPresent(
              j ->
                  strength(
                      key,
                      shown(j, QuantityKind.CURRENT_DENSITY),
                      "a torque field of ",
                      perDensity * Math.abs(j)));
    }
  }

  private void strength(String key, String found, String what, double field) {
    if (field > LARGEST_FIELD) {
      fault(
          key,
          "found "
              + found
              + ", which gives this film "
              + what
              + shown(field, QuantityKind.FIELD)
              + "; at most "
              + shown(LARGEST_FIELD, QuantityKind.FIELD)
              + " is allowed: check the units");
    }
  }

  private void unitDrive() {
    final Optional<Double> unit = values.findNumber("synapse.unit-drive");
    final Optional<Double> most = values.findNumber("protocol.maximum-drive");
    if (unit.isPresent() && most.isPresent() && unit.get() > most.get()) {
      fault(
          "synapse.unit-drive",
          found(unit.get(), QuantityKind.CURRENT_DENSITY)
              + "; at most protocol.maximum-drive, "
              + shown(most.get(), QuantityKind.CURRENT_DENSITY)
              + ", is needed");
    }
  }

  private void temperatures() {
    final TreeSet<Double> all = new TreeSet<>();
    final Optional<Double> stated = values.findNumber("device.temperature");
    stated.ifPresent(all::add);
    final String key = "evaluation.temperatures";
    if (values.find(key).isPresent()) {
      final List<Double> asked = values.numbers(key);
      all.addAll(asked);
      if (new TreeSet<>(asked).size() < asked.size()) {
        fault(key, "the same temperature stands twice; different ones are needed");
      }
    }
    values.findNumber("trim.temperature").ifPresent(all::add);
    final String law = "device.film.temperature-law";
    if (all.size() > 1 && values.findText(law).isPresent()) {
      fault(
          law,
          "found none; a law of Ms and K_i is needed, since the study works at "
              + list(all)
              + ", e.g. {magnetization: bloch, curie-temperature: 1100 K}");
    }
    curie(all);
  }

  private void curie(TreeSet<Double> all) {
    final String key = "device.film.temperature-law.curie-temperature";
    final Optional<Double> curie = values.findNumber(key);
    if (curie.isPresent() && !all.isEmpty() && curie.get() <= all.last()) {
      fault(
          key,
          found(curie.get(), QuantityKind.TEMPERATURE)
              + "; more than the study's highest temperature, "
              + shown(all.last(), QuantityKind.TEMPERATURE)
              + ", is needed");
    }
  }

  /** Exactly one of data, or train with test. */
  private void source() {
    if (!values.isWritten("task")) {
      return;
    }
    final boolean data = values.isWritten("task.data");
    final boolean train = values.isWritten("task.train");
    final boolean test = values.isWritten("task.test");
    if (data && (train || test)) {
      fault("task.data", "found beside train or test; either data, or train and test, is needed");
    } else if (!data && !train && !test) {
      fault("task", "neither data nor train and test stand here; one of them is needed");
    } else if (!data && train != test) {
      fault(
          train ? "task.train" : "task.test",
          "found without " + (train ? "test" : "train") + "; both are needed");
    }
  }

  private void split() {
    final List<Double> shares = new ArrayList<>();
    for (final String part : new String[] {"train", "validation", "test"}) {
      values.findNumber("task.split." + part).ifPresent(shares::add);
    }
    if (shares.size() < 3 || !values.isWritten("task.data")) {
      return;
    }
    final double sum = shares.stream().mapToDouble(Double::doubleValue).sum();
    if (Math.abs(sum - 1) > SUM_ROUNDING) {
      fault(
          "task.split",
          "the shares add up to "
              + QuantityFormat.percent(sum)
              + " (train, validation, test, defaults included); 100 % is needed");
    }
  }

  private void inputLevels() {
    if (values.find("network.input-levels").filter(v -> v.equals(1L)).isPresent()) {
      fault("network.input-levels", "found 1; 0 for continuous, or at least 2, is needed");
    }
  }

  private void fault(String key, String text) {
    faults.add(values.placeOf(key), key, text);
  }

  private static String found(double value, QuantityKind kind) {
    return "found " + shown(value, kind);
  }

  private static String shown(double value, QuantityKind kind) {
    return QuantityFormat.text(value, kind);
  }

  private static String list(TreeSet<Double> temperatures) {
    return temperatures.stream()
        .map(t -> QuantityFormat.text(t, QuantityKind.TEMPERATURE))
        .reduce((a, b) -> a + ", " + b)
        .orElse("");
  }
}
