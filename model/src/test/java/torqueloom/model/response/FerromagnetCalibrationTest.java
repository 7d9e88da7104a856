package torqueloom.model.response;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import torqueloom.model.device.DriveProtocol;
import torqueloom.model.device.EasyPlaneFerromagnet;
import torqueloom.model.device.Film;
import torqueloom.model.device.Gate;
import torqueloom.model.device.Outline;
import torqueloom.model.device.Readout;
import torqueloom.model.device.Shape;
import torqueloom.model.device.StripDrive;
import torqueloom.model.device.TemperatureLaw;
import torqueloom.model.table.CanonicalJson;
import torqueloom.model.tolerance.Spread;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.model.tolerance.Trim;
import torqueloom.model.work.Progress;
import torqueloom.model.work.UnitExecutor;

/** The film pinned by a bias field, coarsely calibrated: the whole path from film to library. */
@Tag("slow")
class FerromagnetCalibrationTest {
  private static final double LARGEST = 7.8e11;

  private static EasyPlaneFerromagnet pinned() {
    final TemperatureLaw law =
        new TemperatureLaw(TemperatureLaw.Magnetization.BLOCH, 1100, 2.2);
    final Film film = new Film(0.8e6, 4e-9, 1.379e-3, 0.1, 12e-12, 150e-8, law);
    final StripDrive strip =
        new StripDrive(0.25, 0, 5e-9, 50e-9, 200e-9, 200e-8, 500, 0.8, 3.2e6);
    final Readout readout =
        Readout.tunnelJunction(
            100e-12, 1.2, 0.6, 0.1, 1.4e-9, 2e9, 50, 300, 5e-15, -0.3, 0.3, 1e-12);
    return new EasyPlaneFerromagnet(
        300,
        film,
        new Outline(Shape.RECTANGLE, 200e-9, 50e-9),
        4e-3,
        strip,
        readout,
        new Gate(2e-9, 60e-15, 1e9));
  }

  private static Calibration calibration() {
    final Tolerances tolerances =
        new Tolerances(
            Map.of(
                "thickness", new Spread(0.003, 0.001),
                "interface-anisotropy", new Spread(0.003, 0.001),
                "spin-hall-angle", new Spread(0.03, 0.01)));
    return new Calibration(
        pinned(),
        new DriveProtocol(0, false, LARGEST, 0.5e-9, 10e-9),
        tolerances,
        Optional.of(new Trim(0.03e-3, 64, 300, true)),
        new CalibrationSettings(3, 12, 0.08, 256),
        List.of(300.0),
        3);
  }

  private static ResponseLibrary library(int threads) throws InterruptedException {
    return new Calibrator(calibration()).calibrate(new UnitExecutor(threads, null, Progress.NONE));
  }

  /** Derived here: without a drive nothing counts but noise, and counts grow to two or three. */
  @Test
  void filmToLibraryOnAnyNumberOfThreads() throws InterruptedException {
    final ResponseLibrary library = library(1);
    assertArrayEquals(
        CanonicalJson.bytes(LibraryFile.document(library)),
        CanonicalJson.bytes(LibraryFile.document(library(2))));
    for (final ResponseCurve curve : library.curves()) {
      assertEquals(12, curve.drive().length);
      assertTrue(curve.meanCount(0) < 0.05, "at rest " + curve.meanCount(0));
      assertTrue(curve.meanCount(11) > 1.8, "at the last drive " + curve.meanCount(11));
      for (int d = 0; d < 12; d++) {
        final boolean fine = curve.trials()[d] == 256;
        for (final int trials : curve.counts()[d]) {
          assertTrue(
              fine || WilsonInterval.of(trials, curve.trials()[d]).halfWidth() <= 0.08);
        }
      }
    }
    assertEquals(5, library.featureNames().size());
    assertTrue(library.replicaSteps() > 1_000_000);
  }
}
