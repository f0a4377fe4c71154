package millrace.analytics.patient;

import java.time.Instant;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.OptionalLong;
import java.util.Set;
import millrace.analytics.baseline.BaselineFinder;
import millrace.analytics.cohort.CohortClass;
import millrace.analytics.cohort.CohortRule;
import millrace.analytics.criteria.GradualRise;
import millrace.analytics.episode.Episode;
import millrace.analytics.episode.EpisodeDescriber;
import millrace.analytics.episode.SpanFinder;
import millrace.analytics.exposure.Exposure;
import millrace.analytics.mart.AdmissionRow;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.mart.GradualRiseRow;
import millrace.analytics.mart.LinkRow;
import millrace.analytics.mart.QuarantineRow;
import millrace.analytics.pressure.PressureReader;
import millrace.analytics.pressure.PressureSeries;
import millrace.analytics.risk.CellTable;
import millrace.analytics.risk.LocalDays;
import millrace.analytics.risk.RiskCells;
import millrace.analytics.risk.RiskRule;
import millrace.analytics.risk.RiskTime;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.Stretch;
import millrace.analytics.timeline.TimelineBuilder;
import millrace.etl.check.CheckedPatient;
import millrace.etl.check.Quarantined;
import millrace.etl.record.DischargeStatus;

/**
 * Runs the rules of methods 2 to 8 over one patient after another, and adds to the run's cells and
 * tallies as it goes. Not for several threads.
 */
public final class PatientAnalyst {
  private final RunContext context;
  private final CellTable cells = new CellTable();
  private final Tally tally = new Tally();
  private final TimelineBuilder timelines;
  private final BaselineFinder baselines;
  private final CohortRule cohorts;
  private final RiskRule risks;
  private final RiskCells riskCells;
  private final PressureReader pressures;
  private final EpisodeRows episodeRows;
  private final LineRows lineRows;
  private final ActivityTally activity;
  private final FindingTally findings;

  /** An analyst of a run. */
  public PatientAnalyst(RunContext context) {
    this.context = context;
    LocalDays days = new LocalDays(context.cover().zone());
    long coversTo = context.cover().to();
    this.timelines = new TimelineBuilder(context.policy().line(), coversTo);
    this.baselines = new BaselineFinder(context.policy().baseline(), context.cover().zone());
    this.cohorts = new CohortRule(context.policy().cohort(), context.cover().zone());
    this.risks =
        new RiskRule(
            context.policy().episode().hospitalOnsetSeconds(), context.cover().from(), coversTo);
    this.riskCells =
        new RiskCells(
            days, context.unitNumbers(), context.policy().cohort().dayBeforeSeconds(), cells);
    this.pressures = new PressureReader(context.policy().pressure(), context.units());
    this.episodeRows = new EpisodeRows(context, days);
    this.lineRows = new LineRows(context);
    this.activity = new ActivityTally(context, days, tally);
    this.findings = new FindingTally(tally);
  }

  /** Cells of all patients so far, or since they were last taken. */
  public CellTable cells() {
    return cells;
  }

  /** Tallies of all patients so far. */
  public Tally tally() {
    return tally;
  }

  /** The published rows of a patient; for rows without a patient only their quarantine. */
  public PatientOutcome analyse(CheckedPatient rows) {
    List<QuarantineRow> quarantine = rows.quarantine().stream().map(this::quarantined).toList();
    if (rows.patient().isEmpty()) {
      return new PatientOutcome(
          List.of(),
          List.of(),
          List.of(),
          List.of(),
          quarantine,
          List.of(),
          List.of(),
          List.of(),
          List.of(),
          List.of());
    }
    PatientTimeline timeline = timelines.build(rows);
    int admissions = timeline.membership().stretches().size();
    OptionalLong[] ownBaselines = new OptionalLong[admissions];
    List<CohortClass> classes = new ArrayList<>();
    for (int i = 0; i < admissions; i++) {
      ownBaselines[i] = baselines.find(timeline, i);
      classes.add(cohorts.classOf(timeline, i));
    }
    SpanFinder walk = new SpanFinder(context.policy(), timeline, ownBaselines);
    EpisodeDescriber describer =
        new EpisodeDescriber(context.policy(), timeline, context.cover().zone());
    List<Episode> episodes = walk.find().stream().map(describer::describe).toList();
    Exposure exposure =
        Exposure.of(
            timeline.administrations(),
            context.subjects(),
            context.policy().exposure().countOrdered());
    PressureSeries pressure = pressures.read(timeline);
    List<AdmissionRow> admissionRows = new ArrayList<>();
    Set<Integer> counted = new HashSet<>();
    for (int i = 0; i < admissions; i++) {
      OptionalLong atRiskSeconds = OptionalLong.empty();
      if (classes.get(i) == CohortClass.ELIGIBLE) {
        RiskTime risk = risks.of(timeline, i, episodes);
        riskCells.add(
            risk,
            new RiskCells.Strata(timeline.occupancy().seenBy(i), exposure, pressure.recent()),
            episodes);
        risk.countedEpisode().ifPresent(counted::add);
        atRiskSeconds = OptionalLong.of(risk.seconds());
      }
      admissionRows.add(admission(timeline, i, classes.get(i), ownBaselines[i], atRiskSeconds));
      tally.add(Tally.Group.FLOW, classes.get(i).word(), "", "", 1);
      activity.monitoring(timeline, i, classes.get(i), exposure);
    }
    activity.testing(timeline);
    findings.count(timeline, rows, admissionRows);
    return outcome(
        new EpisodeRows.Setting(timeline, classes, exposure, pressure),
        admissionRows,
        episodes,
        counted,
        walk.gradualRises(),
        quarantine);
  }

  private PatientOutcome outcome(
      EpisodeRows.Setting setting,
      List<AdmissionRow> admissions,
      List<Episode> episodes,
      Set<Integer> counted,
      List<GradualRise> rises,
      List<QuarantineRow> quarantine) {
    PatientTimeline timeline = setting.timeline();
    List<EpisodeRow> rows = new ArrayList<>();
    List<LinkRow> links = new ArrayList<>();
    for (int i = 0; i < episodes.size(); i++) {
      rows.add(episodeRows.row(episodes.get(i), counted.contains(i), setting));
      links.addAll(episodeRows.links(episodes.get(i), setting));
    }
    boolean shown = !episodes.isEmpty() || !rises.isEmpty();
    return new PatientOutcome(
        admissions,
        rows,
        rises.stream().map(r -> gradual(timeline, setting.classes(), r)).toList(),
        links,
        quarantine,
        shown ? lineRows.results(timeline) : List.of(),
        shown ? lineRows.doses(timeline) : List.of(),
        shown ? lineRows.pressures(timeline, setting.pressure()) : List.of(),
        shown ? lineRows.stays(timeline) : List.of(),
        shown ? lineRows.replacements(timeline) : List.of());
  }

  private AdmissionRow admission(
      PatientTimeline timeline,
      int number,
      CohortClass cohort,
      OptionalLong baseline,
      OptionalLong atRiskSeconds) {
    Stretch stretch = timeline.membership().stretches().get(number);
    return new AdmissionRow(
        stretch.admission().admissionId(),
        timeline.patient().patientId(),
        cohort.word(),
        Instant.ofEpochSecond(stretch.from()),
        LineRows.instant(stretch.admission().dischargedAt()),
        stretch.admission().dischargeStatus().map(DischargeStatus::word),
        timeline.patient().sex().word(),
        cohorts.ageYears(timeline, stretch),
        baseline,
        CohortRule.resultsOf(timeline.line(), number),
        atRiskSeconds);
  }

  private GradualRiseRow gradual(
      PatientTimeline timeline, List<CohortClass> classes, GradualRise rise) {
    return new GradualRiseRow(
        timeline.patient().patientId(),
        timeline.membership().stretches().get(rise.admission()).admission().admissionId(),
        Instant.ofEpochSecond(rise.at()),
        rise.referenceNanomolesPerLitre(),
        rise.nanomolesPerLitre(),
        classes.get(rise.admission()).word(),
        EpisodeRows.unit(timeline.occupancy().seenBy(rise.admission()), rise.at()));
  }

  private QuarantineRow quarantined(Quarantined row) {
    return quarantineRow(row, context.files());
  }

  /** A row set apart, as published. */
  public static QuarantineRow quarantineRow(Quarantined row, List<String> files) {
    return new QuarantineRow(
        row.table().tableName(),
        files.get(row.source().file()),
        row.source().line(),
        row.broken().rule().word(),
        row.broken().column(),
        row.raw());
  }
}
