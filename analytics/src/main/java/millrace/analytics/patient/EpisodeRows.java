package millrace.analytics.patient;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.OptionalLong;
import java.util.stream.Collectors;
import millrace.analytics.cohort.CohortClass;
import millrace.analytics.episode.Episode;
import millrace.analytics.episode.Outcome;
import millrace.analytics.episode.Span;
import millrace.analytics.exposure.Exposure;
import millrace.analytics.exposure.Link;
import millrace.analytics.exposure.LinkFinder;
import millrace.analytics.exposure.Subjects;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.mart.LinkRow;
import millrace.analytics.pressure.PressureMeasures;
import millrace.analytics.pressure.PressureSeries;
import millrace.analytics.pressure.Vasopressors;
import millrace.analytics.risk.LocalDays;
import millrace.analytics.timeline.CreatinineLine;
import millrace.analytics.timeline.Membership;
import millrace.analytics.timeline.Occupancy;
import millrace.analytics.timeline.PatientTimeline;
import millrace.etl.record.BloodPressure;

/** Writes an episode and its links as published rows (methods 5, 7, 8). */
final class EpisodeRows {
  private static final int MONTH_LENGTH = 7;
  private static final double SECONDS_OF_A_MINUTE = 60;
  private static final double SECONDS_OF_AN_HOUR = 3_600;

  private final RunContext context;
  private final LinkFinder links;
  private final Vasopressors vasopressors;
  private final LocalDays days;

  EpisodeRows(RunContext context, LocalDays days) {
    this.context = context;
    this.links = new LinkFinder(context.subjects(), context.cover().zone());
    this.vasopressors =
        new Vasopressors(context.policy().pressure(), context.policy().exposure().countOrdered());
    this.days = days;
  }

  /** What an episode of a patient is described with. */
  record Setting(
      PatientTimeline timeline,
      List<CohortClass> classes,
      Exposure exposure,
      PressureSeries pressure) {}

  EpisodeRow row(Episode episode, boolean counted, Setting setting) {
    Span span = episode.span();
    long onset = span.onset();
    PatientTimeline timeline = setting.timeline();
    PressureMeasures measures =
        PressureMeasures.before(onset, setting.pressure(), context.policy().pressure());
    Occupancy occupancy = timeline.occupancy().seenBy(span.admission());
    boolean inAdmission = span.admission() != Membership.NONE;
    long dayBefore = onset - context.policy().cohort().dayBeforeSeconds();
    return new EpisodeRow(
        "",
        timeline.patient().patientId(),
        inAdmission
            ? Optional.of(
                timeline.membership().stretches().get(span.admission()).admission().admissionId())
            : Optional.empty(),
        inAdmission
            ? Optional.of(setting.classes().get(span.admission()).word())
            : Optional.empty(),
        Instant.ofEpochSecond(onset),
        episode.origin().word(),
        span.evidence().stream().map(Enum::name).sorted().collect(Collectors.joining(";")),
        span.reference(),
        value(
            timeline.line(),
            span.onsetResult() < 0 ? OptionalInt.empty() : OptionalInt.of(span.onsetResult())),
        value(timeline.line(), episode.peakResult()),
        episode.peakResult().isPresent()
            ? Optional.of(
                Instant.ofEpochSecond(timeline.line().at()[episode.peakResult().getAsInt()]))
            : Optional.empty(),
        episode.stage(),
        span.closing() < context.cover().to()
            ? Optional.of(Instant.ofEpochSecond(span.closing()))
            : Optional.empty(),
        episode.transientCourse() ? "transient" : "persistent",
        episode.prolonged(),
        episode.outcome().map(Outcome::word),
        unit(occupancy, onset),
        unit(occupancy, dayBefore),
        links.exposing(setting.exposure(), Subjects.Level.AGENT, onset),
        links.exposing(setting.exposure(), Subjects.Level.CLASS, onset),
        Exposure.burdenWord(setting.exposure().burdenAt(onset)),
        links.exposing(setting.exposure(), Subjects.Level.COMBINATION, onset),
        measures.lowSeconds() / SECONDS_OF_A_MINUTE,
        measures.lowestMapThirdsNanoMmHg().isPresent()
            ? OptionalDouble.of(
                PressureMeasures.mmHg(measures.lowestMapThirdsNanoMmHg().getAsLong()))
            : OptionalDouble.empty(),
        measures.areaMmHgMinutes(),
        measures.observedSeconds() / SECONDS_OF_AN_HOUR,
        measures.spells(),
        vasopressors.before(onset, timeline.administrations()),
        setting.pressure().recent().contains(onset),
        counted,
        month(onset));
  }

  List<LinkRow> links(Episode episode, Setting setting) {
    String patientId = setting.timeline().patient().patientId();
    return links.links(setting.exposure(), episode.span().onset()).stream()
        .map(link -> link(patientId, episode, link))
        .toList();
  }

  /** The calendar month of an instant in the extract's zone. */
  String month(long instant) {
    return LocalDate.ofEpochDay(days.dayOf(instant)).toString().substring(0, MONTH_LENGTH);
  }

  static Optional<String> unit(Occupancy occupancy, long instant) {
    String unit = occupancy.unitAt(instant);
    return unit.isEmpty() ? Optional.empty() : Optional.of(unit);
  }

  /** A pressure in mmHg, or empty. */
  static OptionalDouble mmHg(long nano) {
    return nano == BloodPressure.NONE
        ? OptionalDouble.empty()
        : OptionalDouble.of(nano / (double) BloodPressure.NANOS);
  }

  private LinkRow link(String patientId, Episode episode, Link link) {
    return new LinkRow(
        patientId,
        Instant.ofEpochSecond(episode.span().onset()),
        link.agent(),
        context.subjects().classOfAgent().get(link.agent()),
        context.subjects().mechanismOfAgent().get(link.agent()),
        Instant.ofEpochSecond(link.firstDoseAt()),
        Instant.ofEpochSecond(link.lastDoseAt()),
        link.doseDays(),
        link.doses());
  }

  private static OptionalLong value(CreatinineLine line, OptionalInt result) {
    return result.isPresent()
        ? OptionalLong.of(line.nanomolesPerLitre()[result.getAsInt()])
        : OptionalLong.empty();
  }
}
