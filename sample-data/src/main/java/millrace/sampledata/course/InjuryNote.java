package millrace.sampledata.course;

/**
 * An injury with what is needed to find it in the extract.
 *
 * @param admissionId admission
 * @param injury the injury
 * @param counted whether it is among those the planted hazard of adults in rates answers for
 * @param firstResultAt first creatinine of the admission at or after the injury, 0 when there is
 *     none
 */
public record InjuryNote(String admissionId, Injury injury, boolean counted, long firstResultAt) {}
