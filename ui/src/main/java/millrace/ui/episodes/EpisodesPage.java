package millrace.ui.episodes;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.grid.Grid;
import com.vaadin.flow.component.grid.GridVariant;
import com.vaadin.flow.component.html.H1;
import com.vaadin.flow.component.html.Main;
import com.vaadin.flow.router.BeforeEnterEvent;
import com.vaadin.flow.router.Route;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.mart.UnitRow;
import millrace.ui.mart.Mart;
import millrace.ui.mart.Run;
import millrace.ui.page.Html;
import millrace.ui.page.Page;
import millrace.ui.page.Say;

/** The list of episodes, filtered by its address. */
@Route("episodes")
public final class EpisodesPage extends Page {
  private static final long serialVersionUID = 1L;
  private static final int PAGE_SIZE = 60;

  /** Made at each visit. */
  public EpisodesPage(Mart mart) {
    super(mart, "episodes");
  }

  @Override
  protected String build(BeforeEnterEvent event, Run run, Main middle) {
    EpisodeFilter filter =
        EpisodeFilter.read(event.getLocation().getQueryParameters().getParameters());
    List<UnitRow> units = run.rows(UnitRow.class);
    Map<String, String> names =
        units.stream().collect(Collectors.toMap(UnitRow::unitId, UnitRow::name, (a, b) -> a));
    int all = run.count(EpisodeRow.class, filter.condition());
    middle.add(new H1("Episodes"));
    middle.add(
        Html.paragraph(
            "lead",
            Say.count(all, "episode")
                + " "
                + FilterWords.of(filter, names)
                + ", the latest first."));
    middle.add(new FilterBar(filter, units));
    if (all == 0) {
      middle.add(
          Html.paragraph("say", "Nothing meets all of these. Take one of them off to see more."));
    } else {
      middle.add(grid(run, filter, names, all));
    }
    return "Episodes";
  }

  private static Component grid(Run run, EpisodeFilter filter, Map<String, String> names, int all) {
    Clock clock = new Clock(run.manifest().zone());
    Grid<EpisodeRow> grid = new Grid<>();
    grid.addThemeVariants(GridVariant.LUMO_NO_BORDER, GridVariant.LUMO_WRAP_CELL_CONTENT);
    grid.setSelectionMode(Grid.SelectionMode.NONE);
    grid.setPageSize(PAGE_SIZE);
    grid.getElement().setAttribute("aria-label", "Episodes");
    grid.addComponentColumn(e -> Html.link("episodes/" + e.episodeId(), e.episodeId()))
        .setHeader("episode")
        .setFrozen(true)
        .setWidth("92px")
        .setFlexGrow(0);
    column(grid, "onset", 116, e -> clock.full(e.onsetAt()));
    column(grid, "unit", 140, e -> EpisodeWords.unit(e.unitAtOnset(), names));
    column(grid, "stage", 60, e -> Integer.toString(e.stage()));
    column(grid, "origin", 118, EpisodeRow::origin);
    column(grid, "evidence", 142, e -> EpisodeWords.evidence(e.evidence()));
    column(grid, "reference", 92, e -> Creatinine.MG.say(e.referenceNanomolesPerLitre()));
    column(grid, "peak, mg/dL", 76, e -> Creatinine.MG.say(e.peakNanomolesPerLitre()));
    column(grid, "linked agents", 152, e -> e.linkedAgents().replace(";", ", "));
    column(grid, "minutes low", 76, e -> Say.days(e.minutesLow()));
    column(grid, "outcome", 96, e -> e.outcome().orElse("–").replace('-', ' '));
    grid.setItems(
        query ->
            run
                .rows(
                    EpisodeRow.class,
                    filter.condition(),
                    "ORDER BY onset_at DESC, episode_id LIMIT "
                        + query.getLimit()
                        + " OFFSET "
                        + query.getOffset())
                .stream(),
        query -> all);
    if (all <= PAGE_SIZE / 2) {
      grid.setAllRowsVisible(true);
    } else {
      grid.setHeight("70vh");
    }
    return grid;
  }

  private static void column(
      Grid<EpisodeRow> grid, String head, int width, Function<EpisodeRow, String> text) {
    grid.addColumn(text::apply).setHeader(head).setWidth(width + "px").setFlexGrow(1);
  }
}
