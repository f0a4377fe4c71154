package millrace.analytics.stats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class MantelHaenszelRateRatioTest {
  // Doll and Hill 1966 as in Rothman and Greenland, Modern Epidemiology, 2nd ed. 1998.
  private static final List<PersonTimeTable> BRITISH_DOCTORS =
      List.of(
          new PersonTimeTable(32, 52407, 2, 18790),
          new PersonTimeTable(104, 43248, 12, 10673),
          new PersonTimeTable(206, 28612, 28, 5710),
          new PersonTimeTable(186, 12663, 28, 2585),
          new PersonTimeTable(102, 5317, 31, 1462));

  static Stream<GoldenTable.Row> golden() {
    return GoldenTable.read("mh_rate_results.csv").rows();
  }

  private static MantelHaenszelRateRatio of(GoldenTable.Row result) {
    return MantelHaenszelRateRatio.of(
        GoldenTable.read("mh_rate_strata.csv")
            .rows()
            .filter(row -> row.text("dataset").equals(result.text("dataset")))
            .map(
                row ->
                    new PersonTimeTable(
                        row.count("a"), row.number("t1"), row.count("b"), row.number("t0")))
            .toList());
  }

  @ParameterizedTest
  @MethodSource("golden")
  void ratioIsThatOfR(GoldenTable.Row row) {
    Closeness.assertRelative(row.number("irr_mh"), of(row).ratio().orElseThrow(), 1e-12);
  }

  @ParameterizedTest
  @MethodSource("golden")
  void limitsAreThoseOfROrEmpty(GoldenTable.Row row) {
    Optional<Limits> limits = of(row).limits();

    assertEquals(row.defined("lo95"), limits.isPresent());
    limits.ifPresent(
        found ->
            Closeness.assertRelative(
                new Limits(row.number("lo95"), row.number("hi95")), found, 1e-12));
  }

  @Test
  void britishDoctorsHaveThePublishedRatio() {
    MantelHaenszelRateRatio found = MantelHaenszelRateRatio.of(BRITISH_DOCTORS);

    assertEquals(1.424682, found.ratio().orElseThrow(), 5e-7);
    assertEquals(1.154703, found.limits().orElseThrow().lower(), 5e-7);
    assertEquals(1.757784, found.limits().orElseThrow().upper(), 5e-7);
  }

  // Strata of OpenEpi's person-time page; combined ratio from R.
  @Test
  void twoStrataAreCombined() {
    MantelHaenszelRateRatio found =
        MantelHaenszelRateRatio.of(
            List.of(
                new PersonTimeTable(17, 100025, 3, 122268),
                new PersonTimeTable(8, 78531, 1, 77932)));

    assertEquals(7.2011, found.ratio().orElseThrow(), 5e-5);
  }

  @Test
  void oneStratumGivesItsOwnRatio() {
    PersonTimeTable stratum = BRITISH_DOCTORS.get(2);

    Closeness.assertRelative(
        RateRatio.of(stratum, 0.95).ratio().orElseThrow(),
        MantelHaenszelRateRatio.of(List.of(stratum)).ratio().orElseThrow(),
        1e-14);
  }

  @Test
  void aStratumWithoutTimeContributesNothing() {
    List<PersonTimeTable> withEmpty =
        Stream.concat(BRITISH_DOCTORS.stream(), Stream.of(new PersonTimeTable(3, 0, 2, 0)))
            .toList();

    assertEquals(
        MantelHaenszelRateRatio.of(BRITISH_DOCTORS), MantelHaenszelRateRatio.of(withEmpty));
  }

  @Test
  void withoutExposedEventsTheRatioIsZeroAndHasNoLimits() {
    assertEquals(
        new MantelHaenszelRateRatio(OptionalDouble.of(0), Optional.empty()),
        MantelHaenszelRateRatio.of(List.of(new PersonTimeTable(0, 10, 4, 20))));
  }

  @Test
  void withoutUnexposedEventsOrStrataThereIsNoRatio() {
    MantelHaenszelRateRatio undefined =
        new MantelHaenszelRateRatio(OptionalDouble.empty(), Optional.empty());

    assertEquals(undefined, MantelHaenszelRateRatio.of(List.of(new PersonTimeTable(4, 10, 0, 20))));
    assertEquals(undefined, MantelHaenszelRateRatio.of(List.of()));
  }

  @Test
  void refusesWhatIsNoConfidence() {
    assertThrows(
        IllegalArgumentException.class, () -> MantelHaenszelRateRatio.of(BRITISH_DOCTORS, 0.2));
  }
}
