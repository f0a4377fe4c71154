package millrace.ui.episodes;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.mart.LinkRow;
import millrace.ui.page.Say;

/** An episode in a few sentences. */
final class EpisodeLead {
  private EpisodeLead() {}

  static String of(EpisodeData data, Creatinine unit, Clock clock) {
    EpisodeRow e = data.episode();
    List<String> sentences = new ArrayList<>();
    String where = EpisodeWords.unit(e.unitAtOnset(), data.units());
    String before = EpisodeWords.unit(e.unitDayBefore(), data.units());
    sentences.add(
        "Stage "
            + e.stage()
            + ", "
            + (e.origin().equals("outside") ? "onset outside any admission" : e.origin() + " onset")
            + ", "
            + clock.full(e.onsetAt())
            + ", "
            + where
            + (where.equals(before)
                ? ", the day before too."
                : "; the day before, " + before + "."));
    sentences.add(creatinine(e, unit));
    sentences.add(links(data));
    sentences.add(
        e.minutesLow() > 0
            ? Say.count(Math.round(e.minutesLow()), "minute")
                + " of low pressure in the 48 hours before."
            : "No low pressure was recorded in the 48 hours before.");
    return String.join(" ", sentences);
  }

  private static String creatinine(EpisodeRow e, Creatinine unit) {
    if (e.peakNanomolesPerLitre().isEmpty()) {
      return "A kidney replacement opened it; no result of creatinine stands inside it.";
    }
    String peak = unit.full(e.peakNanomolesPerLitre().getAsLong());
    Instant peakAt = e.peakAt().orElse(e.onsetAt());
    StringBuilder said = new StringBuilder("Creatinine ");
    if (e.referenceNanomolesPerLitre().isPresent()) {
      said.append("against a reference of ")
          .append(unit.say(e.referenceNanomolesPerLitre().getAsLong()))
          .append(" reached ");
    } else {
      said.append("without a reference reached ");
    }
    said.append("its peak of ").append(peak);
    said.append(
        peakAt.equals(e.onsetAt())
            ? " at onset"
            : " " + Clock.span(e.onsetAt(), peakAt) + " after onset");
    e.closedAt()
        .ifPresentOrElse(
            closed ->
                said.append(", and the episode closed after ")
                    .append(Clock.span(e.onsetAt(), closed)),
            () -> said.append(", and the episode had not closed when the cover ended"));
    return said.append('.').toString();
  }

  private static String links(EpisodeData data) {
    if (data.links().isEmpty()) {
      return "No watched drug was exposing at onset.";
    }
    return "Exposing at onset: "
        + data.links().stream().map(LinkRow::agent).collect(Collectors.joining(", "))
        + ".";
  }
}
