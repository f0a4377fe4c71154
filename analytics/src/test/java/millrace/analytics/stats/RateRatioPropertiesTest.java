package millrace.analytics.stats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;

class RateRatioPropertiesTest {
  private static final double TOLERANCE = 1e-11;

  /** Counts small and large, times over fifteen powers of ten, at least one event. */
  @Provide
  Arbitrary<PersonTimeTable> tables() {
    Arbitrary<Long> counts =
        Arbitraries.oneOf(
            Arbitraries.longs().between(0, 20), Arbitraries.longs().between(0, 1_000_000));
    Arbitrary<Double> times =
        Arbitraries.doubles().between(-6, 9).map(power -> Math.pow(10, power));
    return Combinators.combine(counts, times, counts, times)
        .as(PersonTimeTable::new)
        .filter(PersonTimeTable::compares);
  }

  private static RateRatio of(PersonTimeTable table) {
    return RateRatio.of(table, 0.95);
  }

  private static Limits reciprocal(Limits limits) {
    return new Limits(1 / limits.upper(), 1 / limits.lower());
  }

  private static boolean bounded(Limits limits) {
    return limits.lower() > 0;
  }

  @Property(tries = 300)
  void swappingTheSidesInvertsTheRatio(@ForAll("tables") PersonTimeTable table) {
    RateRatio straight = of(table);
    RateRatio swapped = of(table.swapped());

    Closeness.assertRelative(
        1 / straight.ratio().orElseThrow(), swapped.ratio().orElseThrow(), TOLERANCE);
    assertEquals(straight.pMid(), swapped.pMid(), straight.pMid() * TOLERANCE);
    assertEquals(table.exposedEvents() > 0, bounded(straight.exact()));
    if (bounded(straight.exact())) {
      Closeness.assertRelative(reciprocal(straight.exact()), swapped.exact(), TOLERANCE);
      Closeness.assertRelative(reciprocal(straight.midP()), swapped.midP(), TOLERANCE);
    }
  }

  @Property(tries = 300)
  void unitOfTimeDoesNotMatter(
      @ForAll("tables") PersonTimeTable table,
      @ForAll @DoubleRange(min = 0.01, max = 86_400) double unit) {
    RateRatio before = of(table);
    RateRatio after =
        of(
            new PersonTimeTable(
                table.exposedEvents(),
                table.exposedTime() * unit,
                table.unexposedEvents(),
                table.unexposedTime() * unit));

    Closeness.assertRelative(before.ratio().orElseThrow(), after.ratio().orElseThrow(), TOLERANCE);
    Closeness.assertRelative(before.exact(), after.exact(), TOLERANCE);
    Closeness.assertRelative(before.midP(), after.midP(), TOLERANCE);
  }

  @Property(tries = 300)
  void oneMoreExposedEventRaisesTheLimits(@ForAll("tables") PersonTimeTable table) {
    RateRatio fewer = of(table);
    RateRatio more =
        of(
            new PersonTimeTable(
                table.exposedEvents() + 1,
                table.exposedTime(),
                table.unexposedEvents(),
                table.unexposedTime()));

    assertRaised(fewer.exact(), more.exact());
    assertRaised(fewer.midP(), more.midP());
  }

  private static void assertRaised(Limits fewer, Limits more) {
    assertTrue(more.lower() > fewer.lower(), () -> fewer + " " + more);
    assertTrue(
        Double.isInfinite(fewer.upper())
            ? Double.isInfinite(more.upper())
            : more.upper() > fewer.upper(),
        () -> fewer + " " + more);
  }

  @Property(tries = 300)
  void midPLimitsLieInsideTheExactOnes(@ForAll("tables") PersonTimeTable table) {
    RateRatio found = of(table);

    assertTrue(
        table.exposedEvents() == 0 || found.midP().lower() > found.exact().lower(),
        found::toString);
    assertTrue(
        table.unexposedEvents() == 0 || found.midP().upper() < found.exact().upper(),
        found::toString);
  }

  @Property(tries = 300)
  void midPLimitsExcludeOneExactlyWhenTheMidPValueIsBelowFivePercent(
      @ForAll("tables") PersonTimeTable table) {
    RateRatio found = of(table);
    boolean excluded = found.midP().lower() > 1 || found.midP().upper() < 1;

    assertEquals(found.pMid() < 0.05, excluded, found::toString);
  }
}
