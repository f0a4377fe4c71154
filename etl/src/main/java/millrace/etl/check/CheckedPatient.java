package millrace.etl.check;

import java.util.List;
import java.util.Optional;
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
 * All kept rows of one patient, and those set apart. Lists are in the order of the extract.
 *
 * @param patient the patient; empty for rows that no kept patient owns, and then only the
 *     quarantine is filled
 * @param quarantine rows that broke a rule
 */
public record CheckedPatient(
    Optional<Patient> patient,
    List<Admission> admissions,
    List<UnitStay> stays,
    List<CreatinineResult> results,
    List<Administration> administrations,
    List<BloodPressure> pressures,
    List<KidneyReplacement> replacements,
    List<Condition> conditions,
    List<BodyHeight> heights,
    List<Quarantined> quarantine) {}
