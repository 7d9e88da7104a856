package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import torqueloom.training.study.StudyResult;
import torqueloom.training.study.ToleranceEffect;
import torqueloom.training.study.TrimComparison;
import torqueloom.training.study.Verdict;

/**
 * Why a study ended as it did, in sentences with numbers, the decisive cause first. The order of
 * the search follows the signal: a device without counts explains everything after it, an ideal
 * network below the target explains the chips, zero-tolerance chips below the target cannot be
 * helped by better fabrication, and only then are the tolerances the cause.
 */
final class Diagnosis {
  /** Share of neurons out of the film that is worth a sentence (1). */
  private static final double NOTABLE_SHARE = 0.02;

  private final StudyFacts facts;
  private final StudyResult result;
  private final double target;

  private Diagnosis(StudyFacts facts) {
    this.facts = facts;
    this.result = facts.result();
    this.target = facts.targets().accuracy();
  }

  /** The causes, the decisive one first; never empty. */
  static List<String> causes(StudyFacts facts) {
    final Diagnosis diagnosis = new Diagnosis(facts);
    return facts.result().verdict().kind() == Verdict.Kind.MET
        ? diagnosis.margins()
        : diagnosis.shortfalls();
  }

  private List<String> margins() {
    final List<String> out = new ArrayList<>();
    facts
        .worst()
        .ifPresent(
            worst ->
                out.add(
                    "The tightest temperature is "
                        + Words.kelvin(worst.temperatureKelvin())
                        + ": the lower ends of its yield intervals, "
                        + Words.percent(worst.yield().low())
                        + " on this test set and "
                        + Words.percent(worst.yieldOnNewCases().low())
                        + " on new cases, lie above the target of "
                        + Words.round(facts.targets().yield())
                        + "."));
    out.add(cost(result.toleranceEffect()));
    if (result.ideal() <= result.baseline()) {
      out.add(
          "Logistic regression does as well ("
              + Words.percent(result.baseline())
              + " against "
              + Words.percent(result.ideal())
              + " of the ideal network): this task needs no device network, and meeting the target"
              + " shows that the devices can do it, not that they are needed.");
    }
    if (!result.trim().assumed() && result.trim().difference().low() > 0) {
      out.add("The trim is part of this proposal and carries part of the answer. " + trim());
    }
    return out;
  }

  private static String cost(ToleranceEffect effect) {
    final String medians =
        "median "
            + Words.percent(effect.medianAtZero())
            + " without them, "
            + Words.percent(effect.medianAtStated())
            + " with them, the same "
            + Words.count(effect.chips())
            + " chips.";
    return effect.loss().low() > 0
        ? "The stated tolerances cost " + Words.points(effect.loss()) + " of accuracy: " + medians
        : "The stated tolerances cost no accuracy that shows (median paired loss "
            + Words.gain(effect.loss())
            + "): "
            + medians;
  }

  private List<String> shortfalls() {
    final List<String> out = new ArrayList<>();
    final Optional<OneCountWindow> window = facts.nominal().map(OneCountWindow::of);
    final ToleranceEffect effect = result.toleranceEffect();
    if (window.isPresent() && window.get().mostCounts() < 0.5) {
      out.add(
          "The device hardly answers: over the whole drive range its mean count stays at or below "
              + Words.quantity(window.get().mostCounts(), "1")
              + ", so the network receives next to no signal.");
    } else if (result.ideal() < target) {
      out.add(idealShortfall());
    } else if (effect.medianAtZero() < target) {
      out.add(zeroToleranceShortfall(effect));
    }
    if (effect.loss().low() > 0) {
      out.add(toleranceLoss(effect));
      out.addAll(imbalance(effect));
    }
    if (window.isPresent() && window.get().mostCounts() >= 0.5 && !window.get().clean()) {
      out.add(noWindow(window.get()));
    }
    temperatures().ifPresent(out::add);
    return out.isEmpty() ? List.of(crowding()) : out;
  }

  /** Training on drawn devices carries their spread into the ideal network too. */
  private String idealShortfall() {
    final String start =
        "Already on nominal devices the network reaches only "
            + Words.percent(result.ideal())
            + ", below the "
            + Words.round(target)
            + " asked of a chip. ";
    return facts.trainedOnDrawnDevices()
        ? start
            + "It learned on devices drawn from the stated tolerances, so their width costs "
            + "accuracy here too: tolerances or trim come first, then the size of the network, its "
            + "slots, its encoding and the device's response."
        : start
            + "Tighter fabrication cannot help; a larger network, more slots, a better encoding or "
            + "a better device response could.";
  }

  private String zeroToleranceShortfall(ToleranceEffect effect) {
    return "Chips without any tolerance reach a median of only "
        + Words.percent(effect.medianAtZero())
        + ", although the ideal network reaches "
        + Words.percent(result.ideal())
        + ": what is lost before any device differs from another "
        + "(levels and write errors of the synapses, thermal noise) already brings them below the "
        + Words.round(target)
        + " asked.";
  }

  private String toleranceLoss(ToleranceEffect effect) {
    return "The stated tolerances take "
        + Words.points(effect.loss())
        + " of accuracy from the same "
        + Words.count(effect.chips())
        + " chips: the median falls from "
        + Words.percent(effect.medianAtZero())
        + " at zero tolerances to "
        + Words.percent(effect.medianAtStated())
        + ", against a target of "
        + Words.round(target)
        + ".";
  }

  /** The part of the loss that a trim gives back is the part that acts through the imbalance. */
  private List<String> imbalance(ToleranceEffect effect) {
    final TrimComparison trim = result.trim();
    final List<String> out = new ArrayList<>();
    if (trim.assumed() && trim.difference().low() > 0 && effect.loss().estimate() > 0) {
      final double share = trim.difference().estimate() / effect.loss().estimate();
      out.add(
          "They act mainly through the imbalance D = B_z − B_x, a small difference of two large "
                  .replace("mainly ", share >= 0.5 ? "mainly " : "partly ")
              + "fields that thickness, interfacial anisotropy and magnetization all move:"
              + " correcting D alone would give back "
              + Words.points(trim.difference())
              + ".");
    }
    if (trim.outOfFilmWithout() >= NOTABLE_SHARE && trim.assumed()) {
      out.add(
          "In "
              + Words.percent(trim.outOfFilmWithout())
              + " of the drawn neurons D has become so large that the easy axis leaves the film;"
              + " such a neuron does not rest where the readout expects it.");
    } else if (trim.outOfFilmWith() >= NOTABLE_SHARE && !trim.assumed()) {
      out.add(
          "Even after trim the easy axis of "
              + Words.percent(trim.outOfFilmWith())
              + " of the drawn neurons is out of the film: their error exceeds the trim's range.");
    }
    return out;
  }

  private String noWindow(OneCountWindow window) {
    return "The nominal device has no clean one-count window: the largest share of exactly one"
        + " count is "
        + Words.percent(window.best())
        + ", at a drive of "
        + Words.quantity(window.bestDrive(), result.library().driveUnit())
        + ".";
  }

  private Optional<String> temperatures() {
    final List<String> good = facts.temperatures(Verdict.Kind.MET);
    final List<String> bad = facts.temperatures(Verdict.Kind.NOT_MET);
    return good.isEmpty() || bad.isEmpty()
        ? Optional.empty()
        : Optional.of(
            "The targets are met at "
                + Words.list(good)
                + " and missed at "
                + Words.list(bad)
                + ": temperature moves the magnetization and the interfacial anisotropy, and with"
                + " them the device's response.");
  }

  private String crowding() {
    return "The chips' accuracies lie close around the target of "
        + Words.round(target)
        + ": median "
        + Words.percent(result.toleranceEffect().medianAtStated())
        + "; a small change of the design or of the target turns the answer.";
  }

  /** What the trim changes, or would change; empty when it was not compared. */
  String trim() {
    return TrimWords.sentence(result);
  }
}
