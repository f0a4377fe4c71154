package millrace.ui.episodes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.net.URLDecoder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.YearMonth;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.risk.Attribution;
import millrace.ui.mart.Mart;
import millrace.ui.mart.MartFixture;
import millrace.ui.mart.Run;
import millrace.ui.page.BadAddress;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class EpisodeFilterTest {
  @Test
  void readsWhatItWrites() {
    EpisodeFilter filter =
        EpisodeFilter.countedIn(YearMonth.of(2031, 3))
            .in("unit 6 & east", Attribution.DAY_BEFORE)
            .ofStage("2+");
    assertEquals(filter, EpisodeFilter.read(values(filter.write())));
    EpisodeFilter drug = EpisodeFilter.countedAfter("mTOR inhibitor", false);
    assertEquals(drug, EpisodeFilter.read(values(drug.write())));
    assertEquals("episodes", EpisodeFilter.all().write());
  }

  @Test
  void refusesWhatItCannotRead() {
    assertThrows(BadAddress.class, () -> EpisodeFilter.read(Map.of("month", List.of("2031-13"))));
    assertThrows(BadAddress.class, () -> EpisodeFilter.read(Map.of("stage", List.of("4"))));
    assertThrows(BadAddress.class, () -> EpisodeFilter.read(Map.of("patient", List.of("p"))));
    assertThrows(BadAddress.class, () -> EpisodeFilter.read(Map.of("unit", List.of("a", "b"))));
  }

  @Test
  void countsWhatTheRatesCount(@TempDir Path folder) {
    try (Mart mart = new Mart(MartFixture.write(folder))) {
      Run run = mart.open();
      EpisodeFilter march = EpisodeFilter.countedIn(YearMonth.of(2031, 3));
      assertEquals(1, count(run, march.in("u1", Attribution.AT_ONSET).ofStage("2+")));
      assertEquals(0, count(run, march.ofStage("3")));
      assertEquals(1, count(run, EpisodeFilter.countedAfter("aminoglycoside", true)));
      assertEquals(0, count(run, EpisodeFilter.countedAfter("aminoglycoside", false)));
      assertEquals(2, count(run, EpisodeFilter.all()));
    }
  }

  private static int count(Run run, EpisodeFilter filter) {
    return run.count(EpisodeRow.class, filter.condition());
  }

  private static Map<String, List<String>> values(String address) {
    return Arrays.stream(address.substring(address.indexOf('?') + 1).split("&"))
        .map(pair -> pair.split("=", 2))
        .collect(
            Collectors.toMap(
                pair -> pair[0],
                pair -> List.of(URLDecoder.decode(pair[1], StandardCharsets.UTF_8))));
  }
}
