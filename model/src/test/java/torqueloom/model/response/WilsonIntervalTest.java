package torqueloom.model.response;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WilsonIntervalTest {
  /** R. G. Newcombe, Stat. Med. 17, 857 (1998), worked cases, more digits computed from the formula. */
  @ParameterizedTest(name = "{0}/{1}")
  @CsvSource({
    "81, 263, 0.25528852, 0.36620958",
    "15, 148, 0.06238640, 0.16048724",
    "0, 20, 0, 0.16112516",
    "1, 29, 0.00611321, 0.17175522",
    "950, 1000, 0.93468618, 0.96186974"
  })
  void matchesNewcombe(int successes, int trials, double low, double high) {
    final WilsonInterval interval = WilsonInterval.of(successes, trials);
    assertEquals(low, interval.low(), 5e-9);
    assertEquals(high, interval.high(), 5e-9);
  }
}
