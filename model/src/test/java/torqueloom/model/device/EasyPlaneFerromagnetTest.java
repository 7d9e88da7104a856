package torqueloom.model.device;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import torqueloom.model.constants.PhysicalConstants;

/** Derived quantities, electrical chain, warnings and parameter changes of the ferromagnet. */
class EasyPlaneFerromagnetTest {
  private static final DriveProtocol PROTOCOL = new DriveProtocol(0, false, 7.8e11, .5e-9, 10e-9);

  private static List<String> codes(EasyPlaneFerromagnet device, DriveProtocol protocol) {
    return device.summarize(300, protocol).warnings().stream().map(DeviceWarning::code).toList();
  }

  /** The working point: numbers from two integrators and from the closed forms of the energy. */
  @Test
  void workingPoint() {
    final DeviceSummary s = Ferromagnets.pinned().summarize(300, PROTOCOL);
    assertEquals(-.15e-3, s.number("imbalanceTesla").orElseThrow(), .01e-3);
    assertEquals(74e-3, s.number("hardFieldTesla").orElseThrow(), .1e-3);
    assertEquals(4e-3, s.number("thresholdTesla").orElseThrow(), 1e-5);
    assertEquals(62, s.number("thermalStability").orElseThrow(), .5);
    assertEquals(1.4e-9, s.number("ringDownSeconds").orElseThrow(), .01e-9);
    // 1 mT is 3.9e10 A/m² at theta = 0.25.
    assertEquals(1e-3, 3.9e10 * s.number("torqueTeslaPerDrive").orElseThrow(), .01e-3);
    assertEquals(
        s.number("thresholdTesla").orElseThrow() / s.number("torqueTeslaPerDrive").orElseThrow(),
        s.number("criticalCurrentDensity").orElseThrow(),
        1);
  }

  @Test
  void balancedFilm() {
    final DeviceSummary s =
        Ferromagnets.balanced().summarize(300, new DriveProtocol(0, false, 5.5e11, .5e-9, 10e-9));
    assertEquals(15.4, s.number("thermalStability").orElseThrow(), .1);
    assertEquals(1.99e-3, s.number("thresholdTesla").orElseThrow(), .01e-3);
    // Pinned by the easy field alone: Delta = hbar theta J_c Area/(2 e k T), whatever the film.
    final double jc = s.number("criticalCurrentDensity").orElseThrow();
    final double delta =
        PhysicalConstants.REDUCED_PLANCK
            * .25
            * jc
            * 200e-9
            * 50e-9
            / (2 * PhysicalConstants.ELEMENTARY_CHARGE * PhysicalConstants.BOLTZMANN * 300);
    assertEquals(delta, s.number("thermalStability").orElseThrow(), 1e-9);
  }

  @Test
  void keysStandInTheirOrder() {
    final List<String> keys =
        Ferromagnets.pinned().summarize(300, PROTOCOL).device().stream()
            .map(DerivedQuantity::key)
            .toList();
    assertEquals(
        List.of(
            "demagnetizingFactors",
            "axisFieldsTesla",
            "easyAxis",
            "middleAxis",
            "hardAxis",
            "easyFieldTesla",
            "hardFieldTesla",
            "imbalanceTesla",
            "restDirection",
            "thresholdTesla",
            "criticalCurrentDensity",
            "compensationThicknessMeters",
            "dampingNumber",
            "maximumDriveRatio",
            "thermalStability",
            "ringDownSeconds",
            "torqueTeslaPerDrive"),
        keys.subList(0, 17));
  }

  /** By hand: 1600 ohm of strip shunted by 1500 ohm of film per 200 nm, 500 ohm of contacts. */
  @Test
  void electricalChain() {
    final ElectricalChain chain = Ferromagnets.pinned().electrical(300, PROTOCOL);
    assertEquals(500 + 1 / (1 / 1600. + 1 / 1500.), chain.stripResistance(), 1e-9);
    assertEquals(2.5e-16 * (1 + 1600. / 1500), chain.currentPerDrive(), 1e-28);
    assertEquals(.403e-3 * .8 * .5e-9, chain.pulseEnergy(7.8e11), 1e-19);
    final DeviceSummary s = Ferromagnets.pinned().summarize(300, PROTOCOL);
    assertEquals(16. / 31, s.number("shuntedShare").orElseThrow(), 1e-12);
    assertEquals(
        .403e-3 * chain.stripResistance(), s.number("maximumVoltageVolts").orElseThrow(), 1e-9);
    // Heat in strip and film only, duty 1/20.
    final double heat = .403e-3 * .403e-3 * (chain.stripResistance() - 500);
    assertEquals(heat / 20 * 3.2e6, s.number("meanTemperatureRiseKelvin").orElseThrow(), 1e-6);
  }

  /** Junction of 0.01 um², 100 ohm um², 120 %: 10 and 22 kiloohm, by hand. */
  @Test
  void readout() {
    final DeviceSummary s = Ferromagnets.pinned().summarize(300, PROTOCOL);
    final double parallel = 1e-4;
    final double antiparallel = 1e-4 / 2.2;
    final double current = .1 * (parallel + antiparallel) / 2;
    assertEquals(current, s.number("readCurrentAmperes").orElseThrow(), 1e-15);
    assertEquals(
        .1 * (parallel - antiparallel) / 2,
        s.number("signalHalfSwingAmperes").orElseThrow(),
        1e-15);
    final double kt = PhysicalConstants.BOLTZMANN * 300;
    final double e = PhysicalConstants.ELEMENTARY_CHARGE;
    // The input stage's Johnson voltage drives its noise through sensor and load in series.
    final double loop = 2 / (parallel + antiparallel) + 50;
    final double density =
        2 * e * current / Math.tanh(e * .1 / (2 * kt)) + 4 * kt * 50 / (loop * loop);
    final double noise = Math.sqrt(density * 2e9 * Math.PI / (2 * Math.sqrt(2)));
    assertEquals(noise, s.number("noiseCurrentAmperes").orElseThrow(), 1e-4 * noise);
    assertEquals(-60e-15 * .1 / 1.4e-9, s.number("readAnisotropyShift").orElseThrow(), 1e-15);
  }

  @Test
  void dampingAndImbalanceFollowTheirScaledParameters() {
    final EasyPlaneFerromagnet device = Ferromagnets.pinned();
    for (final String parameter : device.toleranceParameters()) {
      final EasyPlaneFerromagnet same = device.scaled(parameter, 1);
      assertEquals(device, same);
      assertFalse(device.equals(device.scaled(parameter, 1.01)), parameter);
    }
    assertEquals(.105, device.scaled("damping", 1.05).film().damping(), 1e-12);
    assertEquals(
        1.03 * device.torquePerDrive(300),
        device.scaled("spin-hall-angle", 1.03).torquePerDrive(300),
        1e-25);
    // One per cent of thickness, K_i and M_s: about 8, 8 and 17 mT.
    assertEquals(8e-3, change(device, "thickness"), 1e-3);
    assertEquals(-8.6e-3, change(device, "interface-anisotropy"), .1e-3);
    assertEquals(17e-3, change(device, "saturation-magnetization"), 1e-3);
    final IllegalArgumentException refusal =
        assertThrows(IllegalArgumentException.class, () -> device.scaled("height", 1.1));
    assertTrue(refusal.getMessage().contains("thickness"));
  }

  private static double change(EasyPlaneFerromagnet device, String parameter) {
    return device.scaled(parameter, 1.01).imbalance(300) - device.imbalance(300);
  }

  @ParameterizedTest
  @ValueSource(doubles = {290, 300, 310})
  void balancingShiftReachesItsTarget(double temperature) {
    final EasyPlaneFerromagnet device =
        Ferromagnets.pinned(Ferromagnets.BLOCH).scaled("thickness", 1.004);
    final double shift = device.balancingShift(temperature, -.15e-3);
    assertEquals(-.15e-3, device.trimmed(shift).imbalance(temperature), 1e-12);
    // A trim adds to a former trim.
    final EasyPlaneFerromagnet twice = device.trimmed(1e-6).trimmed(2e-6);
    assertEquals(3e-6, twice.trimShift(), 1e-18);
  }

  @Test
  void temperatureMovesMagnetizationAndAnisotropy() {
    final EasyPlaneFerromagnet device = Ferromagnets.pinned(Ferromagnets.BLOCH);
    final double ratio = (1 - Math.pow(310. / 1100, 1.5)) / (1 - Math.pow(300. / 1100, 1.5));
    final DeviceSummary warm = device.summarize(310, PROTOCOL);
    assertEquals(8e5 * ratio, warm.number("saturationMagnetization").orElseThrow(), 1e-6);
    assertEquals(
        1.379e-3 * Math.pow(ratio, 2.2), warm.number("interfaceAnisotropy").orElseThrow(), 1e-14);
    assertEquals(Ferromagnets.pinned().imbalance(300), Ferromagnets.pinned().imbalance(350), 0);
  }

  @ParameterizedTest
  @CsvSource({"0, above 0 K", "-3, positive", "NaN, positive", "1100, Curie", "1200, Curie"})
  void temperaturesOutsideTheLawAreRefused(double temperature, String word) {
    final EasyPlaneFerromagnet device = Ferromagnets.pinned(Ferromagnets.BLOCH);
    final IllegalArgumentException refusal =
        assertThrows(IllegalArgumentException.class, () -> device.simulator(temperature, PROTOCOL));
    assertTrue(
        refusal.getMessage().contains("temperature")
            && refusal.getMessage().contains(temperature > 0 ? word : "positive"),
        refusal.getMessage());
    assertThrows(
        IllegalArgumentException.class, () -> Ferromagnets.pinned().simulator(0, PROTOCOL));
  }

  @Test
  void aGoodDeviceIsNotWarnedOf() {
    final DriveProtocol mild = new DriveProtocol(0, false, 4.5e11, .5e-9, 10e-9);
    assertEquals(List.of(), codes(Ferromagnets.pinned(), mild));
  }

  @Test
  void warningsNameTheirCause() {
    final EasyPlaneFerromagnet pinned = Ferromagnets.pinned();
    final DriveProtocol mild = new DriveProtocol(0, false, 4.5e11, .5e-9, 10e-9);
    assertTrue(codes(pinned, PROTOCOL).contains("pulse-heating"));
    assertTrue(codes(pinned.trimmed(1e-5), mild).contains("rest-out-of-film"));
    assertTrue(codes(pinned.trimmed(-3.2e-4), mild).contains("hard-axis-not-along-p"));
    assertTrue(codes(pinned.scaled("bias-field", .1), mild).contains("low-thermal-stability"));
    assertTrue(
        codes(pinned, new DriveProtocol(0, false, 6e11, 3e-9, 10e-9))
            .contains("pulse-beyond-upper-limit"));
    assertTrue(
        codes(pinned, new DriveProtocol(0, false, 1.5e11, .5e-9, 10e-9))
            .contains("no-counts-in-drive-range"));
    assertTrue(
        codes(pinned, new DriveProtocol(0, false, 1.6e12, .5e-9, 10e-9))
            .contains("supply-voltage-exceeded"));
    assertTrue(
        codes(pinned, new DriveProtocol(0, false, 1.6e12, .5e-9, 10e-9))
            .contains("electromigration-current-density"));
    assertTrue(
        codes(pinned, new DriveProtocol(2e10, false, 7e11, 2e-9, 10e-9)).contains("mean-heating"));
    assertTrue(codes(pinned.trimmed(-5e-5), mild).contains("gate-field-near-breakdown"));
    assertTrue(pinned.gateWarning(3e-5).isEmpty());
    assertTrue(pinned.gateWarning(5e-5).isPresent());
    assertTrue(codes(Ferromagnets.withReadVoltage(.8), mild).contains("read-disturbs"));
    assertTrue(codes(Ferromagnets.withReadVoltage(.005), mild).contains("weak-signal"));
  }

  @Test
  void featuresDecideTheMotion() {
    final EasyPlaneFerromagnet device = Ferromagnets.pinned();
    assertEquals(device.featureNames().size(), device.features(300).length);
    assertArrayEquals(device.features(300), device.scaled("spin-hall-angle", 1.1).features(300), 0);
    final double[] twice = device.scaled("length", 1).features(600);
    assertEquals(2 * device.features(300)[4], twice[4], 1e-12);
  }

  @Test
  void fieldsOutOfRangeAreNamed() {
    assertNamed("damping", () -> Ferromagnets.film(0, 4e-9));
    assertNamed("damping", () -> Ferromagnets.film(1.01, 4e-9));
    assertNamed("thickness", () -> Ferromagnets.film(.1, -1e-9));
    assertNamed("thickness", () -> Ferromagnets.film(.1, Double.NaN));
    assertNamed("width", () -> new Outline(Shape.ELLIPSE, 1e-7, 0));
    assertNamed("count-low", () -> Ferromagnets.readout(50, .1, .3, .3));
    assertNamed("breakdown-field", () -> new Gate(1e-9, 1e-15, Double.POSITIVE_INFINITY));
    assertNamed("spin-hall-angle", () -> new StripDrive(0, 0, 1e-9, 1e-9, 1e-9, 1e-6, 0, 1, 0));
    assertNamed(
        "curie-temperature", () -> new TemperatureLaw(TemperatureLaw.Magnetization.BLOCH, 0, 2));
  }

  private static void assertNamed(String field, org.junit.jupiter.api.function.Executable action) {
    final IllegalArgumentException refusal = assertThrows(IllegalArgumentException.class, action);
    assertTrue(refusal.getMessage().startsWith(field), refusal.getMessage());
  }
}
