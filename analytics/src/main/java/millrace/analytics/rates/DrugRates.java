package millrace.analytics.rates;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import millrace.analytics.mart.DrugRateRow;
import millrace.analytics.policy.ExposurePolicy;
import millrace.analytics.stats.BenjaminiHochberg;
import millrace.analytics.stats.Limits;
import millrace.analytics.stats.MantelHaenszelRateRatio;
import millrace.analytics.stats.PersonTimeTable;
import millrace.analytics.stats.RateRatio;

/**
 * Exposed against unexposed incidence of the subjects of one level (methods 7). Associations, not
 * causes.
 */
public final class DrugRates {
  private static final double CONFIDENCE = 0.95;

  private final ExposurePolicy policy;
  private final Map<Stratum, RiskSum> whole;

  /**
   * Rates against that whole.
   *
   * @param whole all time at risk by stratum
   */
  public DrugRates(ExposurePolicy policy, Map<Stratum, RiskSum> whole) {
    this.policy = policy;
    this.whole = whole;
  }

  /** A subject and its exposed time by stratum. */
  public record Exposed(String subject, Map<Stratum, RiskSum> byStratum) {}

  /**
   * The rows of a level, in the order of the subjects, with Benjamini–Hochberg values over the
   * level.
   */
  public List<DrugRateRow> rows(String level, List<Exposed> subjects) {
    List<DrugRateRow> rows = new ArrayList<>();
    subjects.forEach(subject -> rows.add(row(level, subject)));
    double[] p = rows.stream().flatMapToDouble(r -> r.pMid().stream()).toArray();
    double[] q = BenjaminiHochberg.qValues(p);
    int next = 0;
    for (int i = 0; i < rows.size(); i++) {
      if (rows.get(i).pMid().isPresent()) {
        rows.set(i, withQ(rows.get(i), q[next++]));
      }
    }
    return rows;
  }

  private DrugRateRow row(String level, Exposed subject) {
    RiskSum all = total(whole);
    RiskSum exposed = total(subject.byStratum());
    RiskSum unexposed = all.minus(exposed);
    boolean tooFew =
        all.episodes() < policy.fewestEpisodes()
            || exposed.seconds() < policy.fewestExposedDays() * 86_400L
            || unexposed.seconds() <= 0;
    Ratio ratio = tooFew ? Ratio.NONE : ratio(exposed, unexposed);
    Optional<MantelHaenszelRateRatio> stratified =
        tooFew ? Optional.empty() : Optional.of(MantelHaenszelRateRatio.of(tables(subject)));
    OptionalDouble mhRatio =
        stratified.map(MantelHaenszelRateRatio::ratio).orElse(OptionalDouble.empty());
    Optional<Limits> mhLimits = stratified.flatMap(MantelHaenszelRateRatio::limits);
    return new DrugRateRow(
        level,
        subject.subject(),
        exposed.seconds(),
        exposed.episodes(),
        unexposed.seconds(),
        unexposed.episodes(),
        ratio.ratio(),
        ratio.lower(),
        ratio.upper(),
        ratio.p(),
        mhRatio,
        lower(mhLimits),
        upper(mhLimits),
        OptionalDouble.empty());
  }

  private List<PersonTimeTable> tables(Exposed subject) {
    List<PersonTimeTable> tables = new ArrayList<>();
    whole.forEach(
        (stratum, all) -> {
          RiskSum exposed = subject.byStratum().getOrDefault(stratum, RiskSum.ZERO);
          RiskSum unexposed = all.minus(exposed);
          tables.add(
              new PersonTimeTable(
                  exposed.episodes(), exposed.days(), unexposed.episodes(), unexposed.days()));
        });
    return tables;
  }

  private static Ratio ratio(RiskSum exposed, RiskSum unexposed) {
    RateRatio crude =
        RateRatio.of(
            new PersonTimeTable(
                exposed.episodes(), exposed.days(), unexposed.episodes(), unexposed.days()),
            CONFIDENCE);
    boolean noneUnexposed = unexposed.episodes() == 0;
    return new Ratio(
        noneUnexposed ? OptionalDouble.empty() : crude.ratio(),
        OptionalDouble.of(crude.midP().lower()),
        noneUnexposed ? OptionalDouble.empty() : OptionalDouble.of(crude.midP().upper()),
        OptionalDouble.of(crude.pMid()));
  }

  private record Ratio(
      OptionalDouble ratio, OptionalDouble lower, OptionalDouble upper, OptionalDouble p) {
    static final Ratio NONE =
        new Ratio(
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty());
  }

  private static OptionalDouble lower(Optional<Limits> limits) {
    return limits.map(l -> OptionalDouble.of(l.lower())).orElse(OptionalDouble.empty());
  }

  private static OptionalDouble upper(Optional<Limits> limits) {
    return limits.map(l -> OptionalDouble.of(l.upper())).orElse(OptionalDouble.empty());
  }

  private static RiskSum total(Map<Stratum, RiskSum> sums) {
    return sums.values().stream().reduce(RiskSum.ZERO, RiskSum::plus);
  }

  private static DrugRateRow withQ(DrugRateRow r, double q) {
    return new DrugRateRow(
        r.level(),
        r.subject(),
        r.exposedSeconds(),
        r.exposedEpisodes(),
        r.unexposedSeconds(),
        r.unexposedEpisodes(),
        r.rateRatio(),
        r.lower(),
        r.upper(),
        r.pMid(),
        r.mhRatio(),
        r.mhLower(),
        r.mhUpper(),
        OptionalDouble.of(q));
  }
}
