package millrace.analytics.rates;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import millrace.analytics.exposure.Exposure;
import millrace.analytics.exposure.Subjects;
import millrace.analytics.mart.ClassPressureRow;
import millrace.analytics.mart.DrugRateRow;
import millrace.analytics.mart.UnitPressureRow;
import millrace.analytics.mart.UnitRateRow;
import millrace.analytics.policy.ExposurePolicy;
import millrace.analytics.risk.Attribution;
import millrace.analytics.risk.RiskCell;

/**
 * The published rates, from cells of time at risk by month. Cells may come in any order and in
 * parts; sums are whole numbers, so the rates are the same whatever the order.
 */
public final class RateTables {
  private static final int MONTH_LENGTH = 7;

  private static final Comparator<Stratum> BY_WORDS =
      Comparator.comparing(Stratum::unitKind)
          .thenComparing(Stratum::recentHypotension)
          .thenComparing(Stratum::month);

  /** What the rates need to know of the units. */
  public record Units(List<String> names, Map<String, String> kinds) {
    String kind(int unit) {
      return kinds.getOrDefault(names.get(unit), "other");
    }
  }

  private record MonthUnit(String month, String unit, Attribution attribution) {}

  private final Units units;
  private final Subjects subjects;
  private final ExposurePolicy policy;
  private final Map<MonthUnit, RiskSum> byMonthAndUnit = new HashMap<>();
  private final Map<String, Map<Boolean, RiskSum>> byUnit = new TreeMap<>();
  private final Map<Stratum, RiskSum> whole = new TreeMap<>(BY_WORDS);
  private final Map<Integer, Map<Stratum, RiskSum>> bySubject = new HashMap<>();
  private final Map<Integer, Map<Stratum, RiskSum>> byBurden = new HashMap<>();

  /** Empty tables. */
  public RateTables(Units units, Subjects subjects, ExposurePolicy policy) {
    this.units = units;
    this.subjects = subjects;
    this.policy = policy;
  }

  /** Adds a cell, whose day may be any day of its month. */
  public void add(RiskCell cell, RiskSum sum) {
    String month = LocalDate.ofEpochDay(cell.epochDay()).toString().substring(0, MONTH_LENGTH);
    boolean all = cell.subject() == RiskCell.ALL;
    if (all) {
      byMonthAndUnit.merge(
          new MonthUnit(month, units.names().get(cell.unit()), cell.attribution()),
          sum,
          RiskSum::plus);
    }
    if (cell.attribution() != Attribution.AT_ONSET) {
      return;
    }
    Stratum stratum =
        new Stratum(
            units.kind(cell.unit()),
            cell.recentHypotension(),
            policy.stratifyByMonth() ? month : "");
    if (all) {
      whole.merge(stratum, sum, RiskSum::plus);
      byBurden
          .computeIfAbsent(cell.burden(), b -> new HashMap<>())
          .merge(stratum, sum, RiskSum::plus);
      byUnit
          .computeIfAbsent(units.names().get(cell.unit()), u -> new HashMap<>())
          .merge(cell.recentHypotension(), sum, RiskSum::plus);
    } else {
      bySubject
          .computeIfAbsent(cell.subject(), s -> new HashMap<>())
          .merge(stratum, sum, RiskSum::plus);
    }
  }

  /**
   * Incidence by month, unit and attribution; a row for each with time or an episode (methods 12).
   */
  public List<UnitRateRow> unitRates() {
    List<UnitRateRow> rows = new ArrayList<>();
    byMonthAndUnit.forEach(
        (key, sum) -> {
          Incidence incidence = Incidence.of(sum);
          rows.add(
              new UnitRateRow(
                  key.month(),
                  key.unit(),
                  key.attribution().word(),
                  sum.seconds(),
                  sum.episodes(),
                  sum.stage2plus(),
                  incidence.rate(),
                  incidence.lower(),
                  incidence.upper()));
        });
    rows.sort(
        Comparator.comparing(UnitRateRow::month)
            .thenComparing(UnitRateRow::unitId)
            .thenComparing(UnitRateRow::attribution));
    return rows;
  }

  /** Exposed against unexposed incidence of every agent, class, burden level and combination. */
  public List<DrugRateRow> drugRates() {
    DrugRates rates = new DrugRates(policy, whole);
    List<DrugRateRow> rows = new ArrayList<>();
    rows.addAll(rates.rows(Subjects.Level.AGENT.word(), exposed(Subjects.Level.AGENT)));
    List<DrugRates.Exposed> burdens = new ArrayList<>();
    for (int burden = 0; burden <= Exposure.HIGHEST_BURDEN; burden++) {
      burdens.add(
          new DrugRates.Exposed(
              Exposure.burdenWord(burden), byBurden.getOrDefault(burden, Map.of())));
    }
    rows.addAll(rates.rows("burden", burdens));
    rows.addAll(rates.rows(Subjects.Level.CLASS.word(), exposed(Subjects.Level.CLASS)));
    rows.addAll(rates.rows(Subjects.Level.COMBINATION.word(), exposed(Subjects.Level.COMBINATION)));
    return rows;
  }

  /** Each class and recent hypotension, together and apart. */
  public List<ClassPressureRow> classPressure() {
    RiskSum wholeWithout = pressureSum(whole, false);
    RiskSum wholeWith = pressureSum(whole, true);
    List<ClassPressureRow> rows = new ArrayList<>();
    for (DrugRates.Exposed exposed : exposed(Subjects.Level.CLASS)) {
      rows.add(
          ClassPressure.row(
              exposed.subject(),
              wholeWithout,
              wholeWith,
              pressureSum(exposed.byStratum(), false),
              pressureSum(exposed.byStratum(), true)));
    }
    return rows;
  }

  /** Incidence of each unit with and without recent hypotension. */
  public List<UnitPressureRow> unitPressure() {
    List<UnitPressureRow> rows = new ArrayList<>();
    byUnit.forEach(
        (unit, sums) -> {
          for (boolean recent : new boolean[] {false, true}) {
            RiskSum sum = sums.getOrDefault(recent, RiskSum.ZERO);
            Incidence incidence = Incidence.of(sum);
            rows.add(
                new UnitPressureRow(
                    unit,
                    recent,
                    sum.seconds(),
                    sum.episodes(),
                    incidence.rate(),
                    incidence.lower(),
                    incidence.upper()));
          }
        });
    return rows;
  }

  private List<DrugRates.Exposed> exposed(Subjects.Level level) {
    List<DrugRates.Exposed> exposed = new ArrayList<>();
    for (int number = 0; number < subjects.all().size(); number++) {
      Subjects.Subject subject = subjects.all().get(number);
      if (subject.level() == level) {
        exposed.add(
            new DrugRates.Exposed(subject.name(), bySubject.getOrDefault(number, Map.of())));
      }
    }
    return exposed;
  }

  private static RiskSum pressureSum(Map<Stratum, RiskSum> sums, boolean recent) {
    return sums.entrySet().stream()
        .filter(e -> e.getKey().recentHypotension() == recent)
        .map(Map.Entry::getValue)
        .reduce(RiskSum.ZERO, RiskSum::plus);
  }
}
