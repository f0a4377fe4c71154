package millrace.ui.episodes;

import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import millrace.analytics.mart.AdmissionRow;
import millrace.analytics.mart.DoseLine;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.mart.LinkRow;
import millrace.analytics.mart.PressureLine;
import millrace.analytics.mart.ReplacementLine;
import millrace.analytics.mart.ResultLine;
import millrace.analytics.mart.StayLine;
import millrace.analytics.mart.UnitRow;
import millrace.ui.mart.Condition;
import millrace.ui.mart.Run;

/**
 * An episode with the rows around it.
 *
 * @param episode the episode
 * @param from start of what is shown
 * @param to end of what is shown
 * @param admission its admission
 * @param results creatinine shown
 * @param doses doses of the patient, all
 * @param pressures blood pressures shown
 * @param stays unit stays shown
 * @param replacements replacements shown
 * @param links agents exposing at onset
 * @param units names of units
 * @param floor floor of the mean pressure in mmHg
 */
record EpisodeData(
    EpisodeRow episode,
    Instant from,
    Instant to,
    Optional<AdmissionRow> admission,
    List<ResultLine> results,
    List<DoseLine> doses,
    List<PressureLine> pressures,
    List<StayLine> stays,
    List<ReplacementLine> replacements,
    List<LinkRow> links,
    Map<String, String> units,
    double floor) {
  private static final Duration AROUND = Duration.ofDays(10);
  private static final String DEFAULT_FLOOR = "65";

  static Optional<EpisodeData> read(Run run, String episodeId) {
    return run.rows(EpisodeRow.class, Condition.equal("episode_id", episodeId), "").stream()
        .findFirst()
        .map(episode -> around(run, episode));
  }

  private static EpisodeData around(Run run, EpisodeRow episode) {
    Instant from = episode.onsetAt().minus(AROUND);
    Instant to = episode.closedAt().or(episode::peakAt).orElse(episode.onsetAt()).plus(AROUND);
    Condition patient = Condition.equal("patient_id", episode.patientId());
    Function<Instant, Boolean> shown = t -> !t.isBefore(from) && !t.isAfter(to);
    return new EpisodeData(
        episode,
        from,
        to,
        episode
            .admissionId()
            .flatMap(
                id ->
                    run.rows(AdmissionRow.class, Condition.equal("admission_id", id), "").stream()
                        .findFirst()),
        run.rows(ResultLine.class, patient, "ORDER BY collected_at, line").stream()
            .filter(r -> shown.apply(r.collectedAt()))
            .toList(),
        run.rows(DoseLine.class, patient, "ORDER BY started_at, line"),
        run.rows(PressureLine.class, patient, "ORDER BY measured_at, line").stream()
            .filter(p -> shown.apply(p.measuredAt()))
            .toList(),
        run.rows(StayLine.class, patient, "ORDER BY entered_at, line").stream()
            .filter(s -> meets(s.enteredAt(), s.leftAt(), from, to))
            .toList(),
        run.rows(ReplacementLine.class, patient, "ORDER BY started_at, line").stream()
            .filter(r -> meets(r.startedAt(), Optional.of(r.maskedUntil()), from, to))
            .toList(),
        run.rows(LinkRow.class, patient, "ORDER BY agent").stream()
            .filter(l -> l.onsetAt().equals(episode.onsetAt()))
            .toList(),
        run.rows(UnitRow.class).stream()
            .collect(Collectors.toMap(UnitRow::unitId, UnitRow::name, (a, b) -> a)),
        Double.parseDouble(
            run.manifest().policySettings().getOrDefault("map_floor", DEFAULT_FLOOR)));
  }

  /** Doses whose time meets what is shown. */
  List<DoseLine> dosesShown() {
    return doses.stream()
        .filter(
            d -> meets(d.startedAt(), d.endedAt().or(() -> Optional.of(d.startedAt())), from, to))
        .toList();
  }

  /** Whether an instant lies inside the episode. */
  boolean inside(Instant at) {
    return !at.isBefore(episode.onsetAt()) && episode.closedAt().map(at::isBefore).orElse(true);
  }

  private static boolean meets(Instant start, Optional<Instant> end, Instant from, Instant to) {
    return !start.isAfter(to) && end.map(e -> !e.isBefore(from)).orElse(true);
  }
}
