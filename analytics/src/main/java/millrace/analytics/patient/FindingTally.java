package millrace.analytics.patient;

import java.util.List;
import millrace.analytics.mart.AdmissionRow;
import millrace.analytics.timeline.Membership;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.ResultState;
import millrace.analytics.timeline.Stretch;
import millrace.etl.check.CheckedPatient;
import millrace.etl.check.FindingKind;
import millrace.etl.contract.ContractTable;
import millrace.etl.record.Administration;
import millrace.etl.record.BloodPressure;
import millrace.etl.record.CreatinineResult;

/**
 * Findings that need a patient's whole line: overlaps, rival results, rows whose admission is
 * another by time (methods 2).
 */
final class FindingTally {
  private static final int OLDEST_YEARS = 120;

  private final Tally tally;

  FindingTally(Tally tally) {
    this.tally = tally;
  }

  void count(PatientTimeline timeline, CheckedPatient rows, List<AdmissionRow> admissions) {
    Membership membership = timeline.membership();
    if (membership.overlapping()) {
      add(FindingKind.OVERLAPPING_ADMISSIONS, ContractTable.ADMISSIONS, "");
    }
    if (admissions.stream().anyMatch(a -> a.ageYears() > OLDEST_YEARS)) {
      add(FindingKind.AGE_ABOVE_120, ContractTable.PATIENTS, "birth_date");
    }
    timeline.resultStates().stream()
        .filter(s -> s == ResultState.SUPERSEDED)
        .forEach(s -> add(FindingKind.RIVAL_RESULTS, ContractTable.RESULTS, ""));
    for (CreatinineResult r : rows.results()) {
      disagreement(membership, r.collectedAt(), r.admissionId(), ContractTable.RESULTS);
    }
    for (Administration a : rows.administrations()) {
      disagreement(membership, a.startedAt(), a.admissionId(), ContractTable.ADMINISTRATIONS);
    }
    for (BloodPressure p : rows.pressures()) {
      disagreement(membership, p.measuredAt(), p.admissionId(), ContractTable.BLOOD_PRESSURES);
    }
  }

  private void disagreement(
      Membership membership, long at, String admissionId, ContractTable table) {
    if (admissionId.isEmpty()) {
      return;
    }
    int number = membership.belongsTo(at);
    boolean agrees =
        number != Membership.NONE
            && membership.stretches().get(number).admission().admissionId().equals(admissionId);
    if (agrees) {
      return;
    }
    // Another patient's admission was counted when the row was checked.
    for (Stretch own : membership.stretches()) {
      if (own.admission().admissionId().equals(admissionId)) {
        add(FindingKind.OTHER_ADMISSION, table, "by time");
      }
    }
  }

  private void add(FindingKind kind, ContractTable table, String detail) {
    tally.add(Tally.Group.FINDING, kind.word(), table.tableName(), detail, 1);
  }
}
