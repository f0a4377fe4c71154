package millrace.analytics.timeline;

import millrace.etl.record.Admission;

/**
 * An admission and the time it holds, {@code [from, to)}; an open stay is cut at the end of cover.
 *
 * @param admission the admission
 * @param from admission
 * @param to discharge or end of cover
 */
public record Stretch(Admission admission, long from, long to) {
  /** Whether the instant lies inside. */
  public boolean contains(long instant) {
    return from <= instant && instant < to;
  }
}
