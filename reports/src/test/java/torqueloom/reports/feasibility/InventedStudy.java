package torqueloom.reports.feasibility;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import torqueloom.model.device.DerivedQuantity;
import torqueloom.model.device.DeviceSummary;
import torqueloom.model.device.DeviceWarning;
import torqueloom.model.device.DriveProtocol;
import torqueloom.model.device.Gate;
import torqueloom.model.energy.InferenceCost;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;
import torqueloom.model.response.CalibrationSettings;
import torqueloom.model.response.LibraryInstance;
import torqueloom.model.response.ResponseCurve;
import torqueloom.model.response.ResponseLibrary;
import torqueloom.model.synapse.JunctionParameters;
import torqueloom.model.synapse.SynapseSettings;
import torqueloom.model.synapse.SynapseSummary;
import torqueloom.model.tolerance.Spread;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.training.data.TaskSettings;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.learning.TrainingHistory;
import torqueloom.training.learning.TrainingSettings;
import torqueloom.training.study.EvaluationSettings;
import torqueloom.training.study.Interval;
import torqueloom.training.study.StudyPlan;
import torqueloom.training.study.StudyResult;
import torqueloom.training.study.Targets;
import torqueloom.training.study.TemperatureOutcome;
import torqueloom.training.study.ToleranceEffect;
import torqueloom.training.study.TrimComparison;
import torqueloom.training.study.Verdict;

/**
 * Invented results of plausible size, for tests of words and pictures only. No number is computed.
 */
public final class InventedStudy {
  private static final long SEED = 7;

  private String name = "Invented proposal";
  private Verdict.Kind kind = Verdict.Kind.MET;
  private double center = 0.935;
  private double spread = 0.008;
  private double yield = 0.985;
  private double half = 0.012;
  private double halfOnNewCases = 0.03;
  private double ideal = 0.952;
  private double loss = 0.012;
  private double outOfFilm = 0.001;
  private boolean trimAssumed;
  private int chips = 200;
  private double sharpness = 1;
  private List<Double> temperatures = List.of(290.0, 300.0, 310.0);

  /** A study that meets its targets. */
  public static InventedStudy met() {
    return new InventedStudy();
  }

  /** A study without trim whose tolerances ruin it. */
  public static InventedStudy notMet() {
    final InventedStudy study = new InventedStudy();
    study.kind = Verdict.Kind.NOT_MET;
    study.center = 0.78;
    study.spread = 0.05;
    study.yield = 0.01;
    study.half = 0.009;
    study.halfOnNewCases = 0.01;
    study.loss = 0.15;
    study.outOfFilm = 0.34;
    study.trimAssumed = true;
    return study;
  }

  /** A study whose chips decide but whose test set is too small. */
  public static InventedStudy undecided() {
    final InventedStudy study = new InventedStudy();
    study.kind = Verdict.Kind.UNDECIDED;
    study.center = 0.91;
    study.yield = 0.94;
    study.half = 0.02;
    study.halfOnNewCases = 0.12;
    study.chips = 120;
    return study;
  }

  /** With another name. */
  public InventedStudy named(String newName) {
    name = newName;
    return this;
  }

  /** With another number of chips. */
  public InventedStudy chips(int newChips) {
    chips = newChips;
    return this;
  }

  /** With another loss by the tolerances. */
  public InventedStudy loss(double newLoss) {
    loss = newLoss;
    return this;
  }

  /** With another accuracy of the ideal network. */
  public InventedStudy ideal(double newIdeal) {
    ideal = newIdeal;
    return this;
  }

  /** With a response that is smeared so far that no clean plateau is left. */
  public InventedStudy smeared() {
    sharpness = 0.25;
    return this;
  }

  /** With other temperatures. */
  public InventedStudy temperatures(List<Double> kelvin) {
    temperatures = kelvin;
    return this;
  }

  /** The result. */
  public StudyResult build() {
    return new StudyResult(
        plan(),
        "0.1.0",
        device(),
        synapse(),
        library(),
        history(),
        new int[] {6000, 2000, 2400},
        16,
        List.of("healthy", "inner race", "outer race", "ball"),
        ideal,
        0.871,
        1,
        temperatures.stream().map(this::outcome).toList(),
        new ToleranceEffect(
            chips, center + loss, center, new Interval(loss, loss - 0.004, loss + 0.004)),
        trim(),
        new InferenceCost(
            2.1e-12, 6.6e-12, 9.8e-11, 0, 3.84e-10, 0, 9e-8, 120, 8 * 16 * 48 + 48 * 4, 5.4e-3),
        new Verdict(kind, reasons()));
  }

  private List<String> reasons() {
    final List<String> reasons = new ArrayList<>();
    if (kind == Verdict.Kind.UNDECIDED) {
      reasons.add("Invented advice.");
    }
    temperatures.forEach(t -> reasons.add("An invented sentence for " + t + " K."));
    return reasons;
  }

  private StudyPlan plan() {
    return new StudyPlan(
        name,
        20261,
        "00112233445566778899aabbccddeeff00112233445566778899aabbccddeeff",
        null,
        new DriveProtocol(0, false, 7.8e11, 0.5e-9, 10e-9),
        new Tolerances(
            Map.of("thickness", new Spread(0.003, 0.001), "damping", new Spread(0.05, 0.02))),
        Optional.empty(),
        new CalibrationSettings(12, 24, 0.02, 4000),
        new SynapseSettings(
            SynapseSettings.Kind.JUNCTION,
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
            Optional.of(
                new JunctionParameters(
                    0.1, 0.06, 80e-9, 1.6e-9, 1e6, 0.03, 5e-11, 1.2, 0.6, 0.1, 1.3e-9, Map.of()))),
        Optional.of(
            new TaskSettings(
                Optional.of(Path.of("invented.csv")),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                "state",
                0.6,
                0.2,
                0.2)),
        new NetworkSettings(new int[] {48}, 8, NetworkSettings.Output.WEIGHTED_SUM, 0, 1),
        new TrainingSettings(60, 64, 0.003, true, Double.NaN, 10),
        new EvaluationSettings(Math.max(1, chips), 4, temperatures),
        new Targets(0.9, 0.9, 0.95),
        List.of("range: computed by a later version"));
  }

  private static DeviceSummary device() {
    return new DeviceSummary(
        "easy-plane-ferromagnet",
        300,
        List.of(
            new DerivedQuantity(
                "demagnetizingFactors",
                "demagnetizing factors",
                "N",
                new double[] {0.031, 0.105, 0.864},
                "1"),
            new DerivedQuantity("hardAxis", "hard axis", "", "y", ""),
            new DerivedQuantity("imbalanceTesla", "imbalance B_z − B_x", "D", -2.0e-4, "T"),
            new DerivedQuantity("thresholdTesla", "threshold torque field", "B_DL,c", 4.02e-3, "T"),
            new DerivedQuantity(
                "criticalCurrentDensity", "critical current density", "J_c", 1.57e11, "A/m^2"),
            new DerivedQuantity("thermalStability", "thermal stability", "Δ", 61.8, "1"),
            new DerivedQuantity("ringDownSeconds", "ring-down time", "τ", 1.41e-9, "s")),
        List.of(
            new DerivedQuantity("stripResistance", "strip resistance", "R", 2612.0, "ohm"),
            new DerivedQuantity("pulseEnergy", "energy of the largest pulse", "", 7.8e-14, "J"),
            new DerivedQuantity("thermalResistance", "thermal resistance", "R_th", 3.2e6, "K/W")),
        List.of(
            new DeviceWarning(
                "electromigration",
                "The largest current density, 7.8e11 A/m^2, lies in the range where metals"
                    + " migrate.")));
  }

  private static SynapseSummary synapse() {
    return new SynapseSummary(
        List.of(
            new DerivedQuantity("conductanceParallel", "parallel conductance", "G_P", 1.0e-4, "S"),
            new DerivedQuantity("weightMismatch", "mismatch of one weight", "", 0.034, "1"),
            new DerivedQuantity(
                "notModeled", "not modeled", "", "an invented list of what is left out", "")),
        List.of());
  }

  private ResponseLibrary library() {
    final List<ResponseCurve> curves = new ArrayList<>();
    final List<LibraryInstance> instances = new ArrayList<>();
    for (int t = 0; t < temperatures.size(); t++) {
      for (int i = 0; i < 12; i++) {
        curves.add(curve(i, temperatures.get(t)));
        instances.add(new LibraryInstance(i, temperatures.get(t), 2.564e-14, new double[] {0}));
      }
    }
    return new ResponseLibrary(
        "ffeeddccbbaa99887766554433221100",
        "A/m^2",
        temperatures,
        List.of("imbalance"),
        new double[] {1},
        instances,
        curves,
        0.008,
        0.03,
        0.041,
        4_812_345_678L,
        "scalar");
  }

  private ResponseCurve curve(int instance, double temperature) {
    final int points = 24;
    final double shift =
        instance == 0
            ? 0
            : 0.25e11 * Streams.normal(Streams.key(SEED, Purpose.TASK_DATA, instance), 0);
    final double[] drive = new double[points];
    final int[] trials = new int[points];
    final int[][] counts = new int[points][4];
    final double[] latency = new double[points];
    final double[] jitter = new double[points];
    final List<SortedMap<Integer, Integer>> turns = new ArrayList<>();
    for (int i = 0; i < points; i++) {
      drive[i] = 7.8e11 * i / (points - 1);
      trials[i] = 1000;
      final double width = 0.2e11 / sharpness * temperature / 300;
      final double first = logistic((drive[i] - shift - 2.6e11) / width);
      final double second = first * logistic((drive[i] - shift - 5.3e11) / width);
      counts[i][2] = (int) (1000 * second);
      counts[i][1] = (int) (1000 * first) - counts[i][2];
      counts[i][0] = 1000 - counts[i][1] - counts[i][2];
      latency[i] = counts[i][0] > 990 ? Double.NaN : 1e-9 * (0.6 + 1.2e11 / (drive[i] + 1e10));
      jitter[i] = counts[i][0] > 990 ? Double.NaN : 0.08e-9;
      turns.add(Collections.emptySortedMap());
    }
    return new ResponseCurve(
        instance,
        temperature,
        0.5e-9,
        0,
        Double.NaN,
        drive,
        trials,
        0,
        counts,
        turns,
        latency,
        jitter);
  }

  private static double logistic(double x) {
    return 1 / (1 + StrictMath.exp(-x));
  }

  private static TrainingHistory history() {
    final List<TrainingHistory.Epoch> epochs = new ArrayList<>();
    for (int i = 0; i < 40; i++) {
      final double decay = StrictMath.exp(-i / 8.0);
      final double wobble = 0.006 * Streams.normal(Streams.key(SEED, Purpose.TASK_DATA, 99), i);
      epochs.add(
          new TrainingHistory.Epoch(
              0.15 + 1.2 * decay, 0.93 - 0.6 * decay, 0.945 - 0.55 * decay + wobble, 0.012));
    }
    return new TrainingHistory(epochs, 33);
  }

  private TemperatureOutcome outcome(double temperature) {
    final double[] accuracies = new double[chips];
    for (int i = 0; i < chips; i++) {
      final double normal = Streams.normal(Streams.key(SEED, Purpose.CHIP_NEURON, i), 0);
      final double moved = center + spread * normal - 0.0002 * Math.abs(temperature - 300);
      accuracies[i] = Math.min(1, Math.rint(9600 * moved) / 9600);
    }
    return new TemperatureOutcome(
        temperature,
        accuracies,
        new Interval(center, center - 0.002, center + 0.002),
        spread,
        center - 1.6 * spread,
        center + 1.6 * spread,
        0.004,
        around(yield, half),
        around(yield, halfOnNewCases),
        around(yield, 0.8 * half),
        0.013);
  }

  private TrimComparison trim() {
    final double without = trimAssumed ? center : 0.84;
    final double with = trimAssumed ? 0.928 : center;
    final double gain = with - without;
    return new TrimComparison(
        trimAssumed,
        3e-5,
        64,
        Math.min(chips, 128),
        with,
        without,
        new Interval(gain, gain - 0.01, gain + 0.01),
        around(trimAssumed ? 0.96 : yield, 0.03),
        around(trimAssumed ? yield : 0.11, 0.03),
        0.0004,
        trimAssumed ? outOfFilm : 0.02);
  }

  private static Interval around(double estimate, double half) {
    return new Interval(estimate, Math.max(0, estimate - half), Math.min(1, estimate + half));
  }
}
