package torqueloom.training.chip;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.device.Gate;
import torqueloom.model.response.LibraryInstance;
import torqueloom.model.response.ResponseLibrary;
import torqueloom.model.response.ResponseMatcher;
import torqueloom.model.synapse.JunctionParameters;
import torqueloom.model.synapse.SynapseModel;
import torqueloom.model.synapse.SynapseSettings;
import torqueloom.model.tolerance.Spread;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.model.tolerance.Trim;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.evaluation.NeuronLayer;
import torqueloom.training.evaluation.PairLayer;
import torqueloom.training.evaluation.PairWeights;
import torqueloom.training.evaluation.TrainedNetwork;

/** Drawn chips against numbers written out by hand; instances stand at imbalances 0, -1, 1. */
class ChipFactoryTest {
  private static final List<Double> TEMPERATURES = List.of(300.0, 380.0);
  private static final Tolerances FILM =
      new Tolerances(Map.of("film", new Spread(0.2, 0.2), "torque", new Spread(0.1, 0.05)));
  private static final Optional<Trim> TRIM = Optional.of(new Trim(2, 41, 300, true));
  private static final double[] PLACES = {0, -1, 1};

  private static ResponseMatcher matcher() {
    final List<LibraryInstance> instances = new ArrayList<>();
    for (final double temperature : TEMPERATURES) {
      for (int i = 0; i < PLACES.length; i++) {
        instances.add(new LibraryInstance(i, temperature, 2, new double[] {PLACES[i]}));
      }
    }
    return ResponseMatcher.of(
        new ResponseLibrary(
            "",
            "A/m^2",
            TEMPERATURES,
            List.of("imbalance"),
            new double[] {1},
            instances,
            List.of(),
            0,
            0,
            0,
            0,
            ""));
  }

  private static SynapseModel synapse(double writeError, Spread resistance) {
    final Gate gate = new Gate(2e-9, 6e-14, 1e9);
    final JunctionParameters junction =
        new JunctionParameters(
            0.1,
            0.06,
            80e-9,
            1.6e-9,
            1e6,
            0.03,
            5e-11,
            1.2,
            0.6,
            0.1,
            1.3e-9,
            Map.of("resistance-area", resistance));
    return SynapseModel.of(
        new SynapseSettings(
            SynapseSettings.Kind.JUNCTION,
            0.6,
            11,
            writeError,
            true,
            64,
            4e10,
            Optional.empty(),
            5e-9,
            5,
            gate,
            Optional.of(junction)),
        300);
  }

  static ChipFactory factory(
      Tolerances tolerances, Optional<Trim> trim, double writeError, boolean spread) {
    return factory(tolerances, trim, synapse(writeError, new Spread(0, 0.01)), spread);
  }

  private static ChipFactory factory(
      Tolerances tolerances, Optional<Trim> trim, SynapseModel synapse, boolean spread) {
    return new ChipFactory(
        FakeDevice.NOMINAL, tolerances, trim, synapse, spread, matcher(), TEMPERATURES, 17);
  }

  /** 40 inputs, 50 neurons: weights 1 in even rows, 0 in odd ones. */
  private static TrainedNetwork network() {
    final float[] plus = new float[2000];
    for (int i = 0; i < plus.length; i++) {
      plus[i] = i / 50 % 2 == 0 ? 1f : 0f;
    }
    return new TrainedNetwork(
        new NetworkSettings(new int[] {50}, 2, NetworkSettings.Output.DEVICE, 0, 1),
        List.of(new PairLayer(40, 50, plus, new float[2000], new float[50])),
        PairWeights.straight(11),
        1f,
        "");
  }

  private static float[] rows(float[] weights, int parity) {
    final float[] part = new float[1000];
    for (int i = 0, k = 0; i < weights.length; i++) {
      if (i / 50 % 2 == parity) {
        part[k++] = weights[i];
      }
    }
    return part;
  }

  private static double mean(float[] values) {
    double sum = 0;
    for (final float value : values) {
      sum += value;
    }
    return sum / values.length;
  }

  private static double deviation(float[] values, double about) {
    double sum = 0;
    for (final float value : values) {
      sum += (value - about) * (value - about);
    }
    return Math.sqrt(sum / values.length);
  }

  /** Deviation of 1,000 normal draws: 4.5 % is two standard errors of it, 10 % 4.5 of them. */
  @Test
  void writeErrorScattersEveryWeight() {
    final float[] weights =
        factory(Tolerances.NONE, Optional.empty(), 0.02, false).weights(3, network()).get(0);
    assertEquals(0.02, deviation(rows(weights, 0), 1), 0.002);
    assertEquals(0.02, deviation(rows(weights, 1), 0), 0.002);
  }

  /**
   * With write-verify a mismatch e only cuts what is out of reach: full weights become min(1, 1 +
   * e), which for normal e of deviation s has the mean 1 - s/sqrt(2 pi); weights of zero stay.
   */
  @Test
  void mismatchCutsTheReachOfFullWeights() {
    final ChipFactory factory = factory(Tolerances.NONE, Optional.empty(), 0, true);
    final double s = factory.synapse().pairMismatch();
    // One per cent of resistance is 11 % of a full-scale pair at a 60 % range (computed with
    // scipy).
    assertEquals(0.11, s, 0.005);
    final float[] weights = factory.weights(3, network()).get(0);
    assertEquals(1 - s / Math.sqrt(2 * Math.PI), mean(rows(weights, 0)), 0.01);
    assertArrayEquals(new float[1000], rows(weights, 1));
    final float[] without =
        factory(Tolerances.NONE, Optional.empty(), 0, false).weights(3, network()).get(0);
    assertEquals(0, deviation(rows(without, 0), 1));
  }

  /** Single precision lets a few of a thousand draws coincide by chance, no more. */
  @Test
  void everyWeightOfEveryChipAndLayerHasDrawsOfItsOwn() {
    final TrainedNetwork one = network();
    final PairLayer layer = one.layers().get(0);
    final TrainedNetwork two =
        new TrainedNetwork(one.settings(), List.of(layer, layer), one.curve(), 1f, "");
    final ChipFactory writing = factory(Tolerances.NONE, Optional.empty(), 0.02, false);
    final ChipFactory mismatched = factory(Tolerances.NONE, Optional.empty(), 0, true);
    for (final ChipFactory factory : List.of(writing, mismatched)) {
      final Set<Float> seen = new HashSet<>();
      int drawn = 0;
      for (final int chip : new int[] {3, 4}) {
        for (final float[] weights : factory.weights(chip, two)) {
          for (final float weight : rows(weights, 0)) {
            if (weight != 1f) {
              drawn++;
              seen.add(weight);
            }
          }
        }
      }
      // Four layers of 1000 full weights; mismatch leaves its mark on half of them.
      assertTrue(drawn > 1800, "drawn " + drawn);
      assertTrue(seen.size() > 0.99 * drawn, seen.size() + " of " + drawn);
    }
  }

  /**
   * A resistance 3 % off on the whole chip makes every conductance 3 % off. With write-verify that
   * cuts full weights to min(1, 1 + g z), the same for a whole chip; the mean over chips is 1 -
   * g/sqrt(2 pi) with a standard error of 0.58 g/20, so 0.12 g is four of them.
   */
  @Test
  void theGainErrorIsSharedByAChip() {
    final SynapseModel synapse = synapse(0, new Spread(0.03, 0));
    final ChipFactory factory = factory(Tolerances.NONE, Optional.empty(), synapse, true);
    final double gain = synapse.chipGainError();
    assertEquals(0.03, gain, 0.001);
    double sum = 0;
    for (int chip = 0; chip < 400; chip++) {
      final float[] full = rows(factory.weights(chip, network()).get(0), 0);
      assertEquals(0, deviation(full, full[0]));
      sum += full[0];
    }
    assertEquals(1 - gain / Math.sqrt(2 * Math.PI), sum / 400, 0.12 * gain);
  }

  @Test
  void neuronsTakeTheNearestInstanceAndTheirOwnTorque() {
    final ChipFactory factory = factory(FILM, Optional.empty(), 0, false);
    final List<DeviceKind> devices =
        List.of(
            new FakeDevice(2, 0.4),
            new FakeDevice(2.2, 0.6),
            new FakeDevice(1.8, -0.7),
            new FakeDevice(2, 0.31));
    final NeuronLayer at300 = factory.neurons(devices, 0);
    assertArrayEquals(new int[] {0, 2, 1, 0}, at300.instance());
    assertArrayEquals(new float[] {1f, 1.1f, 0.9f, 1f}, at300.driveFactor(), 1e-6f);
    // 80 K more add 0.8 to each imbalance.
    assertArrayEquals(new int[] {2, 2, 0, 2}, factory.neurons(devices, 1).instance());
  }

  @Test
  void trimBringsNeuronsBackWithinItsRange() {
    final ChipFactory factory = factory(FILM, TRIM, 0, false);
    final List<DeviceKind> devices =
        List.of(new FakeDevice(2, 1.94), new FakeDevice(2, -3.2), new FakeDevice(2, 3.4));
    assertArrayEquals(new int[] {0, 1, 2}, factory.neurons(devices, 0).instance());
    // Levels stand 0.1 apart: 1.94 keeps 0.04; 3.4 is out of reach by 1.4.
    assertEquals(0.04, factory.working(devices.get(0), 300).imbalance(300), 1e-12);
    assertEquals(1.4, factory.working(devices.get(2), 300).imbalance(300), 1e-12);
  }

  @Test
  void aToleranceMoreMovesNoOtherDrawAndChipsDiffer() {
    final Tolerances filmOnly = new Tolerances(Map.of("film", new Spread(0.2, 0.2)));
    final List<DeviceKind> both = factory(FILM, TRIM, 0, false).devices(5, 1, 8);
    final List<DeviceKind> one = factory(filmOnly, TRIM, 0, false).devices(5, 1, 8);
    for (int j = 0; j < 8; j++) {
      assertEquals(one.get(j).imbalance(300), both.get(j).imbalance(300));
    }
    assertNotEquals(both, factory(FILM, TRIM, 0, false).devices(6, 1, 8));
    assertNotEquals(both, factory(FILM, TRIM, 0, false).devices(5, 0, 8));
    assertEquals(both, factory(FILM, TRIM, 0, false).devices(5, 1, 9).subList(0, 8));
  }

  /** Chip-to-chip parts are shared: with no part of their own all neurons of a chip are equal. */
  @Test
  void theChipPartIsShared() {
    final Tolerances shared = new Tolerances(Map.of("film", new Spread(0.2, 0)));
    final List<DeviceKind> devices = factory(shared, Optional.empty(), 0, false).devices(5, 1, 8);
    assertEquals(1, devices.stream().distinct().count());
    assertTrue(devices.get(0).imbalance(300) != 0);
  }
}
