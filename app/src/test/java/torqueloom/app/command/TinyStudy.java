package torqueloom.app.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;

/** A study small enough to run whole in a few seconds. */
final class TinyStudy {
  static final String TEXT =
      """
      torqueloom: 1
      name: Tiny
      seed: 3
      device:
        kind: easy-plane-ferromagnet
        film:
          saturation-magnetization: 0.8 MA/m
          thickness: 4 nm
          interface-anisotropy: 1.379 mJ/m^2
          damping: 0.1
        outline: {shape: rectangle, length: 200 nm, width: 50 nm}
        bias-field: 4 mT
        drive: {spin-hall-angle: 0.25}
      protocol: {maximum-drive: 7.8e11 A/m^2, pulse: 0.5 ns, slot: 4 ns}
      tolerances: {thickness: {chip: 0.3 %, device: 0.1 %}}
      calibration: {instances: 2, drives: 6, half-width: 20 %, maximum-trials: 64}
      synapse: {unit-drive: 3.9e10 A/m^2}
      task: {data: tiny.csv, label: state}
      network: {hidden: [4], slots: 2}
      training: {epochs: 2, batch: 16}
      evaluation: {chips: 6, noise-passes: 1}
      targets: {accuracy: 60 %, yield: 50 %, confidence: 80 %}
      """;

  private TinyStudy() {}

  /** Writes the study and its data; the classes differ in one feature. */
  static Path write(Path folder) throws IOException {
    final StringBuilder csv = new StringBuilder("a,b,state\n");
    for (int i = 0; i < 120; i++) {
      final double noise = (i * 37 % 100) / 100.0;
      csv.append(
          String.format(
              Locale.ROOT,
              "%.2f,%.2f,%s%n",
              (i % 2) + 0.5 * noise,
              noise,
              i % 2 == 0 ? "on" : "off"));
    }
    Files.writeString(folder.resolve("tiny.csv"), csv.toString());
    return Files.writeString(folder.resolve("tiny.yaml"), TEXT);
  }
}
