package millrace.ui.episodes;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.Instant;
import millrace.analytics.mart.ReplacementLine;
import millrace.analytics.mart.StayLine;
import millrace.ui.chart.Json;

/** Spans of time as bars. */
final class BarAreas {
  /** Narrower than this share of the axis, a bar has no room for a name. */
  private static final double ROOM_PER_LETTER = 0.0092;

  private final EpisodeData data;
  private final Clock clock;

  BarAreas(EpisodeData data, Clock clock) {
    this.data = data;
    this.clock = clock;
  }

  ArrayNode stays() {
    ArrayNode areas = Json.array();
    int i = 0;
    for (StayLine s : data.stays()) {
      String name = data.units().getOrDefault(s.unitId(), s.unitId());
      areas.add(area(name, s.enteredAt(), s.leftAt().orElse(data.to()), i++ % 2 == 0));
    }
    return areas;
  }

  ArrayNode replacements() {
    ArrayNode areas = Json.array();
    for (ReplacementLine r : data.replacements()) {
      areas.add(area("results masked", r.startedAt(), r.maskedUntil(), true));
      areas.add(area(r.modality(), r.startedAt(), r.endedAt().orElse(r.startedAt()), false));
    }
    return areas;
  }

  private ArrayNode area(String name, Instant from, Instant to, boolean light) {
    Instant start = from.isBefore(data.from()) ? data.from() : from;
    Instant end = to.isAfter(data.to()) ? data.to() : to;
    double share =
        (double) (end.getEpochSecond() - start.getEpochSecond())
            / (data.to().getEpochSecond() - data.from().getEpochSecond());
    ArrayNode area = Json.array();
    ObjectNode first = area.addObject().put("xAxis", clock.wall(start));
    int letters = (int) (share / ROOM_PER_LETTER);
    if (letters >= name.length()) {
      first.put("name", name);
    } else if (letters > 4) {
      first.put("name", name.substring(0, letters - 1) + "…");
    } else {
      first.put("name", " ");
    }
    first
        .putObject("itemStyle")
        .put("color", light ? "var(--water3)" : "var(--water2)")
        .put("borderColor", "var(--paper)")
        .put("borderWidth", 1);
    area.addObject().put("xAxis", clock.wall(end));
    return area;
  }
}
