package millrace.analytics.episode;

import java.time.ZoneId;
import java.util.Optional;
import java.util.OptionalInt;
import millrace.analytics.policy.EpisodePolicy;
import millrace.analytics.policy.Policy;
import millrace.analytics.timeline.CreatinineLine;
import millrace.analytics.timeline.Membership;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.ReplacementSpan;
import millrace.analytics.timeline.Stretch;
import millrace.etl.record.DischargeStatus;
import millrace.etl.record.Seconds;

/** Gives a span its stage, peak, course, origin and outcome (methods 5). */
public final class EpisodeDescriber {
  private final EpisodePolicy policy;
  private final PatientTimeline timeline;
  private final StageRule stages;
  private final AboveRule above;

  /** A describer for one patient. */
  public EpisodeDescriber(Policy policy, PatientTimeline timeline, ZoneId zone) {
    this.policy = policy.episode();
    this.timeline = timeline;
    this.stages = new StageRule(policy, timeline, zone);
    this.above = AboveRule.of(policy.criteria());
  }

  /** Describes a span. */
  public Episode describe(Span span) {
    int stage = 1;
    int peak = -1;
    CreatinineLine line = timeline.line();
    for (int i = line.firstFrom(span.onset());
        i < line.size() && line.at()[i] < span.closing();
        i++) {
      long value = line.nanomolesPerLitre()[i];
      stage = Math.max(stage, stages.stage(value, line.at()[i], span.reference()));
      if (peak < 0 || value > line.nanomolesPerLitre()[peak]) {
        peak = i;
      }
    }
    for (ReplacementSpan replacement : timeline.replacements()) {
      if (replacement.isAcute() && span.contains(replacement.from())) {
        stage = 3;
      }
    }
    return new Episode(
        span,
        origin(span),
        stage,
        peak < 0 ? OptionalInt.empty() : OptionalInt.of(peak),
        span.closing() <= span.onset() + policy.transientSeconds(),
        span.closing() > span.onset() + policy.prolongedSeconds(),
        span.admission() == Membership.NONE ? Optional.empty() : Optional.of(outcome(span, stage)));
  }

  private Origin origin(Span span) {
    if (span.admission() == Membership.NONE) {
      return Origin.OUTSIDE;
    }
    long border =
        timeline.membership().stretches().get(span.admission()).from()
            + policy.hospitalOnsetSeconds();
    return span.onset() < border ? Origin.COMMUNITY : Origin.HOSPITAL;
  }

  private Outcome outcome(Span span, int stage) {
    Stretch stretch = timeline.membership().stretches().get(span.admission());
    long diedAt = timeline.patient().diedAt();
    boolean died =
        stretch.admission().dischargeStatus().filter(s -> s == DischargeStatus.DIED).isPresent();
    if (died || (Seconds.given(diedAt) && diedAt <= stretch.to())) {
      return Outcome.DIED;
    }
    for (ReplacementSpan replacement : timeline.replacements()) {
      if (replacement.from() < stretch.to()
          && replacement.to() >= stretch.to() - policy.replacementAtDischargeSeconds()) {
        return Outcome.ON_REPLACEMENT;
      }
    }
    return byLastResult(span, stage);
  }

  private Outcome byLastResult(Span span, int stage) {
    CreatinineLine line = timeline.line();
    for (int i = line.size() - 1; i >= 0 && line.at()[i] > span.onset(); i--) {
      if (line.admission()[i] == span.admission()) {
        long value = line.nanomolesPerLitre()[i];
        if (!above.isAbove(value, span.reference())) {
          return Outcome.RECOVERED;
        }
        return stages.stage(value, line.at()[i], span.reference()) < stage
            ? Outcome.PARTIAL
            : Outcome.NOT_RECOVERED;
      }
    }
    return Outcome.UNKNOWN;
  }
}
