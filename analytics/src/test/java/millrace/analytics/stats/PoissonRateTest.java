package millrace.analytics.stats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class PoissonRateTest {
  static Stream<GoldenTable.Row> golden() {
    return GoldenTable.read("poisson_ci.csv").rows();
  }

  @ParameterizedTest
  @MethodSource("golden")
  void rateAndExactLimitsAreThoseOfR(GoldenTable.Row row) {
    PoissonRate rate = new PoissonRate(row.count("events"), row.number("exposure"));

    Closeness.assertRelative(row.number("rate"), rate.value().orElseThrow(), 1e-12);
    Closeness.assertRelative(
        new Limits(row.number("garwood_lo"), row.number("garwood_hi")),
        rate.limits(row.number("conf")).orElseThrow(),
        1e-12);
  }

  // Garwood 1936, Ulm 1990. Upper limit of 0: help of epitools::pois.exact; the others R and scipy.
  @ParameterizedTest
  @CsvSource({
    "0, 0, 3.6889",
    "1, 0.0253, 5.5716",
    "2, 0.2422, 7.2247",
    "3, 0.6187, 8.7673",
    "4, 1.0899, 10.2416",
    "5, 1.6235, 11.6683",
    "10, 4.7954, 18.3904",
    "20, 12.2165, 30.8884",
    "25, 16.1787, 36.9049",
    "30, 20.2409, 42.8269",
    "50, 37.1110, 65.9188",
    "100, 81.3640, 121.6268"
  })
  void exactLimitsOfACountAreThePublishedOnes(long events, double lower, double upper) {
    Limits limits = PoissonRate.garwood(events, 0.95);

    assertEquals(lower, limits.lower(), 0.00005);
    assertEquals(upper, limits.upper(), 0.00005);
  }

  // Table II of PMC4715601. The printed ratio has two decimals, so the expected count is rough.
  @ParameterizedTest
  @CsvSource({
    "1, 0.42, 0.01, 2.35",
    "7, 0.29, 0.12, 0.60",
    "25, 0.49, 0.32, 0.73",
    "70, 0.46, 0.36, 0.58",
    "330, 0.43, 0.39, 0.48"
  })
  void limitsOfAMortalityRatioAreThePublishedOnes(
      long deaths, double ratio, double lower, double upper) {
    Limits limits = new PoissonRate(deaths, deaths / ratio).limits(0.95).orElseThrow();

    assertEquals(lower, limits.lower(), 0.015);
    assertEquals(upper, limits.upper(), 0.015);
  }

  // First row: OpenEpi, person-time, stratum 1, per 100,000; OpenEpi prints Byar's approximation as
  // its lower limit (9.895), the exact one is from mpmath 1.3.0. Others: R, per 1,000 patient-days.
  @ParameterizedTest
  @CsvSource({
    "17, 1.00025, 16.996, 9.901, 27.212, 0.0005",
    "4, 1.25, 3.20, 0.872, 8.193, 0.0005",
    "0, 0.8, 0, 0, 4.611, 0.0005",
    "12, 3.4, 3.529, 1.824, 6.165, 0.0005"
  })
  void rateIsPerUnitOfExposure(
      long events, double exposure, double value, double lower, double upper, double tolerance) {
    PoissonRate rate = new PoissonRate(events, exposure);
    Limits limits = rate.limits(0.95).orElseThrow();

    assertEquals(value, rate.value().orElseThrow(), tolerance);
    assertEquals(lower, limits.lower(), tolerance);
    assertEquals(upper, limits.upper(), tolerance);
  }

  @Test
  void withoutExposureThereIsNoRate() {
    PoissonRate rate = new PoissonRate(0, 0);

    assertEquals(OptionalDouble.empty(), rate.value());
    assertEquals(Optional.empty(), rate.limits(0.95));
  }

  @ParameterizedTest
  @ValueSource(doubles = {-1, 1e-101, Double.NaN, Double.POSITIVE_INFINITY})
  void refusesAnExposureThatIsNone(double exposure) {
    String message =
        assertThrows(IllegalArgumentException.class, () -> new PoissonRate(1, exposure))
            .getMessage();

    assertTrue(message.contains(Double.toString(exposure)), message);
  }

  @ParameterizedTest
  @ValueSource(longs = {-1, 1_000_000_001, Long.MAX_VALUE})
  void refusesACountOutOfRange(long events) {
    assertThrows(IllegalArgumentException.class, () -> new PoissonRate(events, 1));
    assertThrows(IllegalArgumentException.class, () -> PoissonRate.garwood(events, 0.95));
  }

  /** So many events are all but normal: the limits are the count and 1.96 of its roots. */
  @Test
  void takesAThousandMillionEvents() {
    Limits limits = PoissonRate.garwood(1_000_000_000, 0.95);

    assertEquals(1_000_000_000 - 61_979.5, limits.lower(), 2);
    assertEquals(1_000_000_000 + 61_979.5, limits.upper(), 3);
  }
}
