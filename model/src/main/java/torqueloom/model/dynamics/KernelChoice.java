package torqueloom.model.dynamics;

/**
 * Which ensemble kernel runs, and why; chosen once when first asked for. The kernels give the same
 * bits, so the choice shows in the time only.
 */
public final class KernelChoice {
  private static final class Holder {
    static final KernelChoice CHOICE = new KernelChoice(new ScalarKernel(), "plain Java");
  }

  private final EnsembleKernel kernel;
  private final String reason;

  KernelChoice(EnsembleKernel kernel, String reason) {
    this.kernel = kernel;
    this.reason = reason;
  }

  /** The choice of this process. */
  public static KernelChoice current() {
    return Holder.CHOICE;
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
