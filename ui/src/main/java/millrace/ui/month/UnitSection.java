package millrace.ui.month;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.html.Section;
import java.time.YearMonth;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import millrace.analytics.rates.Incidence;
import millrace.ui.chart.Chart;
import millrace.ui.chart.RateCharts;
import millrace.ui.chart.RatePoint;
import millrace.ui.episodes.EpisodeFilter;
import millrace.ui.page.DataTable;
import millrace.ui.page.Html;
import millrace.ui.page.Say;

/** Units in a month: chart and table. */
final class UnitSection {
  private static final int ROW = 27;
  private static final int REST = 50;

  private UnitSection() {}

  static Section of(MonthFigures figures, YearMonth month, MonthAddress at) {
    List<MonthFigures.UnitFigure> units = figures.units(month);
    String other = MonthPage.words(at.other().attribution());
    Component turn =
        Html.div(
            "step", Html.link(at.other().write(), "count each by the unit " + other + " instead"));
    String say =
        "Episodes per 1,000 patient-days at risk, all on one scale, each by the unit "
            + MonthPage.words(at.attribution())
            + ". A unit that tests more finds more. The upper limit of a unit without an episode may run past the scale; the table has it.";
    if (units.isEmpty()) {
      return Html.section("Where", "No unit has time at risk in this month.", turn);
    }
    List<RatePoint> points = new ArrayList<>();
    DataTable table =
        new DataTable(
            "Units in " + Say.month(month),
            1,
            "unit",
            "episodes",
            "days",
            "rate",
            "95 % limits",
            "stage 2+",
            "results per patient-day");
    for (MonthFigures.UnitFigure unit : units) {
      Incidence rate = unit.incidence();
      EpisodeFilter filter = EpisodeFilter.countedIn(month).in(unit.unitId(), at.attribution());
      points.add(
          new RatePoint(
              unit.name(), rate.rate(), rate.lower(), rate.upper(), OptionalDouble.empty(), false));
      table.row(
          unit.name(),
          Html.count(unit.sum().episodes(), filter.write()),
          Say.days(unit.sum().days()),
          Say.rate(rate.rate()),
          Say.limits(rate.lower(), rate.upper()),
          Html.count(unit.sum().stage2plus(), filter.ofStage("2+").write()),
          Say.ratio(unit.testsPerDay()));
    }
    Chart chart =
        new Chart(
            "Rate of each unit with 95 % limits",
            REST + ROW * points.size(), RateCharts.lying(points));
    return Html.section("Where", say, turn, Html.div("cols", chart, table));
  }
}
