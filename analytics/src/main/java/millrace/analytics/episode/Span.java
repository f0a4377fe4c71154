package millrace.analytics.episode;

import java.util.OptionalLong;
import java.util.Set;
import millrace.analytics.criteria.Evidence;

/**
 * An episode's extent, before its stage and outcome are known (methods 5).
 *
 * @param onset first instant with evidence
 * @param admission number of the admission the onset belongs to, or none
 * @param evidence every kind that held at onset
 * @param reference reference in nmol/L; empty for none
 * @param onsetResult index of the result that opened it, or -1 for a replacement
 * @param closing instant of closing, by a result or by lapse; may lie after the end of cover
 */
public record Span(
    long onset,
    int admission,
    Set<Evidence> evidence,
    OptionalLong reference,
    int onsetResult,
    long closing) {
  /** Whether the instant lies in the episode, its closing not included. */
  public boolean contains(long instant) {
    return onset <= instant && instant < closing;
  }
}
