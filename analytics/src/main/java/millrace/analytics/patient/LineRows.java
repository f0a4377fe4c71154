package millrace.analytics.patient;

import java.time.Instant;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import millrace.analytics.exposure.WatchedDrug;
import millrace.analytics.exposure.Watchlist;
import millrace.analytics.mart.DoseLine;
import millrace.analytics.mart.PressureLine;
import millrace.analytics.mart.ReplacementLine;
import millrace.analytics.mart.ResultLine;
import millrace.analytics.mart.StayLine;
import millrace.analytics.pressure.PressureMeasures;
import millrace.analytics.pressure.PressureSeries;
import millrace.analytics.pressure.Reading;
import millrace.analytics.timeline.Membership;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.ReplacementSpan;
import millrace.etl.record.Administration;
import millrace.etl.record.BloodPressure;
import millrace.etl.record.CreatinineResult;
import millrace.etl.record.DoseBasis;
import millrace.etl.record.Seconds;
import millrace.etl.record.SourceLine;
import millrace.etl.record.UnitStay;

/**
 * Writes the rows behind an episode's page: every kept row of the patient with its source and what
 * became of it.
 */
final class LineRows {
  private final RunContext context;

  LineRows(RunContext context) {
    this.context = context;
  }

  List<ResultLine> results(PatientTimeline timeline) {
    List<ResultLine> lines = new ArrayList<>();
    for (int i = 0; i < timeline.results().size(); i++) {
      CreatinineResult result = timeline.results().get(i);
      int admission = timeline.membership().belongsTo(result.collectedAt());
      lines.add(
          new ResultLine(
              timeline.patient().patientId(),
              Instant.ofEpochSecond(result.collectedAt()),
              instant(result.resultedAt()),
              result.nanomolesPerLitre(),
              timeline.resultStates().get(i).word(),
              admission == Membership.NONE
                  ? Optional.empty()
                  : Optional.of(
                      timeline.membership().stretches().get(admission).admission().admissionId()),
              result.setting().word(),
              file(result.source()),
              result.source().line()));
    }
    return lines;
  }

  List<DoseLine> doses(PatientTimeline timeline) {
    return timeline.administrations().stream()
        .map(d -> dose(timeline.patient().patientId(), d))
        .toList();
  }

  List<PressureLine> pressures(PatientTimeline timeline, PressureSeries series) {
    Map<SourceLine, Reading> used = new HashMap<>();
    series.readings().forEach(r -> used.put(r.pressure().source(), r));
    List<PressureLine> lines = new ArrayList<>();
    for (BloodPressure pressure : timeline.pressures()) {
      Reading reading = used.get(pressure.source());
      lines.add(
          new PressureLine(
              timeline.patient().patientId(),
              Instant.ofEpochSecond(pressure.measuredAt()),
              EpisodeRows.mmHg(pressure.systolicNanoMmHg()),
              EpisodeRows.mmHg(pressure.diastolicNanoMmHg()),
              EpisodeRows.mmHg(pressure.meanNanoMmHg()),
              pressure.hasMap()
                  ? OptionalDouble.of(PressureMeasures.mmHg(pressure.mapThirdsNanoMmHg()))
                  : OptionalDouble.empty(),
              pressure.method().word(),
              reading == null,
              reading != null && reading.low(),
              reading == null ? 0 : reading.heldSeconds(),
              file(pressure.source()),
              pressure.source().line()));
    }
    return lines;
  }

  List<StayLine> stays(PatientTimeline timeline) {
    List<StayLine> lines = new ArrayList<>();
    for (UnitStay stay : timeline.stays()) {
      lines.add(
          new StayLine(
              timeline.patient().patientId(),
              stay.admissionId(),
              stay.unitId(),
              Instant.ofEpochSecond(stay.enteredAt()),
              instant(stay.leftAt()),
              file(stay.source()),
              stay.source().line()));
    }
    return lines;
  }

  List<ReplacementLine> replacements(PatientTimeline timeline) {
    List<ReplacementLine> lines = new ArrayList<>();
    for (ReplacementSpan span : timeline.replacements()) {
      SourceLine source = span.replacement().source();
      lines.add(
          new ReplacementLine(
              timeline.patient().patientId(),
              Instant.ofEpochSecond(span.from()),
              instant(span.replacement().endedAt()),
              span.replacement().modality().word(),
              span.replacement().purpose().word(),
              Instant.ofEpochSecond(span.maskedUntil()),
              file(source),
              source.line()));
    }
    return lines;
  }

  String file(SourceLine source) {
    return context.files().get(source.file());
  }

  static Optional<Instant> instant(long epochSecond) {
    return Seconds.given(epochSecond)
        ? Optional.of(Instant.ofEpochSecond(epochSecond))
        : Optional.empty();
  }

  private DoseLine dose(String patientId, Administration dose) {
    Watchlist watchlist = context.subjects().watchlist();
    List<WatchedDrug> byCode = dose.atc().isEmpty() ? List.of() : watchlist.byCode(dose.atc());
    List<WatchedDrug> exposing =
        dose.atc().isEmpty() ? List.of() : watchlist.exposing(dose.atc(), dose.route());
    boolean ordered =
        dose.basis() == DoseBasis.ORDERED && !context.policy().exposure().countOrdered();
    String note = "";
    if (byCode.isEmpty()) {
      note = "not watched";
    } else if (exposing.isEmpty()) {
      note = "route not counted";
    } else if (ordered) {
      note = "ordered only";
    }
    Optional<WatchedDrug> drug = (exposing.isEmpty() ? byCode : exposing).stream().findFirst();
    return new DoseLine(
        patientId,
        Instant.ofEpochSecond(dose.startedAt()),
        instant(dose.endedAt()),
        dose.drug(),
        dose.drugName(),
        dose.route().word(),
        dose.dose(),
        dose.basis().word(),
        drug.map(WatchedDrug::agent),
        drug.map(WatchedDrug::drugClass),
        note.isEmpty(),
        note,
        drug.map(WatchedDrug::lagSeconds).orElse(0L),
        drug.map(WatchedDrug::lookBackSeconds).orElse(0L),
        file(dose.source()),
        dose.source().line());
  }
}
