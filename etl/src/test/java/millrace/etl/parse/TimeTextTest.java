package millrace.etl.parse;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.ZonedDateTime;
import java.time.format.DateTimeFormatter;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class TimeTextTest {
  private static final ZoneId DUBLIN = ZoneId.of("Europe/Dublin");

  private final TimeText times = new TimeText(new WallClock(DUBLIN));

  private TimeText.Outcome read(String text) {
    // Neighbours on both sides: nothing beyond the field may be read.
    byte[] bytes = ("9" + text + "9").getBytes(StandardCharsets.UTF_8);
    return times.read(bytes, 1, bytes.length - 1);
  }

  @ParameterizedTest
  @CsvSource({
    "2031-01-15T08:30,              2031-01-15T08:30:00Z",
    "2031-07-15T08:30,              2031-07-15T07:30:00Z",
    "2031-07-15 08:30,              2031-07-15T07:30:00Z",
    "2031-01-15T08:30:59,           2031-01-15T08:30:59Z",
    "2031-01-15 08:30:59.1,         2031-01-15T08:30:59Z",
    "2031-01-15T08:30:59.999,       2031-01-15T08:30:59Z",
    "2031-01-15T08:30:59.999999999, 2031-01-15T08:30:59Z",
    "2031-07-15T08:30Z,             2031-07-15T08:30:00Z",
    "2031-07-15T08:30:01Z,          2031-07-15T08:30:01Z",
    "2031-07-15T08:30:01.5Z,        2031-07-15T08:30:01Z",
    "2031-07-15T08:30+02:00,        2031-07-15T06:30:00Z",
    "2031-07-15T08:30:10-03:30,     2031-07-15T12:00:10Z",
    "2031-07-15T08:30:10.25+0545,   2031-07-15T02:45:10Z",
    "2031-07-15T08:30+05,           2031-07-15T03:30:00Z",
    "2031-07-15T08:30-00:00,        2031-07-15T08:30:00Z",
    "2031-01-01T00:00,              2031-01-01T00:00:00Z",
    "2031-12-31T23:59:59,           2031-12-31T23:59:59Z",
    "2032-02-29T12:00,              2032-02-29T12:00:00Z",
    "2000-02-29T12:00,              2000-02-29T12:00:00Z",
    "1969-12-31T22:59:59,           1969-12-31T21:59:59Z"
  })
  void isTheInstantOf(String text, Instant instant) {
    assertEquals(TimeText.Outcome.TIME, read(text));
    assertEquals(instant, Instant.ofEpochSecond(times.epochSecond()));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "2031",
        "2031-01",
        "2031-1-15",
        "20310115",
        "15/01/2031",
        "2031/01/15",
        "2031-00-15",
        "2031-13-15",
        "2031-01-00",
        "2031-01-32",
        "2031-04-31T08:00",
        "2031-02-29",
        "2100-02-29",
        "-031-01-15",
        "2031-01-15T",
        "2031-01-15T08",
        "2031-01-15T8:30",
        "2031-01-15T08-30",
        "2031-01-15T0830",
        "2031-01-15t08:30",
        "2031-01-15_08:30",
        "2031-01-15  08:30",
        "2031-01-15T24:00",
        "2031-01-15T08:60",
        "2031-01-15T08:30:60",
        "2031-01-15T08:30:",
        "2031-01-15T08:30:5",
        "2031-01-15T08:30:05.",
        "2031-01-15T08:30:05,5",
        "2031-01-15T08:30.5",
        "2031-01-15T08:30z",
        "2031-01-15T08:30 Z",
        "2031-01-15T08:30ZZ",
        "2031-01-15T08:30+",
        "2031-01-15T08:30+5",
        "2031-01-15T08:30+5:30",
        "2031-01-15T08:30+05:3",
        "2031-01-15T08:30+05:60",
        "2031-01-15T08:30+19:00",
        "2031-01-15T08:30+05:30:00",
        "2031-01-15T08:30 pm",
        "2031-01-15T08:30:15x",
        "2031-01-15T08:30[UTC]",
        "now"
      })
  void refuses(String text) {
    assertEquals(TimeText.Outcome.UNREADABLE, read(text));
  }

  @Property(tries = 500)
  void aBareDateIsItsDay(@ForAll @IntRange(min = -200_000, max = 200_000) int day) {
    LocalDate date = LocalDate.ofEpochDay(day);

    assertEquals(TimeText.Outcome.BARE_DATE, read(date.toString()));
    assertEquals(day, times.epochDay());
  }

  @Property(tries = 1_000)
  void agreesWithJavaTime(
      @ForAll @IntRange(min = -2_000_000_000) int epochSecond,
      @ForAll @IntRange(min = -1_080, max = 1_080) int offsetMinutes) {
    LocalDateTime local = LocalDateTime.ofEpochSecond(epochSecond, 0, ZoneOffset.UTC);
    String text = local.format(DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss"));
    ZoneOffset offset = ZoneOffset.ofTotalSeconds(offsetMinutes * 60);

    assertEquals(TimeText.Outcome.TIME, read(text));
    assertEquals(ZonedDateTime.ofLocal(local, DUBLIN, null).toEpochSecond(), times.epochSecond());
    assertEquals(
        TimeText.Outcome.TIME, read(text + DateTimeFormatter.ofPattern("xxx").format(offset)));
    assertEquals(local.toEpochSecond(offset), times.epochSecond());
  }

  /** Dublin's clocks change on 30 March and 26 October 2031 at 01:00 UTC. */
  @ParameterizedTest
  @CsvSource({
    "2031-03-30T00:59:59, PLAIN,   2031-03-30T00:59:59Z",
    "2031-03-30T01:00,    GAP,     2031-03-30T01:00:00Z",
    "2031-03-30T01:59:59, GAP,     2031-03-30T01:59:59Z",
    "2031-03-30T02:00,    PLAIN,   2031-03-30T01:00:00Z",
    "2031-10-26T00:59:59, PLAIN,   2031-10-25T23:59:59Z",
    "2031-10-26T01:00,    OVERLAP, 2031-10-26T00:00:00Z",
    "2031-10-26T01:59:59, OVERLAP, 2031-10-26T00:59:59Z",
    "2031-10-26T02:00,    PLAIN,   2031-10-26T02:00:00Z",
    "2031-10-26T01:30Z,   PLAIN,   2031-10-26T01:30:00Z"
  })
  void tellsWhatTheClockDid(String text, WallClock.Meeting meeting, Instant instant) {
    assertEquals(TimeText.Outcome.TIME, read(text));
    assertEquals(meeting, times.meeting());
    assertEquals(instant, Instant.ofEpochSecond(times.epochSecond()));
  }

  @Test
  void aMeetingIsForgottenAtTheNextText() {
    read("2031-10-26T01:30");
    assertEquals(WallClock.Meeting.OVERLAP, times.meeting());

    read("2031-10-26");
    assertEquals(WallClock.Meeting.PLAIN, times.meeting());
  }
}
