package torqueloom.model.dynamics;

import java.util.Locale;

/**
 * Which ensemble kernel runs, and why; chosen once when first asked for. The kernels give the same
 * bits, so the choice shows in the time only.
 *
 * <p>The vector kernel runs where the module {@code jdk.incubator.vector} was added to the process
 * and the optimizing compiler is on; a process with only the first compiler runs vector code a
 * hundred times slower than scalar code. The system property {@value #PROPERTY} set to
 * {@code scalar} or {@code vector} overrides.
 */
public final class KernelChoice {
  /** System property that overrides the choice. */
  public static final String PROPERTY = "torqueloom.kernel";

  private static final String MODULE = "jdk.incubator.vector";
  private static final String CLASS = "torqueloom.model.dynamics.VectorKernel";

  /** Narrower vectors than this do not repay their overhead. */
  private static final int FEWEST_LANES = 4;

  private static final class Holder {
    static final KernelChoice CHOICE = choose(System.getProperty(PROPERTY, ""));
  }

  private final EnsembleKernel kernel;
  private final String reason;

  private KernelChoice(EnsembleKernel kernel, String reason) {
    this.kernel = kernel;
    this.reason = reason;
  }

  /** The choice of this process. */
  public static KernelChoice current() {
    return Holder.CHOICE;
  }

  static KernelChoice choose(String wish) {
    final String asked = wish.toLowerCase(Locale.ROOT);
    if (asked.equals("scalar")) {
      return scalar("asked for by " + PROPERTY);
    }
    if (ModuleLayer.boot().findModule(MODULE).isEmpty()) {
      return scalar("the module " + MODULE + " was not added to this process");
    }
    if (!asked.equals("vector") && !optimizes()) {
      return scalar("the optimizing compiler is off in this process");
    }
    return vector();
  }

  private static KernelChoice scalar(String reason) {
    return new KernelChoice(new ScalarKernel(), reason);
  }

  /** By name, so that nothing of the vector kernel is loaded where its module is missing. */
  private static KernelChoice vector() {
    try {
      final Class<?> type = Class.forName(CLASS);
      final var lanesOf = type.getDeclaredMethod("lanes");
      final int lanes = (Integer) lanesOf.invoke(null);
      if (lanes < FEWEST_LANES) {
        return scalar("vectors have only " + lanes + " lanes here");
      }
      final var constructor = type.getDeclaredConstructor();
      return new KernelChoice(
          (EnsembleKernel) constructor.newInstance(), lanes + " float lanes of " + MODULE);
    } catch (ReflectiveOperationException | LinkageError problem) {
      return scalar("the vector kernel cannot be loaded: " + problem);
    }
  }

  /** HotSpot says "emulated-client" or "interpreted mode" when its second compiler is off. */
  private static boolean optimizes() {
    final String mode = System.getProperty("java.vm.info", "");
    return !mode.contains("emulated-client") && !mode.contains("interpreted");
  }

  /** Name of the kernel, e.g. {@code scalar}. */
  public String name() {
    return kernel.name();
  }

  /** Why it was chosen, in a few words for the log and the provenance. */
  public String reason() {
    return reason;
  }

  EnsembleKernel kernel() {
    return kernel;
  }
}
