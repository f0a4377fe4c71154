package millrace.analytics.stats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class RateRatioTest {
  static Stream<GoldenTable.Row> golden() {
    return GoldenTable.read("rate_ratio.csv").rows();
  }

  private static RateRatio of(GoldenTable.Row row) {
    return RateRatio.of(
        new PersonTimeTable(row.count("a"), row.number("t1"), row.count("b"), row.number("t0")),
        row.number("conf"));
  }

  @ParameterizedTest
  @MethodSource("golden")
  void exactLimitsAreThoseOfR(GoldenTable.Row row) {
    Closeness.assertRelative(
        new Limits(row.number("exact_lo"), row.number("exact_hi")), of(row).exact(), 1e-11);
  }

  /** Without any event R has no mid-P limits; here they are 0 and infinity, as the exact ones. */
  @ParameterizedTest
  @MethodSource("golden")
  void midPLimitsAreThoseOfR(GoldenTable.Row row) {
    Limits expected =
        row.defined("midp_lo")
            ? new Limits(row.number("midp_lo"), row.number("midp_hi"))
            : Limits.UNBOUNDED;

    Closeness.assertRelative(expected, of(row).midP(), 1e-11);
  }

  @ParameterizedTest
  @MethodSource("golden")
  void midPValueIsThatOfR(GoldenTable.Row row) {
    Closeness.assertRelative(row.number("p_mid"), of(row).pMid(), 1e-11);
  }

  @ParameterizedTest
  @MethodSource("golden")
  void ratioIsThatOfTheRatesOrEmptyWithoutAnEvent(GoldenTable.Row row) {
    OptionalDouble ratio = of(row).ratio();

    assertEquals(row.defined("ratio"), ratio.isPresent());
    if (ratio.isPresent()) {
      Closeness.assertRelative(row.number("ratio"), ratio.getAsDouble(), 1e-14);
    }
  }

  // 1: Stata's incidence-rate calculator page (exact), R (mid-P); 2 to 4: OpenEpi, person-time, two
  // strata and crude; 5: rates from OpenEpi's note (Sullivan), limits R. Last digit as printed.
  @ParameterizedTest
  @CsvSource({
    "41, 28010, 15, 19017, 1.855759, 1.005684, 3.6093, 1.0411, 3.4494, 5e-5",
    "17, 100025, 3, 122268, 6.927, 2.004, 36.89, 2.21, 29.63, 5e-3",
    "8, 78531, 1, 77932, 7.939, 1.064, 352.3, 1.27, 177.6, 5e-2",
    "25, 178556, 4, 200200, 7.008, 2.42, 27.71, 2.616, 23.57, 5e-3",
    "21, 182, 9, 359, 4.60, 2.021, 11.415, 2.139, 10.566, 5e-3"
  })
  void ratioAndLimitsAreThePublishedOnes(
      long exposed,
      double exposedTime,
      long unexposed,
      double unexposedTime,
      double ratio,
      double exactLower,
      double exactUpper,
      double midPLower,
      double midPUpper,
      double tolerance) {
    RateRatio found = RateRatio.of(exposed, exposedTime, unexposed, unexposedTime);

    assertEquals(ratio, found.ratio().orElseThrow(), tolerance);
    assertEquals(exactLower, found.exact().lower(), tolerance);
    assertEquals(exactUpper, found.exact().upper(), tolerance);
    assertEquals(midPLower, found.midP().lower(), tolerance);
    assertEquals(midPUpper, found.midP().upper(), tolerance);
  }

  // 1: Stata's incidence-rate calculator page, two-sided; 2 to 4: OpenEpi, person-time.
  @ParameterizedTest
  @CsvSource({
    "41, 28010, 15, 19017, 0.0355, 5e-5",
    "17, 100025, 3, 122268, 0.0003127, 5e-8",
    "8, 78531, 1, 77932, 0.02210, 5e-6",
    "25, 178556, 4, 200200, 0.00001654, 5e-9"
  })
  void midPValueIsThePublishedOne(
      long exposed,
      double exposedTime,
      long unexposed,
      double unexposedTime,
      double expected,
      double tolerance) {
    RateRatio found = RateRatio.of(exposed, exposedTime, unexposed, unexposedTime);

    assertEquals(expected, found.pMid(), tolerance);
  }

  // mpmath 1.3.0, 60 digits: findroot on log(betainc(..., regularized=True)).
  @ParameterizedTest
  @CsvSource({
    "1000000, 1e9, 1, 1e-6,"
        + " 1.7947984894489471e-10, 3.9497929203097381e-8, 2.0276285457635646e-10,"
        + " 1.9991884391501687e-8, 1.000000999999999e-9",
    "1, 1e9, 1000000, 1e-6,"
        + " 2.5317782987002293e-23, 5.5716561267389279e-21, 5.002029725747554e-23,"
        + " 4.9318698047004452e-21, 0",
    "0, 1e-6, 1000000, 1e9, 0, 3688886258.0381154, 0, 2995736760.7643985, 0.999999999",
    "3, 2.5, 1000000, 1e6, 0.24746843077237612, 3.506919340561237, 0.30523805605485007,"
        + " 3.2657956776097896, 0.69861136555119304"
  })
  void keepsItsDigitsForCountsAndTimesFarApart(
      long exposed,
      double exposedTime,
      long unexposed,
      double unexposedTime,
      double exactLower,
      double exactUpper,
      double midPLower,
      double midPUpper,
      double pMid) {
    RateRatio found = RateRatio.of(exposed, exposedTime, unexposed, unexposedTime);

    Closeness.assertRelative(new Limits(exactLower, exactUpper), found.exact(), 1e-11);
    Closeness.assertRelative(new Limits(midPLower, midPUpper), found.midP(), 1e-11);
    Closeness.assertRelative(pMid, found.pMid(), 1e-11);
  }

  @Test
  void withoutAnExposedEventRatioAndLowerLimitsAreZero() {
    RateRatio found = RateRatio.of(0, 100, 5, 120);

    assertEquals(0, found.ratio().orElseThrow());
    assertEquals(0, found.exact().lower());
    assertEquals(0, found.midP().lower());
  }

  @Test
  void withoutAnUnexposedEventRatioAndUpperLimitsAreInfinite() {
    RateRatio found = RateRatio.of(5, 100, 0, 120);

    assertEquals(Double.POSITIVE_INFINITY, found.ratio().orElseThrow());
    assertEquals(Double.POSITIVE_INFINITY, found.exact().upper());
    assertEquals(Double.POSITIVE_INFINITY, found.midP().upper());
  }

  @ParameterizedTest
  @CsvSource({"0, 100, 0, 100", "0, 0, 5, 100", "5, 0, 5, 100", "5, 100, 0, 0", "0, 0, 0, 0"})
  void withoutAnEventOrWithoutTimeOnOneSideThereIsNothingToCompare(
      long exposed, double exposedTime, long unexposed, double unexposedTime) {
    RateRatio found = RateRatio.of(exposed, exposedTime, unexposed, unexposedTime);

    assertEquals(
        new RateRatio(OptionalDouble.empty(), Limits.UNBOUNDED, Limits.UNBOUNDED, 1), found);
  }

  @Test
  void refusesWhatIsNoConfidenceEvenWithNothingToCompare() {
    PersonTimeTable table = new PersonTimeTable(0, 0, 0, 0);
    assertThrows(IllegalArgumentException.class, () -> RateRatio.of(table, 1));
  }
}
