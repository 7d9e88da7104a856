package torqueloom.model.device;

import java.util.ArrayList;
import java.util.List;
import torqueloom.model.dynamics.KernelChoice;
import torqueloom.model.dynamics.MacrospinParameters;
import torqueloom.model.dynamics.RestLevel;
import torqueloom.model.dynamics.SignalChain;
import torqueloom.model.dynamics.SlotEnsemble;
import torqueloom.model.dynamics.SlotProgram;
import torqueloom.model.dynamics.SlotTrials;
import torqueloom.model.dynamics.TorqueField;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

/** Slots of a ferromagnet by the stochastic macrospin. */
final class FerromagnetSlots implements SlotSimulator {
  /** Trials and drives of the look for counts in {@link #countsSomewhere}. */
  private static final int LOOK_TRIALS = 32;

  private static final int LOOK_DRIVES = 8;

  private final SlotEnsemble ensemble;
  private final DriveProtocol protocol;
  private final double torquePerDrive;
  private final double fieldLikeRatio;

  private FerromagnetSlots(
      SlotEnsemble ensemble, DriveProtocol protocol, double torquePerDrive, double fieldLikeRatio) {
    this.ensemble = ensemble;
    this.protocol = protocol;
    this.torquePerDrive = torquePerDrive;
    this.fieldLikeRatio = fieldLikeRatio;
  }

  static FerromagnetSlots of(
      EasyPlaneFerromagnet device, FerromagnetState state, DriveProtocol protocol) {
    return new FerromagnetSlots(
        SlotEnsemble.of(
            spin(device, state),
            chain(device, state),
            rests(state),
            state.ringDown(device.film().damping())),
        protocol,
        state.torquePerDrive(),
        device.drive().fieldLikeRatio());
  }

  static MacrospinParameters spin(EasyPlaneFerromagnet device, FerromagnetState state) {
    return new MacrospinParameters(
        device.film().damping(),
        state.excessY(),
        state.fields().imbalance(),
        device.biasField(),
        0,
        0,
        state.thermalField());
  }

  private static SignalChain chain(EasyPlaneFerromagnet device, FerromagnetState state) {
    final Readout readout = device.readout();
    final ReadChain read = ReadChain.of(device, state, StripChain.of(device));
    final boolean junction = readout.kind() == Readout.Kind.TUNNEL_JUNCTION;
    return new SignalChain(
        junction ? 0 : -1,
        junction ? 1 : 0,
        junction ? 0 : 2,
        read.bandwidth(),
        read.relativeDensity(),
        readout.countLow(),
        readout.countHigh());
  }

  private static List<RestLevel> rests(FerromagnetState state) {
    final double[][] directions = state.restDirections();
    final List<RestLevel> rests = new ArrayList<>();
    final double first = energy(state, directions[0]);
    for (final double[] m : directions) {
      // The saddle is common to all rests, so a higher rest has the lower barrier.
      final double barrier = Math.max(0, state.barrier() - (energy(state, m) - first));
      rests.add(new RestLevel(m[0], m[1], m[2], barrier));
    }
    return rests;
  }

  private static double energy(FerromagnetState state, double[] m) {
    return 0.5 * (state.excessY() * m[1] * m[1] + state.fields().imbalance() * m[2] * m[2])
        - state.plane().biasField() * m[0];
  }

  private SlotProgram program(double drive, double previousDrive) {
    return new SlotProgram(
        torque(drive + protocol.bias()),
        Double.isNaN(previousDrive) ? null : torque(previousDrive + protocol.bias()),
        torque(protocol.bias()),
        protocol.pulse(),
        protocol.slot() - protocol.pulse());
  }

  @Override
  public String kernel() {
    final KernelChoice choice = KernelChoice.current();
    return choice.name() + " (" + choice.reason() + ")";
  }

  @Override
  public SlotOutcomes simulate(SlotRequest request) {
    final SlotTrials trials =
        ensemble.run(
            program(request.drive(), request.previousDrive()),
            request.restLevel(),
            request.firstTrial(),
            request.trials(),
            request.streamKey());
    return new SlotOutcomes(
        trials.counts(),
        trials.halfTurns(),
        trials.latencySeconds(),
        trials.endLevels(),
        trials.meanPoleProjection(),
        trials.replicaSteps());
  }

  private TorqueField torque(double currentDensity) {
    final double dampingLike = torquePerDrive * currentDensity;
    return new TorqueField(dampingLike, fieldLikeRatio * dampingLike);
  }

  /** Integration steps of one slot at the largest drive (1). */
  static long steps(EasyPlaneFerromagnet device, FerromagnetState state, DriveProtocol protocol) {
    final FerromagnetSlots slots = of(device, state, protocol);
    return slots.ensemble.steps(slots.program(protocol.maximumDrive(), Double.NaN));
  }

  /** Whether some drive of the range gives at least one count in half of a few simulated slots. */
  static boolean countsSomewhere(
      EasyPlaneFerromagnet device, FerromagnetState state, DriveProtocol protocol) {
    final FerromagnetSlots slots = of(device, state, protocol);
    for (int i = LOOK_DRIVES; i > 0; i--) {
      final double drive = protocol.maximumDrive() * i / LOOK_DRIVES;
      final long key = Streams.key(0, Purpose.DEVICE_CHECK, i);
      final SlotOutcomes outcomes =
          slots.simulate(new SlotRequest(drive, Double.NaN, 0, 0, LOOK_TRIALS, key));
      int counted = 0;
      for (final int count : outcomes.counts()) {
        counted += count > 0 ? 1 : 0;
      }
      if (2 * counted >= LOOK_TRIALS) {
        return true;
      }
    }
    return false;
  }
}
