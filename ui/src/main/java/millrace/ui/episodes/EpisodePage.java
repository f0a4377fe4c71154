package millrace.ui.episodes;

import com.vaadin.flow.component.Text;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H1;
import com.vaadin.flow.component.html.Main;
import com.vaadin.flow.router.BeforeEnterEvent;
import com.vaadin.flow.router.NotFoundException;
import com.vaadin.flow.router.Route;
import java.util.List;
import java.util.Map;
import java.util.Set;
import millrace.ui.chart.Chart;
import millrace.ui.mart.Mart;
import millrace.ui.mart.Run;
import millrace.ui.page.Html;
import millrace.ui.page.Page;
import millrace.ui.page.Query;

/** One episode. */
@Route("episodes/:episodeId")
public final class EpisodePage extends Page {
  private static final long serialVersionUID = 1L;

  /** Made at each visit. */
  public EpisodePage(Mart mart) {
    super(mart, "episodes");
  }

  @Override
  protected String build(BeforeEnterEvent event, Run run, Main middle) {
    String id = event.getRouteParameters().get("episodeId").orElse("");
    Map<String, List<String>> values = event.getLocation().getQueryParameters().getParameters();
    Creatinine unit =
        Query.of(values, Set.of("unit")).word("unit", List.of("mg", "umol")).stream()
            .map(u -> u.equals("umol") ? Creatinine.UMOL : Creatinine.MG)
            .findFirst()
            .orElse(Creatinine.MG);
    EpisodeData data =
        EpisodeData.read(run, id)
            .orElseThrow(
                () -> new NotFoundException("The run that is served has no episode of this name."));
    Clock clock = new Clock(run.manifest().zone());
    String month = data.episode().month();
    Div steps = Html.div("step", Html.link("episodes?month=" + month, "‹ Episodes of " + month));
    String other = unit == Creatinine.MG ? "umol" : "mg";
    steps.add(
        new Text(" · "),
        Html.link(
            "episodes/" + id + "?unit=" + other,
            "show " + (unit == Creatinine.MG ? Creatinine.UMOL : Creatinine.MG).unit()));
    middle.add(steps, new H1("Episode " + id));
    middle.add(Html.paragraph("lead", EpisodeLead.of(data, unit, clock)));
    EpisodeChart chart = new EpisodeChart(data, unit, clock);
    middle.add(
        Html.div(
            "wide",
            new Chart(
                "Creatinine, doses, mean pressure and unit stays around episode "
                    + id
                    + " on one time axis; the same numbers stand in the tables below",
                chart.height(),
                chart.options())));
    middle.add(
        Html.paragraph(
            "say",
            "Filled = inside the episode, or a dose that exposes; hollow = outside, or a dose that does not; diamond = a result masked by a replacement."
                + " Shaded: the 48 hours before onset. Clay: a reading under the floor. Times in "
                + run.manifest().zone()
                + "."));
    middle.add(
        Html.section(
            "Why it is an episode, and what is linked",
            "A link says that the drug was given when it could have contributed; it is not a cause.",
            WhyList.of(data, unit, clock)));
    middle.add(RawRows.of(data, unit, clock));
    return "Episode " + id;
  }
}
