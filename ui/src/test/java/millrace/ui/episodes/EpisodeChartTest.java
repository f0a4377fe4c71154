package millrace.ui.episodes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import millrace.ui.mart.Mart;
import millrace.ui.mart.MartFixture;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class EpisodeChartTest {
  @TempDir Path folder;
  private EpisodeData data;

  @BeforeEach
  void read() {
    try (Mart mart = new Mart(MartFixture.write(folder))) {
      data = EpisodeData.read(mart.open(), "e-0-1").orElseThrow();
    }
  }

  @Test
  void allPanelsShareOneAxisOfTime() {
    JsonNode options = new EpisodeChart(data, Creatinine.MG, new Clock("UTC")).options();
    assertEquals(4, options.get("grid").size());
    for (JsonNode axis : options.get("xAxis")) {
      assertEquals(options.at("/xAxis/0/min"), axis.get("min"));
      assertEquals(options.at("/xAxis/0/max"), axis.get("max"));
    }
    assertTrue(options.toString().contains("onset 1.47"), "the onset is named with its value");
    assertTrue(options.toString().contains("closes 1.02"), "the closing is named with its value");
  }

  @Test
  void saysWhyADrugIsNotLinked() {
    List<NotLinked> not = NotLinked.of(data);
    assertEquals(
        List.of("ibuprofen iv: first dose 2 hours before onset, inside the lag."),
        not.stream().map(n -> n.name() + ": " + n.reason()).collect(Collectors.toList()));
  }

  @Test
  void roundsCreatinineHalfUp() {
    assertEquals("1.00", Creatinine.MG.say(88_400));
    assertEquals("0.30", Creatinine.MG.say(26_500));
    assertEquals("354", Creatinine.UMOL.say(353_600));
  }
}
