package millrace.analytics.episode;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalLong;
import java.util.Set;
import millrace.analytics.criteria.Evidence;
import millrace.analytics.criteria.EvidenceFinder;
import millrace.analytics.criteria.GradualRise;
import millrace.analytics.criteria.GradualRises;
import millrace.analytics.criteria.Window;
import millrace.analytics.policy.Policy;
import millrace.analytics.timeline.CreatinineLine;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.ReplacementSpan;

/**
 * Walks once through a patient's results and replacements in order and finds where episodes open
 * and close (methods 4, 5). One walk per instance.
 */
public final class SpanFinder {
  private final Policy policy;
  private final CreatinineLine line;
  private final List<ReplacementSpan> acute;
  private final EvidenceFinder evidence;
  private final Window window;
  private final GradualRises gradual;
  private final AboveRule above;
  private final List<Span> spans = new ArrayList<>();
  private Span open;
  private long lastAbove;

  /** A walk over one patient. */
  public SpanFinder(Policy policy, PatientTimeline timeline, OptionalLong[] baselines) {
    this.policy = policy;
    this.line = timeline.line();
    this.acute = timeline.replacements().stream().filter(ReplacementSpan::isAcute).toList();
    this.evidence = new EvidenceFinder(policy.criteria(), timeline, baselines);
    this.window = new Window(policy.criteria(), line.size());
    this.gradual = new GradualRises(baselines);
    this.above = AboveRule.of(policy.criteria());
  }

  /** Episodes in order of onset. */
  public List<Span> find() {
    int nextReplacement = 0;
    for (int i = 0; i < line.size(); i++) {
      while (nextReplacement < acute.size() && acute.get(nextReplacement).from() <= line.at()[i]) {
        replacement(acute.get(nextReplacement++));
      }
      result(i);
    }
    while (nextReplacement < acute.size()) {
      replacement(acute.get(nextReplacement++));
    }
    if (open != null) {
      close(lastAbove + policy.episode().lapseSeconds());
    }
    return spans;
  }

  /** Gradual rises met on the walk. */
  public List<GradualRise> gradualRises() {
    return gradual.rises();
  }

  private void result(int i) {
    long t = line.at()[i];
    long value = line.nanomolesPerLitre()[i];
    int admission = line.admission()[i];
    lapseBefore(t);
    if (open == null) {
      EvidenceFinder.Judgement judgement = evidence.judge(i, window);
      if (judgement.evidence().isEmpty()) {
        gradual.quiet(admission, t, value);
      } else {
        open =
            new Span(t, admission, judgement.evidence(), judgement.reference(), i, Long.MAX_VALUE);
        lastAbove = t;
      }
    } else if (above.isAbove(value, open.reference())) {
      lastAbove = Math.max(lastAbove, t);
    } else if (!followed(i)) {
      close(t);
    }
    window.add(t, value);
    gradual.passed(admission, value);
  }

  private void replacement(ReplacementSpan replacement) {
    lapseBefore(replacement.from());
    if (open == null) {
      OptionalLong reference =
          evidence.referenceAt(replacement.from(), replacement.admission(), window);
      Set<Evidence> kind = EnumSet.of(Evidence.REPLACEMENT);
      open =
          new Span(
              replacement.from(),
              replacement.admission(),
              kind,
              reference.isPresent() ? reference : afterWashout(replacement),
              -1,
              Long.MAX_VALUE);
      lastAbove = replacement.to();
    } else {
      lastAbove = Math.max(lastAbove, replacement.to());
    }
  }

  private OptionalLong afterWashout(ReplacementSpan replacement) {
    long from = replacement.maskedUntil() + 1;
    long lowest =
        line.lowest(
            from, replacement.maskedUntil() + policy.episode().replacementReferenceSeconds() + 1);
    return lowest == Long.MAX_VALUE ? OptionalLong.empty() : OptionalLong.of(lowest);
  }

  /**
   * Whether a result above or a replacement that is not maintenance follows a result within the
   * reversal time.
   */
  private boolean followed(int i) {
    long until = line.at()[i] + policy.episode().reversalSeconds();
    for (int j = i + 1; j < line.size() && line.at()[j] <= until; j++) {
      if (above.isAbove(line.nanomolesPerLitre()[j], open.reference())) {
        return true;
      }
    }
    for (ReplacementSpan replacement : acute) {
      if (replacement.from() > line.at()[i] && replacement.from() <= until) {
        return true;
      }
    }
    return false;
  }

  private void lapseBefore(long t) {
    if (open != null && t >= lastAbove + policy.episode().lapseSeconds()) {
      close(lastAbove + policy.episode().lapseSeconds());
    }
  }

  private void close(long closing) {
    spans.add(
        new Span(
            open.onset(),
            open.admission(),
            open.evidence(),
            open.reference(),
            open.onsetResult(),
            closing));
    window.closeAt(closing);
    open = null;
  }
}
