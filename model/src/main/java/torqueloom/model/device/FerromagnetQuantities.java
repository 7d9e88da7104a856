package torqueloom.model.device;

import java.util.ArrayList;
import java.util.List;
import torqueloom.model.magnet.AxisFields;
import torqueloom.model.magnet.EquilibriumPlane;

/** Magnetic quantities of the ferromagnet in printing order; without those that are not finite. */
final class FerromagnetQuantities {
  private FerromagnetQuantities() {}

  static List<DerivedQuantity> of(EasyPlaneFerromagnet device, FerromagnetState state) {
    final List<DerivedQuantity> list = new ArrayList<>();
    addFields(list, state);
    addDrive(list, state);
    final double compensation = device.compensationThickness(state);
    if (!Double.isNaN(compensation)) {
      list.add(
          new DerivedQuantity(
              "compensationThicknessMeters",
              "thickness at which the anisotropy balances the shape",
              "t*",
              compensation,
              "m"));
    }
    addDynamics(list, device.film().damping(), state);
    list.add(
        new DerivedQuantity(
            "torqueTeslaPerDrive",
            "damping-like torque field per current density in the strip",
            "B_DL/J",
            state.torquePerDrive(),
            "T/(A/m^2)"));
    addExtras(list, device, state);
    list.removeIf(q -> q.value() instanceof Double number && !Double.isFinite(number));
    return list;
  }

  private static void addFields(List<DerivedQuantity> list, FerromagnetState state) {
    final AxisFields fields = state.fields();
    list.add(
        new DerivedQuantity(
            "demagnetizingFactors",
            "demagnetizing factors along x, y, z",
            "N",
            state.factors().clone(),
            "1"));
    list.add(
        new DerivedQuantity(
            "axisFieldsTesla",
            "anisotropy fields of the axes x, y, z",
            "B_x, B_y, B_z",
            fields.toArray(),
            "T"));
    list.add(new DerivedQuantity("easyAxis", "easy axis at zero field", "", fields.easyAxis(), ""));
    list.add(
        new DerivedQuantity(
            "middleAxis", "middle axis at zero field", "", fields.middleAxis(), ""));
    list.add(new DerivedQuantity("hardAxis", "hard axis at zero field", "", fields.hardAxis(), ""));
    list.add(
        new DerivedQuantity(
            "easyFieldTesla", "middle less easy axis", "B_easy", fields.easyField(), "T"));
    list.add(
        new DerivedQuantity(
            "hardFieldTesla", "hard less middle axis", "B_hard", fields.hardField(), "T"));
    list.add(
        new DerivedQuantity(
            "imbalanceTesla", "imbalance, normal less current axis", "D", fields.imbalance(), "T"));
    list.add(
        new DerivedQuantity(
            "restDirection",
            "direction of the moment at rest",
            "m_0",
            state.restDirections()[0],
            "1"));
  }

  private static void addDrive(List<DerivedQuantity> list, FerromagnetState state) {
    final double threshold = state.plane().threshold();
    list.add(
        new DerivedQuantity(
            "thresholdTesla",
            "threshold of the damping-like torque field, slow drive",
            "B_DL,c",
            threshold,
            "T"));
    list.add(
        new DerivedQuantity(
            "criticalCurrentDensity",
            "critical current density in the strip, slow drive",
            "J_c",
            threshold / Math.abs(state.torquePerDrive()),
            "A/m^2"));
  }

  private static void addDynamics(
      List<DerivedQuantity> list, double damping, FerromagnetState state) {
    final AxisFields fields = state.fields();
    list.add(
        new DerivedQuantity(
            "dampingNumber",
            "damping number: of order one for single clean turns, large for coasting",
            "beta_c",
            EquilibriumPlane.dampingNumber(state.stiffness(0)[0], damping, fields.hardField()),
            "1"));
    list.add(
        new DerivedQuantity(
            "maximumDriveRatio",
            "drive over threshold above which a lasting drive locks the moment",
            "i_max",
            EquilibriumPlane.maximumDriveRatio(
                damping, fields.hardField(), fields.easyField(), state.plane().threshold()),
            "1"));
    list.add(
        new DerivedQuantity(
            "thermalStability",
            "thermal stability factor of the rest",
            "Delta",
            state.thermalStability(),
            "1"));
    list.add(
        new DerivedQuantity(
            "ringDownSeconds", "ring-down time at rest", "tau", state.ringDown(damping), "s"));
  }

  private static void addExtras(
      List<DerivedQuantity> list, EasyPlaneFerromagnet device, FerromagnetState state) {
    list.add(
        new DerivedQuantity(
            "saturationMagnetization",
            "saturation magnetization at this temperature",
            "M_s",
            state.magnetization(),
            "A/m"));
    list.add(
        new DerivedQuantity(
            "interfaceAnisotropy",
            "interfacial anisotropy at this temperature, trim included",
            "K_i",
            state.anisotropy(),
            "J/m^2"));
    list.add(
        new DerivedQuantity(
            "thermalFieldTesla",
            "thermal energy per moment",
            "kT/(M_s V)",
            state.thermalField(),
            "T"));
    final double perCent = 0.01;
    list.add(
        new DerivedQuantity(
            "imbalancePerPercentThickness",
            "change of the imbalance by one per cent of thickness",
            "",
            change(device, state, "thickness", perCent),
            "T"));
    list.add(
        new DerivedQuantity(
            "imbalancePerPercentAnisotropy",
            "change of the imbalance by one per cent of interfacial anisotropy",
            "",
            change(device, state, "interface-anisotropy", perCent),
            "T"));
    list.add(
        new DerivedQuantity(
            "imbalancePerPercentMagnetization",
            "change of the imbalance by one per cent of magnetization",
            "",
            change(device, state, "saturation-magnetization", perCent),
            "T"));
  }

  private static double change(
      EasyPlaneFerromagnet device, FerromagnetState state, String parameter, double part) {
    return 0.5
        * (device.scaled(parameter, 1 + part).imbalance(state.temperature())
            - device.scaled(parameter, 1 - part).imbalance(state.temperature()));
  }
}
