package millrace.analytics.cohort;

import java.time.Instant;
import java.time.ZoneId;
import java.time.temporal.ChronoUnit;
import java.util.List;
import millrace.analytics.policy.CohortPolicy;
import millrace.analytics.timeline.CreatinineLine;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.ReplacementSpan;
import millrace.analytics.timeline.Stretch;
import millrace.etl.record.Condition;
import millrace.etl.record.ConditionCodeSystem;
import millrace.etl.record.ReplacementPurpose;
import millrace.etl.record.Seconds;

/** Puts each admission in the first class that fits (methods 6). */
public final class CohortRule {
  private final CohortPolicy policy;
  private final ZoneId zone;
  private final CodePatterns dialysisIcd10;
  private final CodePatterns dialysisIcd9;
  private final CodePatterns transplantIcd10;
  private final CodePatterns transplantIcd9;

  /** The rule of a policy. */
  public CohortRule(CohortPolicy policy, ZoneId zone) {
    this.policy = policy;
    this.zone = zone;
    this.dialysisIcd10 = new CodePatterns(policy.maintenanceDialysisIcd10());
    this.dialysisIcd9 = new CodePatterns(policy.maintenanceDialysisIcd9());
    this.transplantIcd10 = new CodePatterns(policy.transplantIcd10());
    this.transplantIcd9 = new CodePatterns(policy.transplantIcd9());
  }

  /** The class of an admission, by its number. */
  public CohortClass classOf(PatientTimeline timeline, int admission) {
    Stretch stretch = timeline.membership().stretches().get(admission);
    if (ageYears(timeline, stretch) < policy.minAgeYears()) {
      return CohortClass.UNDER_AGE;
    }
    if (hasCondition(timeline, stretch, dialysisIcd10, dialysisIcd9)
        || onMaintenance(timeline, stretch)) {
      return CohortClass.MAINTENANCE_DIALYSIS;
    }
    if (hasCondition(timeline, stretch, transplantIcd10, transplantIcd9)) {
      return CohortClass.TRANSPLANT;
    }
    return assessable(timeline.line(), stretch, admission)
        ? CohortClass.ELIGIBLE
        : CohortClass.NOT_ASSESSABLE;
  }

  /** Completed years between the local dates of birth and admission. */
  public int ageYears(PatientTimeline timeline, Stretch stretch) {
    return (int)
        ChronoUnit.YEARS.between(
            timeline.patient().birthDate(),
            Instant.ofEpochSecond(stretch.from()).atZone(zone).toLocalDate());
  }

  /** Unmasked results belonging to an admission. */
  public static int resultsOf(CreatinineLine line, int admission) {
    int own = 0;
    for (int number : line.admission()) {
      own += number == admission ? 1 : 0;
    }
    return own;
  }

  private boolean assessable(CreatinineLine line, Stretch stretch, int admission) {
    int inReach = 0;
    for (int i = line.firstFrom(stretch.from() - policy.assessableBeforeSeconds());
        i < line.size() && line.at()[i] < stretch.to();
        i++) {
      inReach++;
    }
    return inReach >= policy.leastResults() && resultsOf(line, admission) > 0;
  }

  private boolean onMaintenance(PatientTimeline timeline, Stretch stretch) {
    for (ReplacementSpan replacement : timeline.replacements()) {
      if (replacement.replacement().purpose() == ReplacementPurpose.MAINTENANCE
          && replacement.from() < stretch.from() + policy.maintenanceBeforeSeconds()) {
        return true;
      }
    }
    return false;
  }

  private static boolean hasCondition(
      PatientTimeline timeline, Stretch stretch, CodePatterns icd10, CodePatterns icd9) {
    for (Condition condition : timeline.conditions()) {
      CodePatterns patterns = condition.codeSystem() == ConditionCodeSystem.ICD10 ? icd10 : icd9;
      if (patterns.matches(condition.code()) && counts(timeline, stretch, condition)) {
        return true;
      }
    }
    return false;
  }

  /** Recorded with this admission or an earlier one, or before its discharge, or with neither. */
  private static boolean counts(PatientTimeline timeline, Stretch stretch, Condition condition) {
    boolean recorded = Seconds.given(condition.recordedAt());
    if (condition.admissionId().isEmpty() && !recorded) {
      return true;
    }
    if (recorded && condition.recordedAt() < stretch.to()) {
      return true;
    }
    List<Stretch> stretches = timeline.membership().stretches();
    for (Stretch other : stretches) {
      if (other.admission().admissionId().equals(condition.admissionId())) {
        return other == stretch || other.from() < stretch.from();
      }
    }
    return false;
  }
}
