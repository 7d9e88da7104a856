package torqueloom.training.study;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import torqueloom.model.response.Calibration;
import torqueloom.model.response.Calibrator;
import torqueloom.model.response.LibraryFile;
import torqueloom.model.response.ResponseLibrary;
import torqueloom.model.response.ResponseTables;
import torqueloom.model.synapse.SynapseModel;
import torqueloom.model.synapse.SynapseSummary;
import torqueloom.model.work.Progress;
import torqueloom.model.work.UnitExecutor;
import torqueloom.training.chip.ChipOutcome;
import torqueloom.training.data.TaskLoader;
import torqueloom.training.data.TaskSplit;
import torqueloom.training.learning.LogisticBaseline;

/**
 * The stages of a study in their order: response library, network, chips, comparisons, verdict.
 * Each stage reuses what stands in the run folder under the digest of all it depends on, and
 * computes the rest. Not for use by several threads; {@link #cancel} may be called from any.
 */
public final class StudyRunner implements AutoCloseable {
  private final StudyPlan plan;
  private final RunFolder folder;
  private final int threads;
  private final Progress progress;
  private final String version;
  private final UnitExecutor engine;
  private final Map<String, Double> seconds = new LinkedHashMap<>();
  private final SynapseModel synapse;
  private Responses responses;
  private EncodedTask task;
  private NetworkStage.Trained trained;

  private StudyRunner(
      StudyPlan plan, RunFolder folder, int threads, Progress progress, String version) {
    this.plan = plan;
    this.folder = folder;
    this.threads = threads;
    this.progress = progress;
    this.version = version;
    this.engine = new UnitExecutor(threads, folder.store(), progress);
    this.synapse = SynapseModel.of(plan.synapse(), plan.device().referenceTemperature());
  }

  /**
   * Opens the run folder of a study.
   *
   * @param plan what is asked
   * @param folder run folder, made if needed
   * @param threads units that run at once, &gt;= 1; changes no result
   * @param progress told how far the work is
   * @param version version of the program, written into results
   * @throws torqueloom.model.work.RunLock.HeldException if another process works in the folder
   * @throws torqueloom.training.data.TaskDataException if the task's data are unusable; the folder
   *     is not touched then
   */
  public static StudyRunner open(
      StudyPlan plan, Path folder, int threads, Progress progress, String version)
      throws IOException {
    // The data are read before anything is written.
    final EncodedTask task =
        plan.task()
            .map(t -> EncodedTask.of(TaskLoader.load(t, plan.seed()), plan.network()))
            .orElse(null);
    final StudyRunner runner =
        new StudyRunner(plan, RunFolder.open(folder), threads, progress, version);
    runner.task = task;
    return runner;
  }

  /** The response library, from the folder or calibrated now. */
  public ResponseLibrary calibrate() throws IOException, InterruptedException {
    if (responses == null) {
      final long start = System.nanoTime();
      final Calibrator calibrator =
          new Calibrator(
              new Calibration(
                  plan.device(),
                  plan.protocol(),
                  plan.tolerances(),
                  plan.trim(),
                  plan.calibration(),
                  plan.evaluation().temperatures(),
                  plan.seed()));
      final Path file = folder.file(LibraryFile.NAME);
      final Optional<ResponseLibrary> kept = LibraryFile.reusable(file, calibrator.digest());
      final ResponseLibrary library = kept.isPresent() ? kept.get() : calibrator.calibrate(engine);
      if (kept.isEmpty()) {
        // The library last: where it stands, its tables stand too.
        ResponseTables.writeCsv(folder.file("response.csv"), library);
        ResponseTables.writeNpy(
            folder.file("response.npy"), folder.file("response-drives.npy"), library);
        LibraryFile.write(file, library);
      }
      responses =
          Responses.of(library, plan.synapse().unitDrive(), plan.device().referenceTemperature());
      took("calibrate", start);
    }
    return responses.library();
  }

  /** The trained network and its accuracy, from the folder or trained now. */
  public TrainingOutcome train() throws IOException, InterruptedException {
    network();
    final IdealRun ideal = IdealRun.of(plan, responses, trained.network(), task.test());
    final LogisticBaseline baseline = LogisticBaseline.of(task.split());
    return new TrainingOutcome(
        trained.history(), ideal.accuracy(), baseline.testAccuracy(), baseline.strength());
  }

  /** Everything that a report shows. */
  public StudyResult result() throws IOException, InterruptedException {
    network();
    final IdealRun ideal = IdealRun.of(plan, responses, trained.network(), task.test());
    final long baselineStart = System.nanoTime();
    final LogisticBaseline baseline = LogisticBaseline.of(task.split());
    took("baseline", baselineStart);
    final ChipStage stage = new ChipStage(plan, synapse, trained, task, engine);
    final List<List<ChipOutcome>> chips = chips(stage);
    final List<TemperatureOutcome> outcomes = outcomes(stage, chips);
    final long compareStart = System.nanoTime();
    final Comparisons comparisons = new Comparisons(plan, stage, responses, engine);
    final ToleranceEffect effect = comparisons.toleranceEffect(chips);
    final TrimComparison trim = comparisons.trim(chips);
    took("comparisons", compareStart);
    final TaskSplit split = task.split();
    return new StudyResult(
        plan,
        version,
        plan.device().summarize(plan.device().referenceTemperature(), plan.protocol()),
        synapseSummary(),
        responses.library(),
        trained.history(),
        new int[] {split.train().rows(), split.validation().rows(), split.test().rows()},
        split.train().featureCount(),
        split.train().classNames(),
        ideal.accuracy(),
        baseline.testAccuracy(),
        baseline.strength(),
        outcomes,
        effect,
        trim,
        ideal.cost(plan, synapse),
        Verdicts.judge(outcomes, plan.targets(), split.test().rows()));
  }

  /** Derived quantities and warnings of the synapse. */
  public SynapseSummary synapseSummary() {
    return synapse.summary(
        plan.device()
            .electrical(plan.device().referenceTemperature(), plan.protocol())
            .currentPerDrive());
  }

  /** Seconds spent by stage, in order; for the timing file only. */
  public Map<String, Double> seconds() {
    return new LinkedHashMap<>(seconds);
  }

  /** Makes the running stage end soon with an {@link InterruptedException}; from any thread. */
  public void cancel() {
    engine.cancel();
  }

  @Override
  public void close() throws IOException {
    engine.close();
    folder.close();
  }

  private void network() throws IOException, InterruptedException {
    calibrate();
    if (trained == null) {
      final long start = System.nanoTime();
      trained = new NetworkStage(plan, synapse, responses, task).run(folder.path(), progress);
      took("train", start);
    }
  }

  private List<List<ChipOutcome>> chips(ChipStage stage) throws InterruptedException {
    final long start = System.nanoTime();
    final int temperatures = responses.library().temperatures().size();
    final List<List<ChipOutcome>> chips =
        stage.run(
            new ChipStage.Draw(
                "chips",
                responses,
                plan.tolerances(),
                plan.trim(),
                true,
                IntStream.range(0, temperatures).boxed().toList(),
                plan.evaluation().chips()));
    took("chips", start);
    return chips;
  }

  private List<TemperatureOutcome> outcomes(ChipStage stage, List<List<ChipOutcome>> chips) {
    final long start = System.nanoTime();
    final List<TemperatureOutcome> outcomes = new ArrayList<>();
    final List<Double> temperatures = responses.library().temperatures();
    for (int t = 0; t < temperatures.size(); t++) {
      outcomes.add(stage.outcome(chips, t, temperatures.get(t), threads));
    }
    took("statistics", start);
    return outcomes;
  }

  private void took(String stage, long start) {
    seconds.put(stage, (System.nanoTime() - start) * 1e-9);
  }
}
