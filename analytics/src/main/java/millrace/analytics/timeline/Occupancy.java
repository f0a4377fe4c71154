package millrace.analytics.timeline;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import millrace.etl.record.Seconds;
import millrace.etl.record.UnitStay;

/**
 * In which unit a patient is at each instant (methods 6; extract contract, overlapping stays).
 * Inside an admission: the stay of the admission that holds the instant, the later-entered one
 * first, then the greater unit id; without one, {@link #UNASSIGNED}. Outside: a stay that covers
 * the instant, else {@link #NOWHERE}.
 */
public final class Occupancy {
  /** The unit of time in an admission that no stay covers. */
  public static final String UNASSIGNED = "unassigned";

  /** No unit at all. */
  public static final String NOWHERE = "";

  private final Membership membership;
  private final List<Stay> stays;
  private final long[] changes;
  private final String[] units;

  private Occupancy(Membership membership, List<Stay> stays, int own) {
    this.membership = membership;
    this.stays = stays;
    this.changes = changes(membership, stays);
    this.units = new String[changes.length];
    for (int i = 0; i < changes.length; i++) {
      boolean inOwn =
          own != Membership.NONE && membership.stretches().get(own).contains(changes[i]);
      units[i] = unit(changes[i], inOwn ? own : membership.holder(changes[i]), stays);
    }
  }

  /** The occupancy of one patient's stays. */
  public static Occupancy of(Membership membership, List<UnitStay> stays) {
    return new Occupancy(membership, stays(membership, stays), Membership.NONE);
  }

  /**
   * The same as one of the patient's admissions sees it: where admissions overlap, its own stays
   * come first.
   */
  public Occupancy seenBy(int admission) {
    return membership.overlapping() ? new Occupancy(membership, stays, admission) : this;
  }

  /** The unit at an instant. */
  public String unitAt(long instant) {
    int found = Arrays.binarySearch(changes, instant);
    int index = found >= 0 ? found : -found - 2;
    return index < 0 ? NOWHERE : units[index];
  }

  /** Instants at which the unit may change, in order. */
  public long[] changes() {
    return changes;
  }

  private static long[] changes(Membership membership, List<Stay> stays) {
    TreeSet<Long> cuts = new TreeSet<>();
    for (Stretch stretch : membership.stretches()) {
      cuts.add(stretch.from());
      cuts.add(stretch.to());
    }
    for (Stay stay : stays) {
      cuts.add(stay.from());
      cuts.add(stay.to());
    }
    return cuts.stream().mapToLong(Long::longValue).toArray();
  }

  private static List<Stay> stays(Membership membership, List<UnitStay> stays) {
    Map<String, Integer> numbers = new HashMap<>();
    List<Stretch> stretches = membership.stretches();
    for (int i = 0; i < stretches.size(); i++) {
      numbers.put(stretches.get(i).admission().admissionId(), i);
    }
    List<Stay> all = new ArrayList<>();
    for (UnitStay stay : stays) {
      int number = numbers.get(stay.admissionId());
      long open = Math.max(stretches.get(number).to(), stay.enteredAt());
      all.add(
          new Stay(
              number,
              stay.unitId(),
              stay.enteredAt(),
              Seconds.given(stay.leftAt()) ? stay.leftAt() : open));
    }
    return all;
  }

  private static String unit(long instant, int holder, List<Stay> stays) {
    Stay best = null;
    for (Stay stay : stays) {
      boolean covers = stay.from() <= instant && instant < stay.to();
      if (covers
          && (holder == Membership.NONE || stay.admission() == holder)
          && stay.isBefore(best)) {
        best = stay;
      }
    }
    if (best != null) {
      return best.unitId();
    }
    return holder == Membership.NONE ? NOWHERE : UNASSIGNED;
  }

  private record Stay(int admission, String unitId, long from, long to) {
    boolean isBefore(Stay other) {
      return other == null
          || from > other.from
          || (from == other.from && unitId.compareTo(other.unitId) > 0);
    }
  }
}
