package millrace.ui.episodes;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.Duration;
import java.time.Instant;
import millrace.ui.chart.Json;

/**
 * Panels one above the other on one time axis: creatinine, doses, mean pressure, units,
 * replacements.
 */
final class EpisodeChart {
  private static final int LEFT = 190;
  private static final int RIGHT = 92;
  private static final int CREATININE = 210;
  private static final int DOSE = 22;
  private static final int PRESSURE = 120;
  private static final int BAR = 24;
  private static final int GAP = 30;
  private static final int TOP = 22;
  private static final int AXIS = 28;
  private static final Duration SHADED = Duration.ofHours(48);

  private final EpisodeData data;
  private final Creatinine unit;
  private final Clock clock;
  private final DoseRows doses;
  private final ObjectNode options = Json.object("{'animation':false}");
  private final ArrayNode grids = options.putArray("grid");
  private final ArrayNode times = options.putArray("xAxis");
  private final ArrayNode values = options.putArray("yAxis");
  private final ArrayNode series = options.putArray("series");
  private final ArrayNode words = options.putArray("graphic");
  private int bottom = TOP;

  EpisodeChart(EpisodeData data, Creatinine unit, Clock clock) {
    this.data = data;
    this.unit = unit;
    this.clock = clock;
    this.doses = DoseRows.of(data, clock);
    options.set(
        "textStyle",
        Json.object(
            "{'fontFamily':'Inter, Segoe UI, system-ui, sans-serif','color':'var(--soft)'}"));
    options.put("useUTC", true);
    creatinine();
    if (!doses.names().isEmpty()) {
      doses();
    }
    pressure();
    bars("Unit", new BarAreas(data, clock).stays());
    if (!data.replacements().isEmpty()) {
      bars("Replacement", new BarAreas(data, clock).replacements());
    }
    ((ObjectNode) times.get(times.size() - 1)).withObject("/axisLabel").put("show", true);
  }

  ObjectNode options() {
    return options;
  }

  int height() {
    return bottom + AXIS - GAP;
  }

  /** Adds a panel with its axes and shading; gives its number. */
  private int panel(String title, String below, int height, ObjectNode value) {
    int at = grids.size();
    grids
        .addObject()
        .put("left", LEFT)
        .put("right", RIGHT)
        .put("top", bottom)
        .put("height", height);
    ObjectNode time =
        Json.object(
            "{'type':'time','axisLabel':{'show':false,'color':'var(--soft)','hideOverlap':true,"
                + "'formatter':'{d} {MMM}'},'axisTick':{'show':false},"
                + "'axisLine':{'lineStyle':{'color':'var(--line)'},'onZero':false},"
                + "'splitLine':{'show':true,'lineStyle':{'color':'var(--line)'}}}");
    time.put("gridIndex", at)
        .put("min", clock.wall(data.from()))
        .put("max", clock.wall(data.to()))
        .put("minInterval", Duration.ofDays(1).toMillis());
    times.add(time);
    values.add(value.put("gridIndex", at));
    text(title, bottom, "var(--ink)", 600);
    if (!below.isEmpty()) {
      text(below, bottom + 16, "var(--soft)", 400);
    }
    shade(at);
    bottom += height + GAP;
    return at;
  }

  private void text(String text, int top, String colour, int weight) {
    ObjectNode word = words.addObject().put("type", "text").put("left", 0).put("top", top);
    word.put("silent", true)
        .putObject("style")
        .put("text", text)
        .put("fill", colour)
        .put("font", weight + " 12.5px Inter, Segoe UI, system-ui, sans-serif");
  }

  private void shade(int at) {
    ObjectNode area =
        Json.object(
            "{'type':'scatter','silent':true,'data':[],'z':0,"
                + "'markArea':{'silent':true,'itemStyle':{'color':'var(--water3)','opacity':0.55},"
                + "'label':{'color':'var(--soft)','position':'top','fontSize':11}},"
                + "'markLine':{'silent':true,'symbol':'none','label':{'show':false},"
                + "'lineStyle':{'color':'var(--soft)','type':'solid','width':1}}}");
    Instant onset = data.episode().onsetAt();
    ArrayNode span = area.withObject("/markArea").putArray("data").addArray();
    ObjectNode start = span.addObject().put("xAxis", clock.wall(onset.minus(SHADED)));
    if (at == 0) {
      start.put("name", "48 h before onset");
    }
    span.addObject().put("xAxis", clock.wall(onset));
    area.withObject("/markLine").putArray("data").addObject().put("xAxis", clock.wall(onset));
    add(at, area);
  }

  private void add(int at, ObjectNode one) {
    series.add(one.put("xAxisIndex", at).put("yAxisIndex", at));
  }

  private void creatinine() {
    int at =
        panel(
            "Creatinine",
            unit.unit(),
            CREATININE,
            Json.object(
                "{'type':'value','scale':true,'axisLabel':{'color':'var(--soft)','showMinLabel':false,'showMaxLabel':false},'splitLine':{'show':false},"
                    + "'axisLine':{'show':false},'axisTick':{'show':false}}"));
    CreatinineMarks marks = new CreatinineMarks(data, unit, clock);
    ((ObjectNode) values.get(at)).put("min", marks.least()).put("max", marks.most());
    add(at, marks.line());
    add(at, marks.dots());
  }

  private void doses() {
    ObjectNode names =
        Json.object(
            "{'type':'category','inverse':true,'axisLine':{'show':false},'axisTick':{'show':false},"
                + "'axisLabel':{'color':'var(--ink)','interval':0,'width':170,'overflow':'truncate'}}");
    names.set("data", Json.array(doses.names()));
    text("Doses", bottom - 16, "var(--ink)", 600);
    int at = panel("", "", DOSE * doses.names().size(), names);
    add(at, doses.spans());
    add(at, doses.starts());
  }

  private void pressure() {
    int at =
        panel(
            "Mean pressure",
            "mmHg, floor " + Math.round(data.floor()),
            PRESSURE,
            Json.object(
                "{'type':'value','scale':true,'axisLabel':{'color':'var(--soft)','showMinLabel':false,'showMaxLabel':false},'splitLine':{'show':false},"
                    + "'splitNumber':3,'axisLine':{'show':false},'axisTick':{'show':false}}"));
    ObjectNode readings =
        Json.object(
            "{'type':'scatter','silent':true,'symbol':'rect','symbolSize':[5,3],"
                + "'itemStyle':{'color':'var(--water2)'},'markLine':{'silent':true,'symbol':'none',"
                + "'label':{'show':false},'lineStyle':{'color':'var(--ink)','type':'dashed','width':1}}}");
    readings.withObject("/markLine").putArray("data").addObject().put("yAxis", data.floor());
    ArrayNode dots = readings.putArray("data");
    data.pressures().stream()
        .filter(p -> p.map().isPresent())
        .forEach(
            p -> {
              ObjectNode dot = dots.addObject();
              dot.putArray("value").add(clock.wall(p.measuredAt())).add(p.map().getAsDouble());
              if (p.setAside()) {
                dot.withObject("/itemStyle").put("color", "var(--line)");
              } else if (p.low()) {
                dot.putArray("symbolSize").add(6).add(5);
                dot.withObject("/itemStyle").put("color", "var(--mark)");
              }
            });
    if (data.pressures().isEmpty()) {
      text("no reading", bottom - GAP - PRESSURE + 32, "var(--soft)", 400);
    }
    double most = data.pressures().stream().mapToDouble(p -> p.map().orElse(0)).max().orElse(0);
    double least =
        data.pressures().stream().mapToDouble(p -> p.map().orElse(999)).min().orElse(999);
    ObjectNode axis = (ObjectNode) values.get(at);
    axis.put("min", Math.floor(Math.min(least, data.floor() - 15) / 10) * 10);
    axis.put("max", Math.ceil(Math.max(most, data.floor() + 15) / 10) * 10);
    add(at, readings);
  }

  private void bars(String title, ArrayNode areas) {
    int at = panel(title, "", BAR, Json.object("{'type':'value','min':0,'max':1,'show':false}"));
    ObjectNode bars =
        Json.object(
            "{'type':'scatter','silent':true,'data':[],'markArea':{'silent':true,"
                + "'label':{'color':'var(--ink)','position':'insideLeft','fontSize':12}}}");
    bars.withObject("/markArea").set("data", areas);
    add(at, bars);
  }
}
