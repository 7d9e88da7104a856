package torqueloom.model.synapse;

import java.util.Map;
import java.util.Optional;
import torqueloom.model.device.Gate;
import torqueloom.model.tolerance.Spread;

/** Junctions and settings for tests; figures of the demo studies. */
final class JunctionSamples {
  static final JunctionParameters DEMO =
      junction(
          Map.of(
              "resistance-area", new Spread(0.03, 0.01),
              "diameter", new Spread(0.01, 0.005),
              "anisotropy-field", new Spread(0.04, 0.02),
              "magnetoresistance", new Spread(0.03, 0.01)));

  private JunctionSamples() {}

  static JunctionParameters junction(Map<String, Spread> tolerances) {
    return new JunctionParameters(
        0.1, 0.06, 80e-9, 1.6e-9, 1e6, 0.03, 50e-12, 1.2, 0.6, 0.1, 1.3e-9, tolerances);
  }

  static SynapseSettings settings(double range, int levels, boolean verify, JunctionParameters j) {
    return new SynapseSettings(
        SynapseSettings.Kind.JUNCTION,
        range,
        levels,
        0.01,
        verify,
        64,
        3.9e10,
        Optional.empty(),
        5e-9,
        5,
        new Gate(2e-9, 60e-15, 1e9),
        Optional.of(j));
  }

  static SynapseSettings unlimited() {
    return new SynapseSettings(
        SynapseSettings.Kind.UNLIMITED,
        0.6,
        32,
        0.01,
        true,
        64,
        3.9e10,
        Optional.empty(),
        5e-9,
        5,
        new Gate(2e-9, 60e-15, 1e9),
        Optional.empty());
  }
}
