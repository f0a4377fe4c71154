package millrace.analytics.timeline;

import java.util.List;
import millrace.etl.record.Administration;
import millrace.etl.record.BloodPressure;
import millrace.etl.record.BodyHeight;
import millrace.etl.record.Condition;
import millrace.etl.record.CreatinineResult;
import millrace.etl.record.Patient;
import millrace.etl.record.UnitStay;

/**
 * Everything of one patient that the rules look at, in order.
 *
 * @param patient the patient
 * @param membership admissions, and what belongs to them
 * @param results every valid creatinine result in order of collection
 * @param resultStates what became of each of them
 * @param line the unmasked results, one per instant
 * @param replacements kidney replacements in order of start
 * @param occupancy where the patient was
 * @param stays unit stays as recorded
 * @param administrations doses in order of start
 * @param pressures blood pressures in order of reading
 * @param conditions coded conditions
 * @param heights heights in order of measurement
 */
public record PatientTimeline(
    Patient patient,
    Membership membership,
    List<CreatinineResult> results,
    List<ResultState> resultStates,
    CreatinineLine line,
    List<ReplacementSpan> replacements,
    Occupancy occupancy,
    List<UnitStay> stays,
    List<Administration> administrations,
    List<BloodPressure> pressures,
    List<Condition> conditions,
    List<BodyHeight> heights) {}
