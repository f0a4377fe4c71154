package millrace.analytics.stats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ConfidenceTest {
  // R 4.2.2: qnorm(1 - (1 - conf) / 2)
  @ParameterizedTest
  @CsvSource({
    "0.9, 1.6448536269514722",
    "0.95, 1.959963984540054",
    "0.99, 2.5758293035489004",
    "0.998, 3.090232306167813"
  })
  void normalQuantileIsExactAndNotRounded(double confidence, double expected) {
    assertEquals(expected, Confidence.normalQuantile(confidence), 1e-14);
  }

  @Test
  void splitsTheRestBetweenTwoTails() {
    assertEquals(0.025, Confidence.tail(0.95), 1e-16);
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, 0.49, 1, 95, -0.95})
  void refusesWhatIsNoConfidence(double confidence) {
    assertThrows(IllegalArgumentException.class, () -> Confidence.tail(confidence));
    assertThrows(IllegalArgumentException.class, () -> Confidence.normalQuantile(confidence));
  }
}
