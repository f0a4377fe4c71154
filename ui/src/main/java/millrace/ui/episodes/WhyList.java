package millrace.ui.episodes;

import com.vaadin.flow.component.HtmlContainer;
import com.vaadin.flow.component.Text;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.mart.LinkRow;
import millrace.ui.page.Html;
import millrace.ui.page.Say;

/** What decided, one definition for each rule. */
final class WhyList {
  private final HtmlContainer list = new HtmlContainer("dl");
  private final EpisodeData data;
  private final EpisodeRow episode;
  private final Creatinine unit;
  private final Clock clock;

  private WhyList(EpisodeData data, Creatinine unit, Clock clock) {
    this.data = data;
    this.episode = data.episode();
    this.unit = unit;
    this.clock = clock;
    list.addClassName("why");
  }

  static HtmlContainer of(EpisodeData data, Creatinine unit, Clock clock) {
    WhyList why = new WhyList(data, unit, clock);
    why.onset();
    why.stage();
    why.origin();
    why.closing();
    data.links().forEach(why::linked);
    NotLinked.of(data).forEach(n -> why.add(n.name(), "no", "not linked: " + n.reason(), n.rule()));
    why.pressure();
    why.outcome();
    return why.list;
  }

  private void add(String term, String cssClass, String said, String rule) {
    HtmlContainer definition = new HtmlContainer("dd");
    definition.add(new Text(said + " "), Html.span("rule", rule));
    if (!cssClass.isEmpty()) {
      definition.addClassName(cssClass);
    }
    HtmlContainer name = new HtmlContainer("dt");
    name.setText(term);
    list.add(name, definition);
  }

  private void onset() {
    String said;
    if (episode.onsetNanomolesPerLitre().isEmpty()) {
      said = "A kidney replacement that is not maintenance started.";
    } else {
      long v = episode.onsetNanomolesPerLitre().getAsLong();
      said =
          episode.referenceNanomolesPerLitre().isEmpty()
              ? unit.full(v) + "; there is no reference."
              : against(v, episode.referenceNanomolesPerLitre().getAsLong());
    }
    add(
        "Onset " + clock.brief(episode.onsetAt()),
        "",
        said,
        EpisodeWords.evidence(episode.evidence()) + " · methods 4");
  }

  private String against(long value, long reference) {
    return unit.full(value)
        + " is "
        + Creatinine.times(value, reference)
        + " × the reference of "
        + unit.say(reference)
        + " ("
        + unit.rise(reference, value)
        + ").";
  }

  private void stage() {
    String said = "No creatinine stands inside it; a replacement makes stage 3.";
    if (episode.peakNanomolesPerLitre().isPresent()) {
      long peak = episode.peakNanomolesPerLitre().getAsLong();
      said =
          (episode.referenceNanomolesPerLitre().isPresent()
                  ? "At the peak " + against(peak, episode.referenceNanomolesPerLitre().getAsLong())
                  : "The peak is " + unit.full(peak) + ", without a reference.")
              + episode.peakAt().map(t -> " " + clock.brief(t) + ".").orElse("");
    }
    boolean replaced =
        data.replacements().stream()
            .anyMatch(r -> !r.purpose().equals("maintenance") && data.inside(r.startedAt()));
    if (replaced && episode.peakNanomolesPerLitre().isPresent()) {
      said += " A kidney replacement started inside it.";
    }
    add(
        "Stage " + episode.stage(),
        "",
        said,
        "the highest before closing: 2 from 2.0 ×, 3 from 3.0 ×, "
            + unit.full(CEILING)
            + " or a replacement · methods 5");
  }

  private static final long CEILING = 353_600;

  private void origin() {
    String said =
        data.admission()
            .map(
                a ->
                    Clock.span(Clock.hours(a.admittedAt(), episode.onsetAt()))
                        + " after admission; the admission is of class "
                        + a.cohortClass().replace('-', ' ')
                        + ".")
            .orElse("The onset belongs to no admission.");
    add(
        Character.toUpperCase(episode.origin().charAt(0))
            + episode.origin().substring(1)
            + " onset",
        "",
        said,
        "border 48 h · methods 5");
    add(
        episode.counted() ? "Counted" : "Not counted",
        "",
        episode.counted()
            ? "It counts in rates: of hospital origin, the first of its admission, and it ended the time at risk."
            : "It counts in no rate; it is listed only.",
        "methods 6");
  }

  private void closing() {
    add(
        episode.closedAt().isPresent() ? "Closed" : "Not closed",
        "",
        episode
                .closedAt()
                .map(
                    c ->
                        clock.brief(c) + ", " + Clock.span(episode.onsetAt(), c) + " after onset; ")
                .orElse("Not before the end of the cover; ")
            + episode.course()
            + (episode.prolonged() ? ", prolonged." : "."),
        "under 1.5 × and under " + unit.full(RISE) + " above the reference, for 48 h · methods 5");
  }

  private static final long RISE = 26_500;

  private void linked(LinkRow link) {
    String rule =
        data.doses().stream()
            .filter(d -> d.exposing() && d.agent().filter(link.agent()::equals).isPresent())
            .findFirst()
            .map(NotLinked::window)
            .orElse("");
    add(
        link.agent(),
        "",
        "linked: "
            + Say.count(link.doses(), "dose")
            + " on "
            + Say.count(link.doseDays(), "day")
            + (link.doses() == 1
                ? ", "
                : ", the first "
                    + Clock.span(link.firstDoseAt(), episode.onsetAt())
                    + " and the last ")
            + Clock.span(link.lastDoseAt(), episode.onsetAt())
            + " before onset.",
        rule + " · " + link.mechanism().replace(";", ", ") + " · methods 7");
  }

  private void pressure() {
    String said =
        episode.lowestMap().isEmpty()
            ? "No reading in the 48 hours before onset."
            : Say.count(Math.round(episode.minutesLow()), "minute")
                + " low in the 48 hours before onset (lowest mean "
                + Say.days(episode.lowestMap().getAsDouble())
                + " mmHg; "
                + Say.days(episode.areaUnderFloor())
                + " mmHg·min under the floor of "
                + Say.days(data.floor())
                + "), "
                + Say.rate(episode.observedHours())
                + " of 48 hours observed.";
    add(
        "Pressure",
        episode.recentHypotension() ? "fired" : "",
        said + (episode.vasopressor() ? " A vasopressor ran." : ""),
        Say.count(episode.spells(), "counting spell")
            + "; recent hypotension at onset: "
            + (episode.recentHypotension() ? "yes" : "no")
            + " · methods 8");
  }

  private void outcome() {
    add(
        "Outcome",
        "",
        episode
            .outcome()
            .map(o -> o.replace('-', ' ') + " at discharge.")
            .orElse("None: outside any admission."),
        "by the last result of the admission · methods 5");
  }
}
