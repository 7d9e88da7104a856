package torqueloom.app.study;

import java.util.List;
import torqueloom.model.response.Calibration;
import torqueloom.model.response.Calibrator;
import torqueloom.training.data.TaskSplit;
import torqueloom.training.study.StudyPlan;

/**
 * What a study will take, from its sizes and rates measured on one machine (2 cores, x86-64). An
 * estimate for people, good to about a factor of two; no result depends on it.
 *
 * @param stages in the order of work
 * @param memoryBytes largest memory of the process (bytes)
 * @param diskBytes size of the run folder (bytes)
 */
public record PlanEstimate(List<Stage> stages, long memoryBytes, long diskBytes) {
  /** Device steps of one thread in a second. */
  private static final double DEVICE_STEPS_PER_SECOND = 2e8;

  /** Multiplications of the training in a second, forward, backward and draws included. */
  private static final double TRAINING_PER_SECOND = 3e9;

  /** Multiplications and drawn counts of the chips of one thread in a second. */
  private static final double CHIPS_PER_SECOND = 1.2e10;

  /** One drawn count costs as much as so many multiplications. */
  private static final double DRAW_COST = 60;

  /** Most chips of each comparison. */
  private static final int COMPARED_CHIPS = 200;

  private static final long BASE_MEMORY_BYTES = 400_000_000L;
  private static final long BASE_DISK_BYTES = 3_000_000L;
  private static final double BYTES_PER_DRIVE = 150;
  private static final double REPORT_SECONDS = 1;
  private static final double START_SECONDS = 3;

  /**
   * One stage.
   *
   * @param name its command
   * @param seconds expected duration (s)
   */
  public record Stage(String name, double seconds) {}

  /** Copies the list. */
  public PlanEstimate {
    stages = List.copyOf(stages);
  }

  /**
   * The estimate of a study.
   *
   * @param plan what is asked
   * @param task the task's rows
   * @param threads threads to be used, at least 1
   */
  public static PlanEstimate of(StudyPlan plan, TaskSplit task, int threads) {
    final double curves =
        (double) plan.calibration().instances() * plan.evaluation().temperatures().size();
    final double steps =
        new Calibrator(
                new Calibration(
                    plan.device(),
                    plan.protocol(),
                    plan.tolerances(),
                    plan.trim(),
                    plan.calibration(),
                    plan.evaluation().temperatures(),
                    plan.seed()))
            .estimate()
            .replicaSteps();
    final double forward = forwardCost(plan, task);
    final double training = 3 * forward * plan.training().epochs() * task.train().rows();
    final double pass = forward * plan.evaluation().noisePasses() * task.test().rows();
    final int temperatures = plan.evaluation().temperatures().size();
    final int chips = plan.evaluation().chips();
    // The comparisons draw two more sets at one temperature and calibrate once more for it.
    final double passes = (double) chips * temperatures + 2.0 * Math.min(chips, COMPARED_CHIPS);
    final double comparison = steps / temperatures / DEVICE_STEPS_PER_SECOND;
    final List<Stage> stages =
        List.of(
            new Stage("device", 0),
            new Stage("calibrate", steps / DEVICE_STEPS_PER_SECOND / threads),
            new Stage("train", START_SECONDS + training / TRAINING_PER_SECOND),
            new Stage("chips", (passes * pass / CHIPS_PER_SECOND + comparison) / threads),
            new Stage("report", REPORT_SECONDS));
    final double library = curves * plan.calibration().drives() * BYTES_PER_DRIVE;
    return new PlanEstimate(
        stages, BASE_MEMORY_BYTES + 4L * cells(task) * 3, BASE_DISK_BYTES + (long) library);
  }

  /** Duration of all stages (s). */
  public double seconds() {
    return stages.stream().mapToDouble(Stage::seconds).sum();
  }

  /** Multiplications of one case through the network, a drawn count taken as some. */
  private static double forwardCost(StudyPlan plan, TaskSplit task) {
    double cost = 0;
    int width = task.train().featureCount();
    for (final int neurons : plan.network().hidden()) {
      cost += (double) width * neurons + DRAW_COST * neurons;
      width = neurons;
    }
    return plan.network().slots() * (cost + (double) width * task.train().classCount());
  }

  private static long cells(TaskSplit task) {
    final long rows = (long) task.train().rows() + task.validation().rows() + task.test().rows();
    return rows * task.train().featureCount();
  }
}
