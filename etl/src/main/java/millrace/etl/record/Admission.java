package millrace.etl.record;

import java.util.Optional;

/**
 * An admission of a patient.
 *
 * @param admissionId identifier in the extract
 * @param admittedAt start
 * @param dischargedAt end, cut to the end of cover; {@link Seconds#ABSENT} for an open stay
 * @param dischargeStatus how it ended
 * @param source where the row stands
 */
public record Admission(
    String admissionId,
    long admittedAt,
    long dischargedAt,
    Optional<DischargeStatus> dischargeStatus,
    SourceLine source) {}
