package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.List;
import torqueloom.model.response.ResponseCurve;
import torqueloom.model.response.ResponseLibrary;
import torqueloom.reports.document.Block;
import torqueloom.reports.document.Callout;
import torqueloom.reports.document.Figure;
import torqueloom.reports.document.Paragraph;
import torqueloom.reports.document.Section;
import torqueloom.reports.document.Text;
import torqueloom.training.study.StudyResult;

/** Calibrated spike responses. */
final class ResponseSection {

  private ResponseSection() {}

  static Section of(StudyFacts facts) {
    final List<Block> blocks = new ArrayList<>();
    final ResponseLibrary library = facts.result().library();
    final ResponsePictures pictures = new ResponsePictures(facts);
    blocks.add(Paragraph.of(introduction(facts)));
    blocks.add(
        new Figure(
            "response-mean",
            pictures.meanCounts(),
            Text.of(
                "Mean count in a slot against drive. Heavy lines: the nominal device at each "
                    + "temperature; bars are plus and minus 1.96 standard errors. Faint lines: "
                    + Words.count(facts.spreadCurves().size())
                    + " devices drawn from the tolerances, after trim where the study has one.")));
    facts.nominal().ifPresent(curve -> blocks.addAll(nominal(curve, pictures, library)));
    blocks.add(carryOver(facts.result()));
    return new Section("response", "Spike response", blocks);
  }

  private static String introduction(StudyFacts facts) {
    final ResponseLibrary library = facts.result().library();
    final long devices =
        library.curves().stream().mapToInt(ResponseCurve::instance).distinct().count();
    final String start =
        "Each of "
            + Words.count(devices)
            + " devices, the nominal one and others drawn from the "
            + "tolerances, was simulated over a grid of drives ("
            + Words.count(library.replicaSteps())
            + " integration steps in all). A chip's neuron takes "
            + "the response of the library device nearest to its own drawn parameters.";
    return facts
        .nominal()
        .map(c -> start + " " + window(OneCountWindow.of(c), library))
        .orElse(start);
  }

  private static String window(OneCountWindow window, ResponseLibrary library) {
    final String unit = library.driveUnit();
    if (window.clean()) {
      return "The nominal device gives exactly one count in at least "
          + Words.round(StudyFacts.CLEAN)
          + " of the slots for drives from "
          + Words.quantity(window.low(), unit)
          + " to "
          + Words.quantity(window.high(), unit)
          + " (calibrated points).";
    }
    return "The nominal device has no drive at which it gives exactly one count in "
        + Words.round(StudyFacts.CLEAN)
        + " of the slots; the best is "
        + Words.percent(window.best())
        + ".";
  }

  private static List<Block> nominal(
      ResponseCurve curve, ResponsePictures pictures, ResponseLibrary library) {
    final String at = Words.kelvin(curve.temperatureKelvin());
    return List.of(
        new Figure(
            "response-counts",
            pictures.distribution(curve),
            Text.of(
                "Share of slots with n counts, nominal device at "
                    + at
                    + "; bars are 95 % Wilson intervals of each point. Trials are added until these"
                    + " are narrow enough, which costs a little of their coverage.")),
        new Figure(
            "response-latency",
            pictures.latency(curve),
            Text.of(
                "Time from the start of the pulse to the first count, nominal device at "
                    + at
                    + "; bars are the jitter (one standard deviation). Points appear where"
                    + " something counted.")));
  }

  private static Block carryOver(StudyResult result) {
    final ResponseLibrary library = result.library();
    if (!Double.isFinite(library.carryOver())) {
      return Paragraph.of("How far one slot reaches into the next was not measured.");
    }
    final String measure =
        "Largest total variation between the counts after a quiet slot and after a busy one: "
            + Words.quantity(library.carryOver(), "1")
            + "; chance alone stays below "
            + Words.quantity(library.carryOverFloor(), "1")
            + " in 95 of 100 measurements. ";
    if (SlotMemory.matters(library)) {
      return new Callout(
          Callout.Tone.CAUTION,
          "One slot reaches into the next",
          List.of(
              Paragraph.of(
                  measure
                      + "Above both this and "
                      + Words.quantity(SlotMemory.LIMIT, "1")
                      + " the memory of the device matters; chips here use the response after a"
                      + " quiet slot only. "
                      + SlotMemory.cure(result))));
    }
    return Paragraph.of(measure + "No memory from slot to slot is seen at this resolution.");
  }
}
