package torqueloom.app.study;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NearestNameTest {
  private static final List<String> KNOWN = List.of("damping", "thickness", "spin-hall-angle");

  @ParameterizedTest
  @CsvSource({
    "dampng, damping",
    "Damping, damping",
    "thikcness, thickness",
    "spin_hall_angle, spin-hall-angle",
    "hello-world, ''",
    "xy, ''"
  })
  void findsWhatWasMeant(String written, String meant) {
    assertEquals(meant, NearestName.of(written, KNOWN).orElse(""));
  }

  /** Counted by hand. */
  @Test
  void countsEdits() {
    assertEquals(0, NearestName.distance("abc", "abc"));
    assertEquals(1, NearestName.distance("abc", "acb"));
    assertEquals(3, NearestName.distance("kitten", "sitting"));
    assertEquals(3, NearestName.distance("", "abc"));
  }
}
