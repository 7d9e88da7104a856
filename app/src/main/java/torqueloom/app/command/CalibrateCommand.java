package torqueloom.app.command;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import picocli.CommandLine.Command;
import torqueloom.app.study.Use;
import torqueloom.model.response.LibraryFile;
import torqueloom.model.response.ResponseCurve;
import torqueloom.model.response.ResponseJson;
import torqueloom.model.response.ResponseLibrary;
import torqueloom.model.synapse.SynapseSummary;
import torqueloom.model.table.CanonicalJson;
import torqueloom.model.units.QuantityFormat;
import torqueloom.model.units.QuantityKind;
import torqueloom.training.study.StudyPlan;
import torqueloom.training.study.StudyRunner;

/** Response library and synapse tuning curve. */
@Command(name = "calibrate", description = "Response library and synapse tuning curve.")
final class CalibrateCommand extends StageCommand {
  CalibrateCommand(Console console) {
    super(console);
  }

  @Override
  Use goal() {
    return Use.CALIBRATE;
  }

  @Override
  boolean usesNetwork() {
    return false;
  }

  @Override
  int work(StudyRunner runner, StudyPlan plan, Path folder) throws Exception {
    final ResponseLibrary library = runner.calibrate();
    final SynapseSummary synapse = runner.synapseSummary();
    print(
        options.json
            ? CanonicalJson.text(json(library, synapse))
            : text(library, synapse, folder.resolve(LibraryFile.NAME)));
    return ExitCode.DONE;
  }

  private static Map<String, Object> json(ResponseLibrary library, SynapseSummary synapse) {
    final Map<String, Object> document = new LinkedHashMap<>(ResponseJson.document(library));
    final Map<String, Object> values = DeviceCommand.values(synapse.quantities());
    values.put("warnings", DeviceCommand.warnings(synapse.warnings()));
    document.put("synapse", values);
    return document;
  }

  private static String text(ResponseLibrary library, SynapseSummary synapse, Path file) {
    final StringBuilder text = new StringBuilder("Response library\n");
    final long instances =
        library.instances().stream().mapToInt(each -> each.instance()).distinct().count();
    text.append("  instances       ").append(instances).append('\n');
    text.append("  carry-over      ").append(ratio(library.carryOver()));
    text.append(", chance alone stays below ").append(ratio(library.carryOverFloor()));
    text.append("\n  matching error  ").append(ratio(library.matchingError())).append(" counts\n");
    text.append("  replica-steps   ").append(ratio(library.replicaSteps())).append('\n');
    for (final ResponseCurve curve : library.curves()) {
      if (curve.instance() == 0 && Double.isNaN(curve.previousDrive())) {
        nominal(text, curve, library.driveUnit());
      }
    }
    DeviceText.table(text, "Synapse", synapse.quantities());
    DeviceText.warnings(text, synapse.warnings());
    return text.append("\nThe library stands in ").append(file).append('\n').toString();
  }

  private static void nominal(StringBuilder text, ResponseCurve curve, String unit) {
    text.append("\nNominal device at ");
    text.append(QuantityFormat.text(curve.temperatureKelvin(), QuantityKind.TEMPERATURE));
    text.append("\n  drive (").append(unit).append(")  mean count  latency\n");
    for (int i = 0; i < curve.drive().length; i++) {
      text.append(
          String.format(
              "  %-12s %-11s %s%n",
              ratio(curve.drive()[i]),
              ratio(curve.meanCount(i)),
              QuantityFormat.text(curve.latencySeconds()[i], QuantityKind.TIME)));
    }
  }

  private static String ratio(double value) {
    return QuantityFormat.text(value, QuantityKind.RATIO);
  }
}
