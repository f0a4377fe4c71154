package millrace.ui.month;

import java.time.YearMonth;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import millrace.analytics.mart.TestingRow;
import millrace.analytics.mart.UnitRateRow;
import millrace.analytics.mart.UnitRow;
import millrace.analytics.rates.Incidence;
import millrace.analytics.rates.RiskSum;
import millrace.analytics.risk.Attribution;
import millrace.ui.mart.Run;

/** Sums of one attribution, by month and unit. */
public final class MonthFigures {
  private static final int YEAR = 12;

  private final List<UnitRateRow> rows;
  private final List<TestingRow> testing;
  private final Map<String, String> unitNames;

  /**
   * A unit in a month.
   *
   * @param unitId unit
   * @param name its name
   * @param sum time and episodes
   * @param testsPerDay creatinine results per patient-day, empty without occupied time
   */
  public record UnitFigure(String unitId, String name, RiskSum sum, OptionalDouble testsPerDay) {
    /** Incidence with its limits. */
    public Incidence incidence() {
      return Incidence.of(sum);
    }
  }

  private MonthFigures(
      List<UnitRateRow> rows, List<TestingRow> testing, Map<String, String> unitNames) {
    this.rows = rows;
    this.testing = testing;
    this.unitNames = unitNames;
  }

  /** Reads them. */
  public static MonthFigures read(Run run, Attribution attribution) {
    return new MonthFigures(
        run.rows(UnitRateRow.class).stream()
            .filter(r -> r.attribution().equals(attribution.word()))
            .toList(),
        run.rows(TestingRow.class),
        run.rows(UnitRow.class).stream()
            .collect(Collectors.toMap(UnitRow::unitId, UnitRow::name, (a, b) -> a)));
  }

  /** The last month with time at risk. */
  public Optional<YearMonth> last() {
    return rows.stream()
        .filter(r -> r.atRiskSeconds() > 0)
        .map(r -> YearMonth.parse(r.month()))
        .max(Comparator.naturalOrder());
  }

  /** The hospital in a month. */
  public RiskSum hospital(YearMonth month) {
    return sum(r -> r.month().equals(month.toString()));
  }

  /** The hospital in the twelve months before. */
  public RiskSum yearBefore(YearMonth month) {
    String from = month.minusMonths(YEAR).toString();
    return sum(r -> r.month().compareTo(from) >= 0 && r.month().compareTo(month.toString()) < 0);
  }

  /** The hospital by month, of those with time or an episode. */
  public Map<YearMonth, RiskSum> months() {
    Map<YearMonth, RiskSum> months = new TreeMap<>();
    rows.forEach(r -> months.merge(YearMonth.parse(r.month()), of(r), RiskSum::plus));
    return months;
  }

  /** Units with time or an episode in a month, the highest rate first. */
  public List<UnitFigure> units(YearMonth month) {
    return rows.stream()
        .filter(r -> r.month().equals(month.toString()))
        .map(r -> new UnitFigure(r.unitId(), name(r.unitId()), of(r), tests(month, r.unitId())))
        .sorted(
            Comparator.comparingDouble((UnitFigure u) -> -u.incidence().rate().orElse(0))
                .thenComparing(UnitFigure::name))
        .toList();
  }

  private OptionalDouble tests(YearMonth month, String unitId) {
    long seconds = 0;
    long results = 0;
    for (TestingRow row : testing) {
      if (row.unitId().equals(unitId) && row.month().equals(month.toString())) {
        seconds += row.occupiedSeconds();
        results += row.results();
      }
    }
    double days = new RiskSum(seconds, 0, 0).days();
    return days > 0 ? OptionalDouble.of(results / days) : OptionalDouble.empty();
  }

  private String name(String unitId) {
    return unitId.isEmpty() ? "no unit" : unitNames.getOrDefault(unitId, unitId);
  }

  private RiskSum sum(Predicate<UnitRateRow> which) {
    return rows.stream().filter(which).map(MonthFigures::of).reduce(RiskSum.ZERO, RiskSum::plus);
  }

  private static RiskSum of(UnitRateRow row) {
    return new RiskSum(row.atRiskSeconds(), row.episodes(), row.stage2plus());
  }
}
