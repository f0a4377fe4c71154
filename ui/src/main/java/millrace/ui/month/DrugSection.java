package millrace.ui.month;

import com.vaadin.flow.component.html.Section;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import millrace.analytics.mart.DrugRateRow;
import millrace.analytics.rates.Incidence;
import millrace.analytics.rates.RiskSum;
import millrace.ui.chart.Chart;
import millrace.ui.chart.RateCharts;
import millrace.ui.chart.RatePoint;
import millrace.ui.episodes.EpisodeFilter;
import millrace.ui.mart.Condition;
import millrace.ui.mart.Run;
import millrace.ui.page.DataTable;
import millrace.ui.page.Html;
import millrace.ui.page.Say;

/** Drug classes over the whole cover: chart and table. */
final class DrugSection {
  private static final int ROW = 25;
  private static final int REST = 50;

  private DrugSection() {}

  static Section of(Run run) {
    List<DrugRateRow> rows =
        run.rows(DrugRateRow.class, Condition.equal("level", "class"), "").stream()
            .sorted(
                Comparator.comparingDouble((DrugRateRow r) -> -r.mhRatio().orElse(-1))
                    .thenComparing(Comparator.comparingLong(DrugRateRow::exposedSeconds).reversed())
                    .thenComparing(DrugRateRow::subject))
            .toList();
    List<RatePoint> points = points(rows);
    Section section =
        Html.section(
            "After which drugs",
            "Over the whole cover: rate of exposed time against all other time. Filled mark and line = ratio with 95 % limits"
                + " within strata of unit kind and recent low pressure; hollow = crude ratio. Scale of logarithms. Associations, not causes.");
    if (!points.isEmpty()) {
      section.add(
          new Chart(
              "Stratified rate ratio of each drug class with 95 % limits, and its crude ratio",
              REST + ROW * points.size(), RateCharts.ratios(points)));
    }
    List<DrugRateRow> seen = rows.stream().filter(r -> r.exposedSeconds() > 0).toList();
    section.add(table(seen));
    if (seen.size() < rows.size()) {
      section.add(
          Html.paragraph(
              "say",
              "Without exposed time: "
                  + rows.stream()
                      .filter(r -> r.exposedSeconds() <= 0)
                      .map(DrugRateRow::subject)
                      .sorted(String.CASE_INSENSITIVE_ORDER)
                      .collect(Collectors.joining(", "))
                  + "."));
    }
    long few = seen.stream().filter(r -> r.pMid().isEmpty()).count();
    if (few > 0) {
      section.add(
          Html.paragraph(
              "say",
              Say.count(few)
                  + " of "
                  + Say.count(seen.size())
                  + " classes with exposed time have too few episodes or exposed days for a ratio; their counts stand in the table."));
    }
    return section;
  }

  private static List<RatePoint> points(List<DrugRateRow> rows) {
    List<RatePoint> points = new ArrayList<>();
    for (DrugRateRow r : rows) {
      if (r.mhRatio().isPresent()) {
        points.add(
            new RatePoint(
                r.subject(), r.mhRatio(), r.mhLower(), r.mhUpper(), r.rateRatio(), false));
      }
    }
    return points;
  }

  private static DataTable table(List<DrugRateRow> rows) {
    DataTable table =
        new DataTable(
            "Drug classes over the whole cover",
            1,
            "class",
            "exposed episodes",
            "exposed days",
            "rate",
            "other episodes",
            "other days",
            "rate",
            "ratio (95 % limits)",
            "stratified (95 % limits)",
            "q");
    for (DrugRateRow r : rows) {
      RiskSum exposed = new RiskSum(r.exposedSeconds(), r.exposedEpisodes(), 0);
      RiskSum other = new RiskSum(r.unexposedSeconds(), r.unexposedEpisodes(), 0);
      table.row(
          r.subject(),
          Html.count(r.exposedEpisodes(), EpisodeFilter.countedAfter(r.subject(), true).write()),
          Say.days(exposed.days()),
          Say.rate(Incidence.of(exposed).rate()),
          Html.count(r.unexposedEpisodes(), EpisodeFilter.countedAfter(r.subject(), false).write()),
          Say.days(other.days()),
          Say.rate(Incidence.of(other).rate()),
          Say.ratio(r.rateRatio(), r.lower(), r.upper()),
          Say.ratio(r.mhRatio(), r.mhLower(), r.mhUpper()),
          Say.q(r.q()));
    }
    return table;
  }
}
