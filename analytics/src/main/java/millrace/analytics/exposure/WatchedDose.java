package millrace.analytics.exposure;

import millrace.analytics.timeline.IntervalSet;
import millrace.etl.record.Administration;
import millrace.etl.record.Seconds;

/** A dose that exposes, with the row of the watchlist it matched. */
public record WatchedDose(Administration dose, WatchedDrug drug) {
  /** End of the dose; its start when it has none. */
  public long endedAt() {
    return Seconds.given(dose.endedAt())
        ? Math.max(dose.startedAt(), dose.endedAt())
        : dose.startedAt();
  }

  /** The time it exposes: from start + lag to end + look-back. */
  public IntervalSet.Interval exposed() {
    return new IntervalSet.Interval(
        dose.startedAt() + drug.lagSeconds(), endedAt() + drug.lookBackSeconds());
  }

  /** Whether it is among the doses of a link at an onset. */
  public boolean reaches(long onset) {
    return dose.startedAt() <= onset - drug.lagSeconds()
        && endedAt() >= onset - drug.lookBackSeconds();
  }
}
