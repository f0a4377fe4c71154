package millrace.analytics.timeline;

import millrace.etl.record.KidneyReplacement;
import millrace.etl.record.ReplacementPurpose;

/**
 * A kidney replacement with its end made definite (methods 2).
 *
 * @param replacement as recorded
 * @param from start
 * @param to end; without a recorded one the start if intermittent, else the discharge of its
 *     admission
 * @param maskedUntil last instant at which results are masked
 * @param admission number of the admission its start belongs to, or {@link Membership#NONE}
 */
public record ReplacementSpan(
    KidneyReplacement replacement, long from, long to, long maskedUntil, int admission) {
  /** Whether it is for an acute injury as far as is known: any purpose other than maintenance. */
  public boolean isAcute() {
    return replacement.purpose() != ReplacementPurpose.MAINTENANCE;
  }

  /** Whether a result collected at the instant is masked; both ends included. */
  public boolean masks(long instant) {
    return from <= instant && instant <= maskedUntil;
  }
}
