package millrace.sampledata.scenario;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.Instant;
import java.time.YearMonth;
import java.time.temporal.ChronoUnit;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.LongRange;
import org.junit.jupiter.api.Test;

/** The tables of time agree with the general conversion. */
final class CalendarTest {
  private static final long EARLIEST = 1_590_000_000L;
  private static final long LATEST = 2_000_000_000L;

  @Property
  void wallClockAgrees(@ForAll @LongRange(min = EARLIEST, max = LATEST) long seconds) {
    int offset =
        Calendar.ZONE.getRules().getOffset(Instant.ofEpochSecond(seconds)).getTotalSeconds();
    assertEquals(seconds + offset, Calendar.wallSeconds(seconds));
  }

  @Property
  void startOfDayAgrees(@ForAll @LongRange(min = EARLIEST, max = LATEST) long seconds) {
    assertEquals(
        Calendar.startOf(Calendar.dateOf(seconds).plusDays(3)), Calendar.startOfDay(seconds, 3));
  }

  @Property
  void monthAgrees(@ForAll @LongRange(min = 0, max = 63_000_000) long secondsCovered) {
    long seconds = Calendar.FROM + secondsCovered;
    YearMonth month = YearMonth.from(Calendar.dateOf(seconds));
    assertEquals(
        ChronoUnit.MONTHS.between(YearMonth.from(Calendar.COVERS_FROM), month),
        Calendar.monthOf(seconds));
  }

  @Test
  void clockChangesAreInTheirHour() {
    long autumn = Instant.parse("2029-10-28T01:00:00Z").getEpochSecond();
    assertEquals(autumn - 1 + 3600, Calendar.wallSeconds(autumn - 1));
    assertEquals(autumn, Calendar.wallSeconds(autumn));
    long spring = Instant.parse("2030-03-31T01:00:00Z").getEpochSecond();
    assertEquals(spring - 1, Calendar.wallSeconds(spring - 1));
    assertEquals(spring + 3600, Calendar.wallSeconds(spring));
  }

  @Test
  void monthsOutsideCoverageHaveNoNumberOfTheirOwn() {
    assertEquals(-1, Calendar.monthOf(Calendar.FROM - 1));
    assertEquals(0, Calendar.monthOf(Calendar.FROM));
    assertEquals(Calendar.MONTHS - 1, Calendar.monthOf(Calendar.TO - 1));
    assertEquals(Calendar.MONTHS, Calendar.monthOf(Calendar.TO));
  }
}
