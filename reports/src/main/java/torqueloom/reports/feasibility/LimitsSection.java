package torqueloom.reports.feasibility;

import java.util.ArrayList;
import java.util.List;
import torqueloom.model.synapse.SynapseSettings;
import torqueloom.reports.document.Block;
import torqueloom.reports.document.Bullets;
import torqueloom.reports.document.Callout;
import torqueloom.reports.document.Paragraph;
import torqueloom.reports.document.Section;
import torqueloom.training.study.StudyPlan;

/** What the estimate assumes, and what to be careful with. */
final class LimitsSection {
  private LimitsSection() {}

  static Section assumptions(StudyFacts facts) {
    final StudyPlan plan = facts.result().plan();
    final List<Block> blocks = new ArrayList<>();
    blocks.add(Bullets.of(physics()));
    blocks.add(
        new Section(
            "assumptions-chips",
            "Chips and network",
            List.of(Bullets.of(chips(plan, facts.result().library().matchingError())))));
    if (!plan.notices().isEmpty()) {
      blocks.add(
          new Section(
              "assumptions-notices",
              "Stated in the study, not yet used",
              List.of(Bullets.of(plan.notices()))));
    }
    return new Section("assumptions", "Assumptions and limits", blocks);
  }

  private static List<String> physics() {
    return List.of(
        "Each magnet is one macrospin: it moves as a rigid whole. A nearly compensated film is not"
            + " rigid: its local demagnetizing factor varies across the width by tens of"
            + " millitesla, so edges and center do not balance together. Where the balance decides,"
            + " micromagnetic simulation and measurement come before a wafer.",
        "Dipolar fields between neurons, synapses and readout layers are outside the model.",
        "Thermal noise is white and the device has the bath's temperature: the mean heating stated"
            + " above is not added to it, and heating by the pulse itself changes no parameter.",
        "The readout's input stage is taken to sense current, so that its own noise is held down by"
            + " the sensor's resistance. A voltage amplifier across the same load would see far"
            + " more noise.",
        "Edge roughness, grains, and domain walls are not modeled; what they do must be contained"
            + " in the stated tolerances.",
        "Counts are what the stated comparator gives for the mean moment under the junction; cross"
            + " talk between readout lines is left out.");
  }

  private static List<String> chips(StudyPlan plan, double matchingError) {
    final List<String> out = new ArrayList<>();
    final String matching =
        Double.isFinite(matchingError)
            ? "; between a device and its nearest neighbor the mean count differs by "
                + Words.quantity(matchingError, "1")
                + " on average"
            : "";
    out.add(
        "A neuron of a chip answers as the library device nearest to its drawn parameters, with the"
            + " drive rescaled by its own torque; the distance between the two is an error of"
            + " matching that shrinks with more library instances ("
            + Words.count(plan.calibration().instances())
            + " here"
            + matching
            + ").");
    out.add(
        "A slot's answer depends on that slot's drive only; memory from slot to slot is measured on"
            + " the nominal device and reported, not simulated on chips.");
    if (plan.synapse().kind() == SynapseSettings.Kind.JUNCTION) {
      out.add(
          "Synapses carry their drawn spread and write error; thermal fluctuation of their"
              + " conductance and noise on the lines are not on the chips yet.");
    } else {
      out.add("Synapses are ideal: weights without spread, write error or noise.");
    }
    out.add(
        "The intervals are over chips and test cases. The response library (its devices and their "
            + "counting error) and the one training are common to all chips and in no interval.");
    out.add(
        "Variation-aware training draws devices one by one from the library, without the part that"
            + " the devices of a chip share.");
    out.add(
        "The comparison of trim calibrates its counterpart more coarsely than the study's own"
            + " library; a loss or gain is taken over pairs of chips, and so differs from the"
            + " difference of two medians.");
    out.add(
        "Trim, where it is used, is idealized: the best level is always found, without measuring"
            + " noise or drift.");
    out.add(
        "Tolerances are normal, truncated at four standard deviations, and independent of each"
            + " other; dead or stuck devices are not drawn in this version.");
    out.add(
        "Energy and latency are estimates from the stated circuit values, not a circuit"
            + " simulation.");
    return out;
  }

  static Section cautions() {
    return new Section(
        "cautions",
        "Cautions",
        List.of(
            new Callout(
                Callout.Tone.CAUTION,
                "A model estimate, not a measurement",
                List.of(
                    Paragraph.of(
                        "This report supports a decision about building and measuring devices. It"
                            + " is no safety case and must not carry a safety-critical decision."
                            + " Where it disagrees with a measurement, the measurement is right."),
                    Bullets.of(cautionPoints())))));
  }

  private static List<String> cautionPoints() {
    return List.of(
        "Current densities of this kind heat narrow strips within nanoseconds and move metal atoms "
            + "(electromigration). Check the warnings above, begin with short pulses and low duty "
            + "cycle, and watch the resistance.",
        "Thin dielectrics break down; keep gate voltages well below the breakdown field and count"
            + " on early failures.",
        "Laboratory supplies, pulse generators and magnets hold dangerous voltages, currents,"
            + " fields and stored energy. Local rules and qualified staff decide what may be"
            + " operated and how.");
  }
}
