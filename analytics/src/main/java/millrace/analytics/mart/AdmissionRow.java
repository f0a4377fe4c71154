package millrace.analytics.mart;

import java.time.Instant;
import java.util.Optional;
import java.util.OptionalLong;

/**
 * An admission that was kept. Methods 6.
 *
 * @param admissionId identifier in the extract
 * @param patientId identifier in the extract
 * @param cohortClass one of the five classes of methods 6
 * @param admittedAt start
 * @param dischargedAt end; empty for an open stay
 * @param dischargeStatus home, transfer, died or other
 * @param sex female, male, other or unknown
 * @param ageYears completed years at admission
 * @param baselineNanomolesPerLitre baseline creatinine; given for every class
 * @param results unmasked creatinine results belonging to the admission
 * @param atRiskSeconds time at risk; empty unless the class is eligible
 */
public record AdmissionRow(
    String admissionId,
    String patientId,
    String cohortClass,
    Instant admittedAt,
    Optional<Instant> dischargedAt,
    Optional<String> dischargeStatus,
    String sex,
    int ageYears,
    OptionalLong baselineNanomolesPerLitre,
    int results,
    OptionalLong atRiskSeconds) {}
