package torqueloom.model.synapse;

import java.util.LinkedHashMap;
import java.util.Map;
import torqueloom.model.tolerance.Spread;

/**
 * Conductance of a junction pair over its tuning range, and what the junction's tolerances do to a
 * weight, at one temperature. Normalized detuning u = 0 is the stiffest end (largest B_k, smallest
 * conductance), u = 1 the softest (a positive gate voltage lowers K_i).
 */
final class ConductanceModel {
  /** Step of the relative derivatives (1); error of second order, about 1e-6. */
  private static final double STEP = 1e-3;

  private final JunctionParameters junction;
  private final double tuningRange;
  private final double temperature;
  private final double fullScale;

  ConductanceModel(JunctionParameters junction, double tuningRange, double temperature) {
    this.junction = junction;
    this.tuningRange = tuningRange;
    this.temperature = temperature;
    this.fullScale = fullScale(junction);
  }

  /** Conductance at a normalized detuning (S). */
  double conductance(double detuning) {
    return conductance(junction, detuning);
  }

  /** Conductance change of one element over the whole range, one full-scale weight (S). */
  double fullScale() {
    return fullScale;
  }

  /**
   * Standard deviation of the conductance mismatch of a pair, by tolerance, in units of one
   * full-scale weight: sqrt(2) |dG/d ln p| s_device/full scale, at the middle of the range.
   */
  Map<String, Double> mismatchParts() {
    final Map<String, Double> parts = new LinkedHashMap<>();
    for (final Map.Entry<String, Spread> entry : junction.tolerances().entrySet()) {
      final double change =
          relativeSlope(entry.getKey(), 0.5) * entry.getValue().device() / fullScale;
      parts.put(entry.getKey(), Math.sqrt(2) * Math.abs(change));
    }
    return parts;
  }

  /** Standard deviation of a chip's common gain error: the relative change of the full scale. */
  double gainError() {
    double squares = 0;
    for (final Map.Entry<String, Spread> entry : junction.tolerances().entrySet()) {
      final String name = entry.getKey();
      final double slope = relativeSlope(name, 1) - relativeSlope(name, 0);
      final double change = slope * entry.getValue().chip() / fullScale;
      squares += change * change;
    }
    return Math.sqrt(squares);
  }

  /** Largest departure of the junction's own curve from the straight line, of full scale (1). */
  double departureFromStraight() {
    final int points = 16;
    final double start = conductance(0);
    double worst = 0;
    for (int i = 1; i < points; i++) {
      final double u = (double) i / points;
      worst = Math.max(worst, Math.abs((conductance(u) - start) / fullScale - u));
    }
    return worst;
  }

  /** dG/d ln p at a detuning (S), by a central difference; the gate's shift stays what it is. */
  private double relativeSlope(String parameter, double detuning) {
    final double above = conductance(junction.scaled(parameter, 1 + STEP), detuning);
    final double below = conductance(junction.scaled(parameter, 1 - STEP), detuning);
    return (above - below) / (2 * STEP);
  }

  private double fullScale(JunctionParameters parameters) {
    return conductance(parameters, 1) - conductance(parameters, 0);
  }

  private double conductance(JunctionParameters parameters, double detuning) {
    final double shift = tuningRange * junction.anisotropyField() * (0.5 - detuning);
    final double field = Math.max(0, parameters.anisotropyField() + shift);
    return JunctionTilt.conductance(parameters, field, temperature);
  }
}
