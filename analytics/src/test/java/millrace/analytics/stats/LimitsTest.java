package millrace.analytics.stats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class LimitsTest {
  @ParameterizedTest
  @CsvSource({"2, 1", "-1, 1", "NaN, 1", "0, NaN", "Infinity, Infinity"})
  void refusesLimitsOutOfOrder(double lower, double upper) {
    assertThrows(IllegalArgumentException.class, () -> new Limits(lower, upper));
  }

  @Test
  void unboundedAboveStaysUnboundedPerUnitOfExposure() {
    assertEquals(
        new Limits(0.5, Double.POSITIVE_INFINITY),
        new Limits(2, Double.POSITIVE_INFINITY).dividedBy(4));
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, -1, Double.NaN, Double.POSITIVE_INFINITY})
  void refusesToDivideByNoExposure(double exposure) {
    Limits limits = new Limits(1, 2);
    assertThrows(IllegalArgumentException.class, () -> limits.dividedBy(exposure));
  }
}
