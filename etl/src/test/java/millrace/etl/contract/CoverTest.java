package millrace.etl.contract;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CoverTest {
  /** Beirut's clock jumps from 00:00 to 01:00 on the last Sunday of March. */
  @ParameterizedTest
  @CsvSource({
    "UTC,           2031-01-01, 2031-07-01, 2031-01-01T00:00:00Z, 2031-07-01T00:00:00Z",
    "Europe/Dublin, 2031-01-01, 2031-07-01, 2031-01-01T00:00:00Z, 2031-06-30T23:00:00Z",
    "Asia/Beirut,   2031-01-01, 2031-03-30, 2030-12-31T22:00:00Z, 2031-03-29T22:00:00Z"
  })
  void startsAndEndsWithItsLocalDays(
      String zone, LocalDate from, LocalDate to, Instant start, Instant end) {
    Cover cover = new Cover(ZoneId.of(zone), from, to);

    assertEquals(start, Instant.ofEpochSecond(cover.from()));
    assertEquals(end, Instant.ofEpochSecond(cover.to()));
  }
}
