package torqueloom.app.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import torqueloom.model.device.DeviceSummary;

/** Whatever the ranges of the schema allow, the device can be summarized. */
class RangesTest {
  private static final int DRAWS = 150;
  private static final long SEED = 9;

  @TempDir Path folder;

  @Test
  void everyAllowedDeviceIsSummarized() throws IOException {
    final SplittableRandom random = new SplittableRandom(SEED);
    final List<String> failures = new ArrayList<>();
    int read = 0;
    for (int i = 0; i < DRAWS; i++) {
      final String text = study(random);
      try {
        final Study study =
            StudyFile.read(Studies.write(folder, text), Use.DEVICE, OptionalLong.empty());
        final DeviceSummary summary = study.summary();
        assertTrue(summary.number("thresholdTesla").isPresent());
        read++;
      } catch (StudyException expected) {
        // A rule over several keys, such as slot and pulse.
      } catch (RuntimeException e) {
        failures.add(e + " from\n" + text);
      }
    }
    assertEquals(List.of(), failures);
    assertTrue(read > DRAWS / 10, "only " + read + " studies were read");
  }

  private static String study(SplittableRandom random) {
    final StringBuilder text = new StringBuilder("torqueloom: 1\n");
    block(text, "", StudySchema.find("device").orElseThrow(), random);
    return text + "protocol: {maximum-drive: 5e11 A/m^2, pulse: 0.5 ns, slot: 2 ns}\n";
  }

  private static void block(StringBuilder text, String indent, Key key, SplittableRandom random) {
    final String value = value(key.type(), random);
    final List<Key> inner = StudySchema.inner(key.type());
    if (value != null && (key.required() || random.nextBoolean())) {
      text.append(indent).append(key.name()).append(": ").append(value).append('\n');
    } else if (!inner.isEmpty()) {
      text.append(indent).append(key.name()).append(":\n");
      for (final Key each : inner) {
        block(text, indent + "  ", each, random);
      }
      text.append(indent).append("  # end\n");
    }
  }

  /** A value in SI within the bounds, spread over their decades. */
  private static String value(ValueType type, SplittableRandom random) {
    if (type instanceof ValueType.Choice choice) {
      return choice.supported().get(random.nextInt(choice.supported().size()));
    }
    if (!(type instanceof ValueType.Quantity quantity)) {
      return null;
    }
    final double high = quantity.bounds().get(1).limit();
    final double low = quantity.bounds().get(0).limit();
    final double from = low > 0 ? low : high * 1e-6;
    final double share = random.nextDouble();
    final double value =
        low < 0 ? high * Math.pow(2 * share - 1, 5) : from * Math.pow(high / from, share);
    return value + " " + unit(quantity);
  }

  private static String unit(ValueType.Quantity quantity) {
    return switch (quantity.kind()) {
      case RATIO -> "";
      case LENGTH -> "m";
      case TIME -> "s";
      case FREQUENCY -> "Hz";
      case TEMPERATURE -> "K";
      case FIELD -> "T";
      case MAGNETIZATION -> "A/m";
      case SURFACE_ENERGY -> "J/m^2";
      case EXCHANGE -> "J/m";
      case CURRENT -> "A";
      case CURRENT_DENSITY -> "A/m^2";
      case VOLTAGE -> "V";
      case ELECTRIC_FIELD -> "V/m";
      case VOLTAGE_COEFFICIENT -> "J/(V m)";
      case RESISTANCE -> "ohm";
      case RESISTIVITY -> "ohm m";
      case RESISTANCE_AREA -> "ohm m^2";
      case CAPACITANCE -> "F";
      case ENERGY -> "J";
      case THERMAL_RESISTANCE -> "K/W";
      default -> throw new IllegalStateException("no unit for " + quantity.kind());
    };
  }
}
