package millrace.sampledata.person;

import java.util.ArrayList;
import java.util.List;
import millrace.sampledata.scenario.CareUnit;

/**
 * One admission with its stays.
 *
 * @param id identifier in the extract
 * @param profile why it happens
 * @param admittedAt seconds since the epoch
 * @param dischargedAt seconds since the epoch; may lie after the end of coverage
 * @param died whether it ends in death
 * @param stays stays in order of entry; a later one may lie inside an earlier one
 */
public record Admission(
    String id,
    Profile profile,
    long admittedAt,
    long dischargedAt,
    boolean died,
    List<Stay> stays) {

  /** Copies the stays. */
  public Admission {
    stays = List.copyOf(stays);
  }

  /**
   * The unit occupied at an instant: of the stays that hold it, the one entered last.
   *
   * @param at seconds since the epoch
   * @return the unit; the last unit for an instant that no stay holds
   */
  public CareUnit unitAt(long at) {
    Stay last = stays.get(stays.size() - 1);
    Stay best = null;
    for (Stay stay : stays) {
      if (stay.enteredAt() <= at
          && at < stay.leftAt()
          && (best == null || stay.enteredAt() >= best.enteredAt())) {
        best = stay;
      }
    }
    return best == null ? last.unit() : best.unit();
  }

  /**
   * Whether an instant lies in this admission.
   *
   * @param at seconds since the epoch
   * @return true from admission up to, not including, discharge
   */
  public boolean holds(long at) {
    return admittedAt <= at && at < dischargedAt;
  }

  /**
   * The same admission with a later discharge: every stay that ended at the discharge grows with
   * it.
   *
   * @param laterAt the new discharge, seconds since the epoch
   * @return this admission when it ends no earlier already
   */
  public Admission extendedTo(long laterAt) {
    if (laterAt <= dischargedAt) {
      return this;
    }
    List<Stay> longer = new ArrayList<>(stays.size());
    for (Stay stay : stays) {
      longer.add(
          stay.leftAt() == dischargedAt ? new Stay(stay.unit(), stay.enteredAt(), laterAt) : stay);
    }
    return new Admission(id, profile, admittedAt, laterAt, died, longer);
  }
}
