package torqueloom.app.command;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import torqueloom.app.study.Study;
import torqueloom.app.study.Use;
import torqueloom.model.device.DerivedQuantity;
import torqueloom.model.device.DeviceSummary;
import torqueloom.model.device.DeviceWarning;
import torqueloom.model.table.CanonicalJson;

/** Derived quantities and warnings of the device. */
@Command(
    name = "device",
    description = "The device's derived quantities, its electrical chain, and warnings.")
final class DeviceCommand implements Callable<Integer> {
  private final Console console;

  @Mixin StudyOptions options;

  DeviceCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() throws Exception {
    final Study study = options.read(Use.DEVICE, console);
    final DeviceSummary summary = study.summary();
    console
        .out()
        .print(
            options.json
                ? CanonicalJson.text(json(summary))
                : DeviceText.of(study.name(), summary));
    return ExitCode.DONE;
  }

  /** The document of {@code device --json}. */
  static Map<String, Object> json(DeviceSummary summary) {
    final Map<String, Object> device = values(summary.device());
    device.put("electrical", values(summary.electrical()));
    device.put("warnings", warnings(summary.warnings()));
    final Map<String, Object> document = new LinkedHashMap<>();
    document.put("schema", 1);
    document.put("device", device);
    return document;
  }

  /** Warnings as {@code {"code", "text"}}. */
  static List<Object> warnings(List<DeviceWarning> warnings) {
    final List<Object> entries = new ArrayList<>();
    for (final DeviceWarning warning : warnings) {
      final Map<String, Object> entry = new LinkedHashMap<>();
      entry.put("code", warning.code());
      entry.put("text", warning.text());
      entries.add(entry);
    }
    return entries;
  }

  /** Quantities by key. */
  static Map<String, Object> values(List<DerivedQuantity> quantities) {
    final Map<String, Object> values = new LinkedHashMap<>();
    for (final DerivedQuantity quantity : quantities) {
      values.put(quantity.key(), quantity.value());
    }
    return values;
  }
}
