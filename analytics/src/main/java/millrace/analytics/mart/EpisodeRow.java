package millrace.analytics.mart;

import java.time.Instant;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;

/**
 * An episode of acute kidney injury. Methods 4, 5, 7, 8.
 *
 * @param episodeId the run's own id, safe in a URL: e-, the part of the table, and a number in it
 * @param patientId identifier in the extract
 * @param admissionId admission the onset belongs to
 * @param cohortClass class of that admission
 * @param onsetAt first result or replacement with evidence
 * @param origin community, hospital or outside
 * @param evidence every kind that held at onset, joined by ;
 * @param referenceNanomolesPerLitre reference creatinine
 * @param onsetNanomolesPerLitre creatinine at onset; empty when a replacement opened it
 * @param peakNanomolesPerLitre first highest creatinine before closing
 * @param peakAt time of that result
 * @param stage 1, 2 or 3
 * @param closedAt closing; empty when not before the end of cover
 * @param course transient or persistent
 * @param prolonged closed more than 7 days after onset, or not closed
 * @param outcome at discharge; empty when the origin is outside
 * @param unitAtOnset unit at onset
 * @param unitDayBefore unit 24 hours before
 * @param linkedAgents agents exposing at onset, joined by ;
 * @param linkedClasses classes exposing at onset, joined by ;
 * @param burden 0, 1, 2 or 3+
 * @param combinations combinations exposing at onset, joined by ;
 * @param minutesLow minutes of low pressure in the window before onset
 * @param lowestMap lowest mean pressure in mmHg
 * @param areaUnderFloor mmHg times minutes under the floor
 * @param observedHours hours of that window covered by readings
 * @param spells counting spells that meet the window
 * @param vasopressor a vasopressor ran in the window
 * @param recentHypotension onset within 48 h of a counting spell
 * @param counted counts in rates
 * @param month calendar month of the onset in the extract's zone, YYYY-MM
 */
public record EpisodeRow(
    String episodeId,
    String patientId,
    Optional<String> admissionId,
    Optional<String> cohortClass,
    Instant onsetAt,
    String origin,
    String evidence,
    OptionalLong referenceNanomolesPerLitre,
    OptionalLong onsetNanomolesPerLitre,
    OptionalLong peakNanomolesPerLitre,
    Optional<Instant> peakAt,
    int stage,
    Optional<Instant> closedAt,
    String course,
    boolean prolonged,
    Optional<String> outcome,
    Optional<String> unitAtOnset,
    Optional<String> unitDayBefore,
    String linkedAgents,
    String linkedClasses,
    String burden,
    String combinations,
    double minutesLow,
    OptionalDouble lowestMap,
    double areaUnderFloor,
    double observedHours,
    int spells,
    boolean vasopressor,
    boolean recentHypotension,
    boolean counted,
    String month) {
  /** The same row with that id. */
  public EpisodeRow withEpisodeId(String id) {
    return new EpisodeRow(
        id,
        patientId,
        admissionId,
        cohortClass,
        onsetAt,
        origin,
        evidence,
        referenceNanomolesPerLitre,
        onsetNanomolesPerLitre,
        peakNanomolesPerLitre,
        peakAt,
        stage,
        closedAt,
        course,
        prolonged,
        outcome,
        unitAtOnset,
        unitDayBefore,
        linkedAgents,
        linkedClasses,
        burden,
        combinations,
        minutesLow,
        lowestMap,
        areaUnderFloor,
        observedHours,
        spells,
        vasopressor,
        recentHypotension,
        counted,
        month);
  }
}
