package millrace.sampledata.course;

import java.util.List;
import millrace.sampledata.person.Admission;

/**
 * An admission as planned, with what was planned for it; the lists grow or shrink when an injury
 * changes the plan.
 *
 * @param planned the admission
 * @param nextAdmittedAt start of the patient's next admission, {@link Long#MAX_VALUE} for none
 * @param pressures its blood pressures
 * @param spells its spells of low pressure
 * @param doses its doses, in order of time
 * @param draws its draws of blood, in order of time
 */
record Visit(
    Admission planned,
    long nextAdmittedAt,
    PressureCourse pressures,
    List<Spell> spells,
    List<Dose> doses,
    List<Long> draws) {

  /** Whether blood is drawn often enough for an injury to be assessed at all. */
  boolean assessable() {
    return draws.size() >= 2 && draws.get(draws.size() - 1) >= planned.admittedAt();
  }

  /** Whether blood was drawn in the 40 hours before an instant. */
  boolean drawnBefore(long at) {
    return draws.stream().anyMatch(draw -> draw >= at - 40 * 3600 && draw < at);
  }
}
