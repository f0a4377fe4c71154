package millrace.ui.chart;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.OptionalDouble;

/** Charts of values with limits. */
public final class RateCharts {
  private static final String TEXT =
      "{'fontFamily':'Inter, Segoe UI, system-ui, sans-serif','color':'var(--soft)'}";
  private static final String AXIS =
      "'axisLabel':{'color':'var(--soft)'},'axisLine':{'lineStyle':{'color':'var(--line)'}},"
          + "'axisTick':{'show':false},'splitLine':{'lineStyle':{'color':'var(--line)'}}";

  /** No ratio is drawn beyond this, or below its inverse. */
  private static final double REACH = 32;

  private static final int LETTER = 7;
  private static final int MOST_LEFT = 240;

  private RateCharts() {}

  /** Values in the order of time, upright. */
  public static ObjectNode upright(List<RatePoint> points) {
    ObjectNode options = base("{'left':58,'right':14,'top':14,'bottom':28}");
    ObjectNode category = Json.object("{'type':'category'," + AXIS + "}");
    category.set("data", Json.array(points.stream().map(RatePoint::name).toList()));
    options.set("xAxis", category);
    options.set("yAxis", Json.object("{'type':'value','min':0," + AXIS + "}"));
    ArrayNode series = options.putArray("series");
    ObjectNode line =
        Json.object(
            "{'type':'line','silent':true,'symbol':'none','lineStyle':{'color':'var(--water2)','width':1.2}}");
    line.set("data", values(points, false));
    series.add(whiskers(points)).add(line).add(dots(points, false, "circle"));
    return options;
  }

  /** Values side by side, lying, on one scale. */
  public static ObjectNode lying(List<RatePoint> points) {
    double counted = highest(points.stream().filter(p -> p.value().orElse(0) > 0).toList());
    double end = counted > 0 ? counted : highest(points);
    List<RatePoint> down = reversed(points.stream().map(p -> clipped(p, 0, end)).toList());
    ObjectNode options = base(room(down));
    ObjectNode axis = Json.object("{'type':'value','min':0," + AXIS + "}");
    axis.withObject("/axisLabel").put("showMaxLabel", false);
    if (end > 0) {
      axis.put("max", end);
    }
    options.set("xAxis", axis);
    options.set("yAxis", names(down));
    options.putArray("series").add(whiskers(down)).add(dots(down, true, "circle"));
    return options;
  }

  /** Ratios, lying, on a scale of logarithms around 1; the second value is hollow. */
  public static ObjectNode ratios(List<RatePoint> points) {
    double most = 2;
    double least = 0.5;
    for (RatePoint p : points) {
      most = Math.max(most, Math.max(p.upper().orElse(1), p.second().orElse(1)));
      least = Math.min(least, Math.min(p.lower().orElse(1), p.second().orElse(1)));
    }
    double end = powerOfTwo(Math.ceil(Math.log(Math.min(most, REACH)) / Math.log(2)));
    double start = powerOfTwo(Math.floor(Math.log(Math.max(least, 1 / REACH)) / Math.log(2)));
    List<RatePoint> down = reversed(points.stream().map(p -> clipped(p, start, end)).toList());
    ObjectNode options = base(room(down));
    ObjectNode axis = Json.object("{'type':'log','logBase':2," + AXIS + "}");
    axis.put("min", start).put("max", end);
    options.set("xAxis", axis);
    options.set("yAxis", names(down));
    ObjectNode dots = dots(down, true, "rect");
    dots.set(
        "markLine",
        Json.object(
            "{'silent':true,'symbol':'none','label':{'show':false},"
                + "'lineStyle':{'color':'var(--ink)','type':'solid','width':1.2},'data':[{'xAxis':1}]}"));
    ObjectNode hollow =
        Json.object(
            "{'type':'scatter','silent':true,'symbol':'circle','symbolSize':8,"
                + "'itemStyle':{'color':'transparent','borderColor':'var(--soft)','borderWidth':1.3}}");
    ArrayNode second = hollow.putArray("data");
    for (int i = 0; i < down.size(); i++) {
      if (down.get(i).second().isPresent()) {
        second.add(Json.array(List.of(down.get(i).second().getAsDouble(), i)));
      }
    }
    options.putArray("series").add(whiskers(down)).add(dots).add(hollow);
    return options;
  }

  private static double powerOfTwo(double power) {
    return Math.pow(2, power);
  }

  private static double highest(List<RatePoint> points) {
    return points.stream().mapToDouble(p -> p.upper().orElse(0)).max().orElse(0);
  }

  /** Room for the longest name. */
  private static String room(List<RatePoint> points) {
    int letters = points.stream().mapToInt(p -> p.name().length()).max().orElse(0);
    int left = Math.min(MOST_LEFT, letters * LETTER + 12);
    return "{'left':" + left + ",'right':24,'top':8,'bottom':26}";
  }

  private static RatePoint clipped(RatePoint p, double start, double end) {
    return new RatePoint(
        p.name(),
        clip(p.value(), start, end),
        p.lower().isEmpty() ? p.lower() : clip(p.lower(), start, end),
        p.upper().isEmpty() && p.lower().isPresent()
            ? OptionalDouble.of(end)
            : clip(p.upper(), start, end),
        clip(p.second(), start, end),
        p.marked());
  }

  private static OptionalDouble clip(OptionalDouble value, double start, double end) {
    return value.isEmpty()
        ? value
        : OptionalDouble.of(Math.min(end, Math.max(start, value.getAsDouble())));
  }

  private static ObjectNode base(String grid) {
    ObjectNode options = Json.object("{'animation':false}");
    options.set("textStyle", Json.object(TEXT));
    options.set("grid", Json.object(grid));
    return options;
  }

  private static ObjectNode names(List<RatePoint> points) {
    ObjectNode category =
        Json.object(
            "{'type':'category','axisLabel':{'color':'var(--ink)','interval':0,'width':230,'overflow':'truncate'},"
                + "'axisLine':{'show':false},'axisTick':{'show':false}}");
    category.set("data", Json.array(points.stream().map(RatePoint::name).toList()));
    return category;
  }

  private static ArrayNode values(List<RatePoint> points, boolean lying) {
    ArrayNode data = Json.array();
    for (int i = 0; i < points.size(); i++) {
      OptionalDouble value = points.get(i).value();
      if (value.isPresent()) {
        data.add(
            lying
                ? Json.array(List.of(value.getAsDouble(), i))
                : Json.array(List.of(i, value.getAsDouble())));
      } else if (!lying) {
        data.add(Json.array(List.of(i, "-")));
      }
    }
    return data;
  }

  private static ObjectNode dots(List<RatePoint> points, boolean lying, String symbol) {
    ObjectNode dots =
        Json.object(
            "{'type':'scatter','silent':true,'symbolSize':8,'itemStyle':{'color':'var(--water)'}}");
    dots.put("symbol", symbol);
    ArrayNode data = dots.putArray("data");
    for (int i = 0; i < points.size(); i++) {
      RatePoint p = points.get(i);
      if (p.value().isPresent()) {
        double v = p.value().getAsDouble();
        ObjectNode dot = data.addObject();
        dot.set("value", Json.array(lying ? List.of(v, i) : List.of(i, v)));
        if (p.marked()) {
          dot.put("symbolSize", 14);
        }
      }
    }
    return dots;
  }

  /** Limits as a box that has no body. */
  private static ObjectNode whiskers(List<RatePoint> points) {
    ObjectNode box =
        Json.object(
            "{'type':'boxplot','silent':true,'boxWidth':[0,6],'itemStyle':{'color':'transparent',"
                + "'borderColor':'var(--water)','borderWidth':1.4}}");
    ArrayNode data = box.putArray("data");
    for (RatePoint p : points) {
      if (p.value().isEmpty() || p.lower().isEmpty() || p.upper().isEmpty()) {
        data.add(Json.array(List.of("-", "-", "-", "-", "-")));
        continue;
      }
      double v = p.value().getAsDouble();
      data.add(Json.array(List.of(p.lower().getAsDouble(), v, v, v, p.upper().getAsDouble())));
    }
    return box;
  }

  private static List<RatePoint> reversed(List<RatePoint> points) {
    List<RatePoint> down = new ArrayList<>(points);
    Collections.reverse(down);
    return down;
  }
}
