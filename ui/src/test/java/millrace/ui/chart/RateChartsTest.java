package millrace.ui.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class RateChartsTest {
  @Test
  void theScriptIsWhereItIsLoadedFrom() {
    String path = Chart.SCRIPT.replace("context://", "META-INF/resources/");
    assertNotNull(getClass().getClassLoader().getResource(path), path);
  }

  @Test
  void drawsAnOpenLimitToTheEnd() {
    RatePoint open =
        new RatePoint(
            "open",
            OptionalDouble.of(2),
            OptionalDouble.of(0.6),
            OptionalDouble.empty(),
            OptionalDouble.of(3),
            false);
    JsonNode options = RateCharts.ratios(List.of(open));
    assertEquals(4, options.at("/xAxis/max").asDouble());
    assertEquals(0.5, options.at("/xAxis/min").asDouble());
    assertEquals(4, options.at("/series/0/data/0/4").asDouble());
  }

  @Test
  void leavesOutWhatHasNoValue() {
    OptionalDouble none = OptionalDouble.empty();
    JsonNode options =
        RateCharts.upright(List.of(new RatePoint("2031-03", none, none, none, none, false)));
    assertEquals(0, options.at("/series/2/data").size());
  }
}
