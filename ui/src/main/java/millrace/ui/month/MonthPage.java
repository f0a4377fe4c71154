package millrace.ui.month;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.Text;
import com.vaadin.flow.component.html.Anchor;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H1;
import com.vaadin.flow.component.html.Main;
import com.vaadin.flow.component.html.Paragraph;
import com.vaadin.flow.router.BeforeEnterEvent;
import com.vaadin.flow.router.Route;
import com.vaadin.flow.router.RouteAlias;
import java.time.YearMonth;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import millrace.analytics.rates.Incidence;
import millrace.analytics.rates.RiskSum;
import millrace.analytics.risk.Attribution;
import millrace.ui.chart.Chart;
import millrace.ui.chart.RateCharts;
import millrace.ui.chart.RatePoint;
import millrace.ui.episodes.EpisodeFilter;
import millrace.ui.mart.Mart;
import millrace.ui.mart.Run;
import millrace.ui.page.DataTable;
import millrace.ui.page.Html;
import millrace.ui.page.Page;
import millrace.ui.page.Say;

/** The month. */
@Route("month")
@RouteAlias("")
public final class MonthPage extends Page {
  private static final long serialVersionUID = 1L;
  private static final int CHART = 260;

  /** Made at each visit. */
  public MonthPage(Mart mart) {
    super(mart, "month");
  }

  @Override
  protected String build(BeforeEnterEvent event, Run run, Main middle) {
    MonthAddress address =
        MonthAddress.read(event.getLocation().getQueryParameters().getParameters());
    MonthFigures figures = MonthFigures.read(run, address.attribution());
    Optional<YearMonth> asked = address.month().or(figures::last);
    if (asked.isEmpty()) {
      middle.add(
          new H1("No month yet"),
          Html.paragraph(
              "lead", "The run has no time at risk: no admission was long enough to count."));
      middle.add(TrustSection.of(run));
      return "No month yet";
    }
    YearMonth month = asked.get();
    MonthAddress at = address.at(month);
    middle.add(new H1(Say.month(month)), steps(at, month), lead(figures, month));
    middle.add(hospital(figures, month, at));
    middle.add(UnitSection.of(figures, month, at));
    middle.add(DrugSection.of(run));
    middle.add(TrustSection.of(run));
    return Say.month(month);
  }

  private static Div steps(MonthAddress at, YearMonth month) {
    Div steps = Html.div("step");
    steps.add(
        Html.link(at.at(month.minusMonths(1)).write(), "‹ " + Say.month(month.minusMonths(1))),
        new Text(" · "),
        Html.link(at.at(month.plusMonths(1)).write(), Say.month(month.plusMonths(1)) + " ›"));
    return steps;
  }

  private static Paragraph lead(MonthFigures figures, YearMonth month) {
    RiskSum sum = figures.hospital(month);
    Paragraph lead = Html.paragraph("lead", "");
    if (sum.seconds() == 0) {
      lead.add(new Text("The run has no time at risk in this month."));
      return lead;
    }
    EpisodeFilter filter = EpisodeFilter.countedIn(month);
    Incidence now = Incidence.of(sum);
    String said = Say.count(sum.episodes(), "hospital-onset episode");
    Component count =
        sum.episodes() == 0 ? Html.span("strong", said) : strong(Html.link(filter.write(), said));
    lead.add(
        count,
        new Text(" in " + Say.days(sum.days()) + " patient-days at risk: "),
        Html.span("strong", Say.rate(now.rate()) + " per 1,000"),
        new Text(" "),
        Html.span("small", "(95 % limits " + Say.limits(now.lower(), now.upper()) + ")"),
        new Text(". "));
    RiskSum before = figures.yearBefore(month);
    Incidence year = Incidence.of(before);
    if (before.seconds() == 0) {
      lead.add(new Text("The run has no time at risk in the twelve months before. "));
    } else {
      lead.add(
          new Text("The twelve months before ran at " + Say.rate(year.rate()) + " "),
          Html.span("small", "(" + Say.limits(year.lower(), year.upper()) + ")"),
          new Text(". "));
    }
    if (sum.stage2plus() > 0) {
      lead.add(
          Html.link(filter.ofStage("2+").write(), Say.count(sum.stage2plus())),
          new Text(" reached stage 2 or 3."));
    } else if (sum.episodes() > 0) {
      lead.add(new Text("None reached stage 2 or 3."));
    }
    return lead;
  }

  private static Component strong(Anchor link) {
    link.addClassName("strong");
    return link;
  }

  private static Div hospital(MonthFigures figures, YearMonth month, MonthAddress at) {
    DataTable table =
        new DataTable(
            "The hospital by month",
            1,
            "month",
            "episodes",
            "days",
            "rate",
            "95 % limits",
            "stage 2+");
    List<RatePoint> points = new ArrayList<>();
    for (Map.Entry<YearMonth, RiskSum> entry : figures.months().entrySet()) {
      RiskSum sum = entry.getValue();
      Incidence rate = Incidence.of(sum);
      EpisodeFilter filter = EpisodeFilter.countedIn(entry.getKey());
      points.add(
          new RatePoint(
              entry.getKey().toString(),
              rate.rate(),
              rate.lower(),
              rate.upper(),
              OptionalDouble.empty(),
              entry.getKey().equals(month)));
      table.row(
          Html.link(at.at(entry.getKey()).write(), Say.month(entry.getKey())),
          Html.count(sum.episodes(), filter.write()),
          Say.days(sum.days()),
          Say.rate(rate.rate()),
          Say.limits(rate.lower(), rate.upper()),
          Html.count(sum.stage2plus(), filter.ofStage("2+").write()));
    }
    Chart chart =
        new Chart(
            "Hospital-onset episodes per 1,000 patient-days at risk by month, with 95 % limits",
            CHART, RateCharts.upright(points));
    Div all = new Div();
    all.add(
        Html.section(
            "The hospital by month",
            "Counted episodes per 1,000 patient-days at risk; line = 95 % limits (exact), large mark = this month.",
            chart,
            Html.fold("The same numbers as a table", table)));
    return all;
  }

  /** The word for an attribution. */
  static String words(Attribution attribution) {
    return attribution == Attribution.AT_ONSET ? "at onset" : "24 hours before";
  }
}
