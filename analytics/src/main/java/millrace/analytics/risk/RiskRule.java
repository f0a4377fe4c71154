package millrace.analytics.risk;

import java.util.List;
import java.util.OptionalInt;
import millrace.analytics.episode.Episode;
import millrace.analytics.episode.Origin;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.ReplacementSpan;
import millrace.analytics.timeline.Stretch;
import millrace.etl.record.Seconds;

/**
 * When an eligible admission is at risk, and which episode counts (methods 6).
 *
 * @param hospitalOnsetSeconds risk starts this long after admission
 * @param coversFrom start of cover
 * @param coversTo end of cover
 */
public record RiskRule(long hospitalOnsetSeconds, long coversFrom, long coversTo) {
  /**
   * The time at risk of an eligible admission.
   *
   * @param episodes the patient's episodes, in order of onset
   */
  public RiskTime of(PatientTimeline timeline, int admission, List<Episode> episodes) {
    Stretch stretch = timeline.membership().stretches().get(admission);
    long start = stretch.from() + hospitalOnsetSeconds;
    long otherEnd = endWithoutOnset(timeline, admission, stretch);
    int first = -1;
    int firstOwn = -1;
    for (int i = episodes.size() - 1; i >= 0; i--) {
      Episode episode = episodes.get(i);
      if (episode.span().onset() >= stretch.from()) {
        first = i;
      } else if (episode.span().closing() > stretch.from()) {
        return new RiskTime(admission, start, start, OptionalInt.empty());
      }
      if (episode.span().admission() == admission) {
        firstOwn = i;
      }
    }
    long onset = first < 0 ? Long.MAX_VALUE : episodes.get(first).span().onset();
    boolean counts =
        first >= 0
            && first == firstOwn
            && episodes.get(first).origin() == Origin.HOSPITAL
            && onset <= otherEnd
            && onset >= coversFrom;
    long from = Math.max(start, coversFrom);
    long to = Math.min(Math.min(onset, otherEnd), coversTo);
    return new RiskTime(
        admission, from, Math.max(from, to), counts ? OptionalInt.of(first) : OptionalInt.empty());
  }

  private long endWithoutOnset(PatientTimeline timeline, int admission, Stretch stretch) {
    long end = Math.min(stretch.to(), coversTo);
    if (Seconds.given(timeline.patient().diedAt())) {
      end = Math.min(end, timeline.patient().diedAt());
    }
    for (ReplacementSpan replacement : timeline.replacements()) {
      if (replacement.admission() == admission) {
        end = Math.min(end, replacement.from());
      }
    }
    return end;
  }
}
