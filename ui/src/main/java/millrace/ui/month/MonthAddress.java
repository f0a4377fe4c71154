package millrace.ui.month;

import java.time.YearMonth;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import millrace.analytics.risk.Attribution;
import millrace.ui.page.Query;

/**
 * What the address of the month says.
 *
 * @param month the month; empty for the last one with time at risk
 * @param attribution to which unit time and episodes go
 */
public record MonthAddress(Optional<YearMonth> month, Attribution attribution) {
  private static final String MONTH = "m";
  private static final String ATTRIBUTION = "attribution";

  /** Reads it. */
  public static MonthAddress read(Map<String, List<String>> values) {
    Query query = Query.of(values, Set.of(MONTH, ATTRIBUTION));
    List<String> words = List.of(Attribution.AT_ONSET.word(), Attribution.DAY_BEFORE.word());
    boolean dayBefore =
        query.word(ATTRIBUTION, words).filter(Attribution.DAY_BEFORE.word()::equals).isPresent();
    return new MonthAddress(
        query.month(MONTH), dayBefore ? Attribution.DAY_BEFORE : Attribution.AT_ONSET);
  }

  /** Writes it. */
  public String write() {
    Map<String, Optional<String>> values = new LinkedHashMap<>();
    values.put(MONTH, month.map(YearMonth::toString));
    values.put(
        ATTRIBUTION,
        attribution == Attribution.AT_ONSET ? Optional.empty() : Optional.of(attribution.word()));
    return Query.address("month", values);
  }

  /** The same for another month. */
  public MonthAddress at(YearMonth other) {
    return new MonthAddress(Optional.of(other), attribution);
  }

  /** The same for the other attribution. */
  public MonthAddress other() {
    return new MonthAddress(
        month, attribution == Attribution.AT_ONSET ? Attribution.DAY_BEFORE : Attribution.AT_ONSET);
  }
}
