package millrace.ui.month;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.nio.file.Path;
import java.time.YearMonth;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import millrace.analytics.risk.Attribution;
import millrace.ui.mart.Mart;
import millrace.ui.mart.MartFixture;
import millrace.ui.page.BadAddress;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class MonthFiguresTest {
  private static final YearMonth MARCH = YearMonth.of(2031, 3);

  @Test
  void sumsOneAttributionOnly(@TempDir Path folder) {
    try (Mart mart = new Mart(MartFixture.write(folder))) {
      MonthFigures figures = MonthFigures.read(mart.open(), Attribution.AT_ONSET);
      assertEquals(Optional.of(MARCH), figures.last());
      assertEquals(1, figures.hospital(MARCH).episodes());
      assertEquals(100, figures.hospital(MARCH).days());
      assertEquals(100, figures.yearBefore(MARCH).days());
      assertEquals(1.2, figures.units(MARCH).get(0).testsPerDay().orElseThrow(), 1e-12);
    }
  }

  @Test
  void readsAndWritesItsAddress() {
    MonthAddress address =
        MonthAddress.read(Map.of("m", List.of("2031-03"), "attribution", List.of("day-before")));
    assertEquals("month?m=2031-03&attribution=day-before", address.write());
    assertEquals("month?m=2031-03", address.other().write());
    assertThrows(BadAddress.class, () -> MonthAddress.read(Map.of("m", List.of("March"))));
  }
}
