package millrace.etl.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import millrace.etl.contract.ContractTable;
import millrace.etl.parse.RawRow;
import millrace.etl.parse.WallClock;
import millrace.etl.record.Administration;
import millrace.etl.record.Admission;
import millrace.etl.record.BloodPressure;
import millrace.etl.record.BodyHeight;
import millrace.etl.record.Condition;
import millrace.etl.record.CreatinineResult;
import millrace.etl.record.KidneyReplacement;
import millrace.etl.record.Patient;
import millrace.etl.record.UnitStay;

/**
 * Applies the extract contract to all raw rows of one patient after another, counting findings and
 * accounts as it goes. Not for several threads.
 */
public final class PatientCheck {
  private final CheckContext context;
  private final Findings findings = new Findings();
  private final Accounting accounting = new Accounting();
  private final PatientRows patientRows = new PatientRows();
  private final TableSieve<Patient> patients;
  private final TableSieve<Admission> admissions;
  private final TableSieve<UnitStay> stays;
  private final TableSieve<CreatinineResult> results;
  private final TableSieve<Administration> administrations;
  private final TableSieve<BloodPressure> pressures;
  private final TableSieve<KidneyReplacement> replacements;
  private final TableSieve<Condition> conditions;
  private final TableSieve<Void> urine;
  private final TableSieve<BodyHeight> heights;

  /** A check against that extract. */
  public PatientCheck(CheckContext context) {
    this.context = context;
    WallClock clock = new WallClock(context.cover().zone());
    patients = sieve(ContractTable.PATIENTS, patientRows, clock);
    admissions = sieve(ContractTable.ADMISSIONS, new AdmissionRows(context, findings), clock);
    stays = sieve(ContractTable.UNIT_STAYS, new StayRows(context, findings), clock);
    results = sieve(ContractTable.RESULTS, new ResultRows(context, findings), clock);
    administrations =
        sieve(ContractTable.ADMINISTRATIONS, new AdministrationRows(context, findings), clock);
    pressures = sieve(ContractTable.BLOOD_PRESSURES, new PressureRows(context, findings), clock);
    replacements =
        sieve(ContractTable.KIDNEY_REPLACEMENTS, new ReplacementRows(context, findings), clock);
    conditions = sieve(ContractTable.CONDITIONS, new ConditionRows(context, findings), clock);
    urine = sieve(ContractTable.URINE_OUTPUTS, new UrineRows(context, findings), clock);
    heights = sieve(ContractTable.BODY_MEASURES, new BodyMeasureRows(context, findings), clock);
  }

  /**
   * Checks one patient.
   *
   * @param rows the patient's raw rows by table, each list in the order of the extract; stays are
   *     those of the patient's admissions
   */
  public CheckedPatient check(Map<ContractTable, List<RawRow>> rows) {
    List<Quarantined> quarantine = new ArrayList<>();
    patientRows.startGroup();
    List<Patient> found =
        patients.sift(of(rows, ContractTable.PATIENTS), Person.UNKNOWN, quarantine);
    Optional<Patient> patient = found.stream().findFirst();
    Person alone = patient.map(p -> Person.of(p, context.cover().zone())).orElse(Person.UNKNOWN);
    List<Admission> ownAdmissions =
        admissions.sift(of(rows, ContractTable.ADMISSIONS), alone, quarantine);
    Person person =
        alone.with(ownAdmissions.stream().map(Admission::admissionId).collect(Collectors.toSet()));
    List<UnitStay> ownStays = stays.sift(of(rows, ContractTable.UNIT_STAYS), person, quarantine);
    urine.sift(of(rows, ContractTable.URINE_OUTPUTS), person, quarantine);
    return new CheckedPatient(
        patient,
        ownAdmissions,
        ownStays,
        results.sift(of(rows, ContractTable.RESULTS), person, quarantine),
        administrations.sift(of(rows, ContractTable.ADMINISTRATIONS), person, quarantine),
        withoutRivals(pressures.sift(of(rows, ContractTable.BLOOD_PRESSURES), person, quarantine)),
        replacements.sift(of(rows, ContractTable.KIDNEY_REPLACEMENTS), person, quarantine),
        conditions.sift(of(rows, ContractTable.CONDITIONS), person, quarantine),
        heights.sift(of(rows, ContractTable.BODY_MEASURES), person, quarantine),
        quarantine);
  }

  /** What was found odd in all patients checked so far. */
  public Findings findings() {
    return findings;
  }

  /** The accounts of all patients checked so far. */
  public Accounting accounting() {
    return accounting;
  }

  private <T> TableSieve<T> sieve(ContractTable table, RowKind<T> kind, WallClock clock) {
    return new TableSieve<>(table, kind, context.layouts(), clock, findings, accounting);
  }

  private List<BloodPressure> withoutRivals(List<BloodPressure> readings) {
    List<BloodPressure> standing = RivalPressures.standing(readings);
    int merged = readings.size() - standing.size();
    if (merged > 0) {
      accounting.add(ContractTable.BLOOD_PRESSURES, new Accounting.Line(0, -merged, merged, 0));
      findings.add(
          new Findings.Key(
              FindingKind.RIVAL_PRESSURES, ContractTable.BLOOD_PRESSURES.tableName(), ""),
          merged);
    }
    return standing;
  }

  private static List<RawRow> of(Map<ContractTable, List<RawRow>> rows, ContractTable table) {
    return rows.getOrDefault(table, List.of());
  }
}
