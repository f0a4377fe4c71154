package millrace.ui.episodes;

import java.time.YearMonth;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import millrace.analytics.risk.Attribution;
import millrace.ui.mart.Condition;
import millrace.ui.page.Query;

/**
 * Which episodes are listed, as the address says it.
 *
 * @param month month of onset
 * @param unit unit, by the attribution
 * @param attribution whether the unit is that at onset or a day before
 * @param stage 1, 2, 3, or 2+
 * @param origin community, hospital or outside
 * @param cohortClass class of the admission
 * @param recentHypotension whether a counting spell was at most 48 h before
 * @param counted whether it counts in rates
 * @param drugClass a linked drug class
 * @param linked whether that class is linked; empty means yes
 */
public record EpisodeFilter(
    Optional<YearMonth> month,
    Optional<String> unit,
    Optional<String> attribution,
    Optional<String> stage,
    Optional<String> origin,
    Optional<String> cohortClass,
    Optional<Boolean> recentHypotension,
    Optional<Boolean> counted,
    Optional<String> drugClass,
    Optional<Boolean> linked) {
  /** Words for the stage. */
  public static final List<String> STAGES = List.of("1", "2", "3", "2+");

  /** Words for the origin. */
  public static final List<String> ORIGINS = List.of("hospital", "community", "outside");

  /** Words for the class. */
  public static final List<String> CLASSES =
      List.of("eligible", "not-assessable", "transplant", "maintenance-dialysis", "under-age");

  private static final Set<String> KNOWN =
      Set.of(
          "month",
          "unit",
          "attribution",
          "stage",
          "origin",
          "class",
          "recent-hypotension",
          "counted",
          "drug",
          "linked");

  /** All episodes. */
  public static EpisodeFilter all() {
    return read(Map.of());
  }

  /** Reads it. */
  public static EpisodeFilter read(Map<String, List<String>> values) {
    Query query = Query.of(values, KNOWN);
    return new EpisodeFilter(
        query.month("month"),
        query.text("unit"),
        query.word(
            "attribution", List.of(Attribution.AT_ONSET.word(), Attribution.DAY_BEFORE.word())),
        query.word("stage", STAGES),
        query.word("origin", ORIGINS),
        query.word("class", CLASSES),
        query.flag("recent-hypotension"),
        query.flag("counted"),
        query.text("drug"),
        query.flag("linked"));
  }

  /** Writes it. */
  public String write() {
    Map<String, Optional<String>> values = new LinkedHashMap<>();
    values.put("month", month.map(YearMonth::toString));
    values.put("unit", unit);
    values.put("attribution", attribution);
    values.put("stage", stage);
    values.put("origin", origin);
    values.put("class", cohortClass);
    values.put("recent-hypotension", Query.word(recentHypotension));
    values.put("counted", Query.word(counted));
    values.put("drug", drugClass);
    values.put("linked", Query.word(linked));
    return Query.address("episodes", values);
  }

  /** Counted episodes of a month. */
  public static EpisodeFilter countedIn(YearMonth month) {
    return new EpisodeFilter(
        Optional.of(month),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.of(true),
        Optional.empty(),
        Optional.empty());
  }

  /** Counted episodes of the whole cover, linked to a drug class or not. */
  public static EpisodeFilter countedAfter(String drugClass, boolean linked) {
    return new EpisodeFilter(
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.of(true),
        Optional.of(drugClass),
        Optional.of(linked));
  }

  /** The same in one unit. */
  public EpisodeFilter in(String unitId, Attribution by) {
    return new EpisodeFilter(
        month,
        Optional.of(unitId),
        Optional.of(by.word()),
        stage,
        origin,
        cohortClass,
        recentHypotension,
        counted,
        drugClass,
        linked);
  }

  /** The same of one stage. */
  public EpisodeFilter ofStage(String word) {
    return new EpisodeFilter(
        month,
        unit,
        attribution,
        Optional.of(word),
        origin,
        cohortClass,
        recentHypotension,
        counted,
        drugClass,
        linked);
  }

  /** The rows it lets through. */
  public Condition condition() {
    Condition condition = Condition.ALL;
    if (month.isPresent()) {
      condition = condition.and("\"month\" = ?", month.get().toString());
    }
    if (unit.isPresent()) {
      boolean dayBefore = attribution.filter(Attribution.DAY_BEFORE.word()::equals).isPresent();
      condition =
          condition.and((dayBefore ? "unit_day_before" : "unit_at_onset") + " = ?", unit.get());
    }
    if (stage.isPresent()) {
      boolean atLeast = stage.get().endsWith("+");
      condition =
          condition.and(
              "stage " + (atLeast ? ">=" : "=") + " ?",
              Integer.parseInt(stage.get().substring(0, 1)));
    }
    condition = equal(condition, "origin", origin);
    condition = equal(condition, "\"class\"", cohortClass);
    condition = equal(condition, "recent_hypotension", recentHypotension);
    condition = equal(condition, "counted", counted);
    if (drugClass.isPresent()) {
      String has = "list_contains(string_split(linked_classes, ';'), ?)";
      condition = condition.and(linked.orElse(true) ? has : "NOT " + has, drugClass.get());
    }
    return condition;
  }

  private static Condition equal(Condition condition, String column, Optional<?> value) {
    return value.isEmpty() ? condition : condition.and(column + " = ?", value.get());
  }
}
