package millrace.ui.episodes;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import millrace.analytics.mart.ResultLine;
import millrace.ui.chart.Json;

/** Creatinine with its reference and the borders of the stages. */
final class CreatinineMarks {
  private static final double[] BORDERS = {1.5, 2, 3};
  private static final double AIR = 1.12;

  private final EpisodeData data;
  private final Creatinine unit;
  private final Clock clock;

  CreatinineMarks(EpisodeData data, Creatinine unit, Clock clock) {
    this.data = data;
    this.unit = unit;
    this.clock = clock;
  }

  /** Lower end of the axis. */
  double least() {
    double least =
        Math.min(
            data.results().stream().mapToLong(ResultLine::nanomolesPerLitre).min().orElse(0),
            data.episode().referenceNanomolesPerLitre().orElse(Long.MAX_VALUE));
    return unit == Creatinine.MG
        ? Math.floor(unit.value(least) / AIR * 10) / 10
        : Math.floor(unit.value(least) / AIR / 10) * 10;
  }

  /** Upper end of the axis. */
  double most() {
    double most =
        Math.max(
            data.results().stream().mapToLong(ResultLine::nanomolesPerLitre).max().orElse(0),
            data.episode().referenceNanomolesPerLitre().orElse(0) * BORDERS[0]);
    return unit == Creatinine.MG
        ? Math.ceil(unit.value(most) * AIR * 10) / 10
        : Math.ceil(unit.value(most) * AIR / 10) * 10;
  }

  /** The line through the results that are used, with the borders. */
  ObjectNode line() {
    ObjectNode line =
        Json.object(
            "{'type':'line','silent':true,'symbol':'none','lineStyle':{'color':'var(--water)','width':1.8},"
                + "'markLine':{'silent':true,'symbol':'none','label':{'color':'var(--soft)','position':'end','fontSize':11}}}");
    ArrayNode points = line.putArray("data");
    data.results().stream()
        .filter(r -> r.state().equals("used"))
        .forEach(r -> points.add(point(r)));
    ArrayNode borders = line.withObject("/markLine").putArray("data");
    data.episode()
        .referenceNanomolesPerLitre()
        .ifPresent(
            reference -> {
              border(borders, reference, "ref. " + unit.say(reference), "solid", "var(--ink)");
              for (double times : BORDERS) {
                if (unit.value(reference * times) <= most()) {
                  String label =
                      (times == BORDERS[0] ? "1.5" : Integer.toString((int) times)) + " ×";
                  border(borders, reference * times, label, "dashed", "var(--water2)");
                }
              }
            });
    return line;
  }

  private void border(
      ArrayNode borders, double nanomoles, String label, String type, String colour) {
    ObjectNode border = borders.addObject().put("yAxis", unit.value(nanomoles));
    border.putObject("label").put("formatter", label);
    border.putObject("lineStyle").put("type", type).put("color", colour).put("width", 1);
  }

  private ArrayNode point(ResultLine r) {
    return Json.array().add(clock.wall(r.collectedAt())).add(unit.value(r.nanomolesPerLitre()));
  }

  /** The results: filled inside the episode, hollow outside, masked ones as crosses of lines. */
  ObjectNode dots() {
    ObjectNode dots =
        Json.object(
            "{'type':'scatter','silent':true,'symbolSize':8,'z':5,'label':{'show':false,'position':'top',"
                + "'color':'var(--ink)','fontWeight':600,'fontSize':11.5}}");
    ArrayNode all = dots.putArray("data");
    for (ResultLine r : data.results()) {
      if (r.state().equals("superseded")) {
        continue;
      }
      ObjectNode dot = all.addObject();
      dot.set("value", point(r));
      boolean masked = r.state().equals("masked");
      boolean filled = !masked && data.inside(r.collectedAt());
      dot.putObject("itemStyle")
          .put("color", filled ? "var(--water)" : "var(--paper)")
          .put("borderColor", masked ? "var(--soft)" : "var(--water)")
          .put("borderType", masked ? "dotted" : "solid")
          .put("borderWidth", 1.6);
      if (masked) {
        dot.put("symbol", "diamond");
      }
      String decision = RawRows.decision(data, r);
      if (decision.contains("onset") || decision.contains("peak") || decision.equals("closes")) {
        dot.put("symbolSize", 12);
        dot.putObject("label")
            .put("show", true)
            .put("position", position(decision))
            .put("formatter", decision + " " + unit.say(r.nanomolesPerLitre()));
      }
    }
    return dots;
  }

  /** Where a name hides no other point. */
  private static String position(String decision) {
    return switch (decision) {
      case "onset" -> "left";
      case "closes" -> "right";
      default -> "top";
    };
  }
}
