package millrace.ui.episodes;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import millrace.analytics.mart.DoseLine;
import millrace.ui.chart.Json;

/** Doses by drug and route, those that expose first. */
final class DoseRows {
  private static final int MOST = 16;

  private final EpisodeData data;
  private final Clock clock;
  private final List<String> names = new ArrayList<>();
  private final List<List<DoseLine>> rows = new ArrayList<>();

  private DoseRows(EpisodeData data, Clock clock) {
    this.data = data;
    this.clock = clock;
  }

  static DoseRows of(EpisodeData data, Clock clock) {
    DoseRows all = new DoseRows(data, clock);
    Map<String, List<DoseLine>> byName = new LinkedHashMap<>();
    for (DoseLine dose : data.dosesShown()) {
      byName
          .computeIfAbsent(NotLinked.drug(dose) + " " + dose.route(), n -> new ArrayList<>())
          .add(dose);
    }
    byName.entrySet().stream()
        .sorted(Comparator.comparingInt(e -> rank(e.getValue())))
        .limit(MOST)
        .forEach(
            e -> {
              all.names.add(e.getKey());
              all.rows.add(e.getValue());
            });
    return all;
  }

  private static int rank(List<DoseLine> doses) {
    if (doses.stream().anyMatch(DoseLine::exposing)) {
      return 0;
    }
    return doses.stream().anyMatch(d -> d.agent().isPresent()) ? 1 : 2;
  }

  List<String> names() {
    return names;
  }

  /** Doses that took time, as lines. */
  ObjectNode spans() {
    ObjectNode spans =
        Json.object(
            "{'type':'line','silent':true,'symbol':'none','lineStyle':{'color':'var(--water2)','width':3}}");
    ArrayNode points = spans.putArray("data");
    for (int i = 0; i < rows.size(); i++) {
      for (DoseLine dose : rows.get(i)) {
        if (dose.endedAt().filter(e -> e.isAfter(dose.startedAt())).isPresent()) {
          long from =
              clock.wall(dose.startedAt().isBefore(data.from()) ? data.from() : dose.startedAt());
          long to =
              clock.wall(
                  dose.endedAt().get().isAfter(data.to()) ? data.to() : dose.endedAt().get());
          points.addArray().add(from).add(i);
          points.addArray().add(to).add(i);
          points.addArray().add(to).add("-");
        }
      }
    }
    return spans;
  }

  /** Starts of doses: filled when they expose; the note of others stands at the last. */
  ObjectNode starts() {
    ObjectNode starts =
        Json.object(
            "{'type':'scatter','silent':true,'symbol':'rect','symbolSize':[4,14],"
                + "'label':{'show':false,'position':'right','color':'var(--soft)','fontSize':11}}");
    ArrayNode points = starts.putArray("data");
    for (int i = 0; i < rows.size(); i++) {
      List<DoseLine> row = rows.get(i);
      for (int k = 0; k < row.size(); k++) {
        DoseLine dose = row.get(k);
        if (dose.startedAt().isBefore(data.from())) {
          continue;
        }
        ObjectNode point = points.addObject();
        point.putArray("value").add(clock.wall(dose.startedAt())).add(i);
        point
            .putObject("itemStyle")
            .put("color", dose.exposing() ? "var(--water)" : "var(--paper)")
            .put("borderColor", "var(--water)")
            .put("borderWidth", 1);
        if (k == row.size() - 1 && !dose.note().isEmpty()) {
          point.putObject("label").put("show", true).put("formatter", dose.note());
        }
      }
    }
    return starts;
  }
}
