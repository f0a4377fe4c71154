package millrace.analytics.pressure;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import millrace.analytics.policy.PressurePolicy;
import millrace.etl.record.Administration;
import millrace.etl.record.DoseBasis;
import millrace.etl.record.Route;
import millrace.etl.record.Seconds;

/**
 * Whether a vasopressor ran in the window before an onset: a flag of its own, beside the pressures
 * (methods 8).
 */
public final class Vasopressors {
  private final Set<String> codes;
  private final long windowSeconds;
  private final boolean countOrdered;

  /** By the codes and the window of a policy. */
  public Vasopressors(PressurePolicy policy, boolean countOrdered) {
    this.codes = new HashSet<>(policy.vasopressors());
    this.windowSeconds = policy.windowSeconds();
    this.countOrdered = countOrdered;
  }

  /** Started before onset and ended after the window's start, or started in the window. */
  public boolean before(long onset, List<Administration> administrations) {
    long from = onset - windowSeconds;
    for (Administration dose : administrations) {
      if (dose.startedAt() >= onset) {
        return false;
      }
      boolean counts = countOrdered || dose.basis() == DoseBasis.ADMINISTERED;
      if (counts && dose.route() == Route.IV && codes.contains(dose.atc())) {
        long end = Seconds.given(dose.endedAt()) ? dose.endedAt() : dose.startedAt();
        if (dose.startedAt() >= from || end > from) {
          return true;
        }
      }
    }
    return false;
  }
}
