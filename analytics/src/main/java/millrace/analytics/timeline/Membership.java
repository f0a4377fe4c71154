package millrace.analytics.timeline;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import millrace.etl.record.Admission;
import millrace.etl.record.Seconds;

/**
 * To which admission an instant belongs (methods 2). Admissions are numbered in order of admission,
 * then id.
 */
public final class Membership {
  /** The number of no admission. */
  public static final int NONE = -1;

  private final List<Stretch> stretches;
  private final long arrivalWindowSeconds;

  private Membership(List<Stretch> stretches, long arrivalWindowSeconds) {
    this.stretches = stretches;
    this.arrivalWindowSeconds = arrivalWindowSeconds;
  }

  /** Over a patient's admissions in any order. */
  public static Membership of(
      List<Admission> admissions, long coversTo, long arrivalWindowSeconds) {
    List<Stretch> stretches = new ArrayList<>();
    for (Admission a : admissions) {
      stretches.add(
          new Stretch(
              a, a.admittedAt(), Seconds.given(a.dischargedAt()) ? a.dischargedAt() : coversTo));
    }
    stretches.sort(
        Comparator.comparingLong(Stretch::from).thenComparing(s -> s.admission().admissionId()));
    return new Membership(List.copyOf(stretches), arrivalWindowSeconds);
  }

  /** The admissions, in order. */
  public List<Stretch> stretches() {
    return stretches;
  }

  /**
   * The admission that holds the instant: of overlapping ones the later-admitted, then the greater
   * id; or {@link #NONE}.
   */
  public int holder(long instant) {
    for (int i = stretches.size() - 1; i >= 0; i--) {
      if (stretches.get(i).contains(instant)) {
        return i;
      }
    }
    return NONE;
  }

  /**
   * The admission that the instant belongs to: its holder, else the next one that starts within the
   * arrival window; or {@link #NONE}.
   */
  public int belongsTo(long instant) {
    int holder = holder(instant);
    if (holder != NONE) {
      return holder;
    }
    int next = NONE;
    for (int i = 0; i < stretches.size(); i++) {
      long from = stretches.get(i).from();
      if (from > instant && (next == NONE || from == stretches.get(next).from())) {
        next = i;
      }
    }
    return next != NONE && stretches.get(next).from() - instant <= arrivalWindowSeconds
        ? next
        : NONE;
  }

  /** Whether two admissions overlap. */
  public boolean overlapping() {
    long latest = Long.MIN_VALUE;
    for (Stretch stretch : stretches) {
      if (stretch.from() < latest) {
        return true;
      }
      latest = Math.max(latest, stretch.to());
    }
    return false;
  }
}
