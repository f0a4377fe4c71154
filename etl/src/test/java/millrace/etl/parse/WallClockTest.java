package millrace.etl.parse;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.ZonedDateTime;
import java.time.zone.ZoneOffsetTransition;
import java.time.zone.ZoneRules;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.api.Test;

class WallClockTest {
  private static final long YEAR = 31_556_952;
  private static final int THREE_HOURS = 3 * 3_600;

  @Provide
  Arbitrary<ZoneId> zones() {
    return Arbitraries.of("Europe/Dublin", "America/St_Johns", "Australia/Lord_Howe", "UTC")
        .map(ZoneId::of);
  }

  /** Somewhere from 1900 to 2100, and how far from the clock change that comes next. */
  @Provide
  Arbitrary<List<Reading>> readings() {
    Arbitrary<Long> somewhere = Arbitraries.longs().between(-70 * YEAR, 130 * YEAR);
    Arbitrary<Integer> besides =
        Arbitraries.oneOf(
            Arbitraries.integers().between(-THREE_HOURS, THREE_HOURS),
            Arbitraries.of(-3_600, -1_801, -1_800, -1, 0, 1, 1_799, 1_800, 3_599, 3_600));
    Arbitrary<Boolean> atChange = Arbitraries.of(true, false);
    return Combinators.combine(somewhere, besides, atChange)
        .as(Reading::new)
        .list()
        .ofMinSize(1)
        .ofMaxSize(12);
  }

  private record Reading(long somewhere, int besides, boolean atChange) {
    long localSecond(ZoneRules rules) {
      ZoneOffsetTransition change = rules.nextTransition(Instant.ofEpochSecond(somewhere));
      return atChange && change != null
          ? change.getDateTimeBefore().toEpochSecond(ZoneOffset.UTC) + besides
          : somewhere;
    }
  }

  private static WallClock.Meeting meeting(ZoneRules rules, LocalDateTime local) {
    return switch (rules.getValidOffsets(local).size()) {
      case 0 -> WallClock.Meeting.GAP;
      case 1 -> WallClock.Meeting.PLAIN;
      default -> WallClock.Meeting.OVERLAP;
    };
  }

  @Property(tries = 1_000)
  void readsAsJavaTimeDoes(@ForAll("zones") ZoneId zone, @ForAll("readings") List<Reading> all) {
    WallClock clock = new WallClock(zone);
    for (Reading reading : all) {
      long localSecond = reading.localSecond(zone.getRules());
      LocalDateTime local = LocalDateTime.ofEpochSecond(localSecond, 0, ZoneOffset.UTC);

      // ofLocal: the earlier offset at an overlap, forward by the gap.
      assertEquals(
          ZonedDateTime.ofLocal(local, zone, null).toEpochSecond(),
          clock.toEpochSecond(localSecond));
      assertEquals(meeting(zone.getRules(), local), clock.meeting());
    }
  }

  /** Lord Howe moves its clock by half an hour: forward on 7 October 2029, at 02:00. */
  @Test
  void aGapOfHalfAnHourMovesByHalfAnHour() {
    WallClock clock = new WallClock(ZoneId.of("Australia/Lord_Howe"));
    long local = LocalDateTime.parse("2029-10-07T02:10").toEpochSecond(ZoneOffset.UTC);

    assertEquals(
        Instant.parse("2029-10-06T15:40:00Z"), Instant.ofEpochSecond(clock.toEpochSecond(local)));
    assertEquals(WallClock.Meeting.GAP, clock.meeting());
  }
}
