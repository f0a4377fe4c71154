package millrace.analytics.stats;

import static org.junit.jupiter.api.Assertions.assertEquals;

/** Comparison with an outside value to a number of digits. */
final class Closeness {
  private Closeness() {}

  /** The difference is at most the tolerance times the expected value; 0 and infinity are exact. */
  static void assertRelative(double expected, double actual, double tolerance) {
    double allowed = Double.isInfinite(expected) ? 0 : Math.abs(expected) * tolerance;
    assertEquals(expected, actual, Math.max(allowed, Double.MIN_VALUE));
  }

  static void assertRelative(Limits expected, Limits actual, double tolerance) {
    assertRelative(expected.lower(), actual.lower(), tolerance);
    assertRelative(expected.upper(), actual.upper(), tolerance);
  }
}
