package millrace.analytics.episode;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalLong;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.LongPredicate;
import millrace.analytics.criteria.Evidence;
import millrace.analytics.timeline.CreatinineLine;
import millrace.analytics.timeline.Membership;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.ReplacementSpan;

/** Methods 4 and 5 word by word: every question is answered by a scan over all results. */
final class SpanScan {
  private final PatientTimeline timeline;
  private final CreatinineLine line;
  private final OptionalLong[] baselines;
  private final List<ReplacementSpan> acute;
  private final List<String> spans = new ArrayList<>();
  private final List<String> rises = new ArrayList<>();
  private final Set<Integer> risen = new TreeSet<>();
  private long closedAt = Long.MIN_VALUE;
  private boolean open;
  private long onset;
  private int onsetAdmission;
  private Set<Evidence> onsetEvidence;
  private OptionalLong reference = OptionalLong.empty();

  SpanScan(PatientTimeline timeline, OptionalLong[] baselines) {
    this.timeline = timeline;
    this.line = timeline.line();
    this.baselines = baselines;
    this.acute = timeline.replacements().stream().filter(ReplacementSpan::isAcute).toList();
    TreeMap<Long, List<ReplacementSpan>> starts = new TreeMap<>();
    acute.forEach(r -> starts.computeIfAbsent(r.from(), f -> new ArrayList<>()).add(r));
    long last = Math.max(1_300, line.size() == 0 ? 0 : line.at()[line.size() - 1]);
    for (long t = 0; t <= last; t++) {
      for (ReplacementSpan replacement : starts.getOrDefault(t, List.of())) {
        lapse(t);
        if (!open) {
          open(t, replacement.admission(), EnumSet.of(Evidence.REPLACEMENT));
          reference = referenceOf(replacement);
        }
      }
      for (int i = 0; i < line.size(); i++) {
        if (line.at()[i] == t) {
          lapse(t);
          result(i);
        }
      }
    }
    lapse(Long.MAX_VALUE);
  }

  List<String> spans() {
    return spans;
  }

  List<String> rises() {
    return rises;
  }

  static String brief(
      long onset, int admission, Set<Evidence> evidence, OptionalLong reference, long closing) {
    return onset + " in " + admission + " " + evidence + " from " + reference + " to " + closing;
  }

  static String rise(int admission, long at, long reference, long value) {
    return "admission " + admission + " at " + at + " from " + reference + " to " + value;
  }

  /** Lowest value at an instant that is in the window. */
  private OptionalLong lowest(LongPredicate inWindow) {
    OptionalLong lowest = OptionalLong.empty();
    for (int i = 0; i < line.size(); i++) {
      if (inWindow.test(line.at()[i])) {
        lowest = lower(lowest, OptionalLong.of(line.nanomolesPerLitre()[i]));
      }
    }
    return lowest;
  }

  private OptionalLong window(long t, long width) {
    return lowest(at -> at >= t - width && at < t && at >= closedAt);
  }

  private static OptionalLong lower(OptionalLong one, OptionalLong other) {
    if (one.isEmpty() || other.isEmpty()) {
      return one.isEmpty() ? other : one;
    }
    return OptionalLong.of(Math.min(one.getAsLong(), other.getAsLong()));
  }

  private OptionalLong baselineInReach(int admission, long t) {
    return admission != Membership.NONE
            && t < timeline.membership().stretches().get(admission).from() + 168
        ? baselines[admission]
        : OptionalLong.empty();
  }

  private static boolean half(long value, OptionalLong lowest) {
    return lowest.isPresent() && value * 1.0 / lowest.getAsLong() >= 1.5;
  }

  private OptionalLong fall(int i) {
    int admission = line.admission()[i];
    long t = line.at()[i];
    if (admission == Membership.NONE || baselines[admission].isPresent()) {
      return OptionalLong.empty();
    }
    boolean first = true;
    OptionalLong later = OptionalLong.empty();
    for (int j = 0; j < line.size(); j++) {
      boolean same = line.admission()[j] == admission;
      first &= !(same && j < i);
      if (same && line.at()[j] > t && line.at()[j] <= t + 168) {
        later = lower(later, OptionalLong.of(line.nanomolesPerLitre()[j]));
      }
    }
    boolean arriving = t < timeline.membership().stretches().get(admission).from() + 24;
    return first && arriving ? later : OptionalLong.empty();
  }

  private void result(int i) {
    long t = line.at()[i];
    long v = line.nanomolesPerLitre()[i];
    int admission = line.admission()[i];
    if (open) {
      boolean followed =
          acute.stream().anyMatch(r -> r.from() > t && r.from() <= t + 48)
              || lineAny(at -> at > t && at <= t + 48);
      if (!above(v) && !followed) {
        close(t);
      }
      return;
    }
    Set<Evidence> evidence = EnumSet.noneOf(Evidence.class);
    OptionalLong two = window(t, 48);
    OptionalLong seven = window(t, 168);
    OptionalLong baseline = baselineInReach(admission, t);
    OptionalLong fall = fall(i);
    if (two.isPresent() && v - two.getAsLong() >= 12) {
      evidence.add(Evidence.RISE_48H);
    }
    if (half(v, seven)) {
      evidence.add(Evidence.RATIO_7D);
    }
    if (half(v, baseline)) {
      evidence.add(Evidence.RATIO_BASELINE);
    }
    if (half(v, fall)) {
      evidence.add(Evidence.FALL_7D);
    }
    if (!evidence.isEmpty()) {
      open(t, admission, evidence);
      reference = lower(seven, baseline);
      reference = evidence.contains(Evidence.FALL_7D) ? lower(reference, fall) : reference;
    } else if (admission != Membership.NONE && !risen.contains(admission)) {
      gradual(i, t, v, admission);
    }
  }

  private void gradual(int i, long t, long v, int admission) {
    OptionalLong from = baselines[admission];
    for (int j = 0; j < i && baselines[admission].isEmpty(); j++) {
      if (line.admission()[j] == admission) {
        from = lower(from, OptionalLong.of(line.nanomolesPerLitre()[j]));
      }
    }
    if (half(v, from)) {
      risen.add(admission);
      rises.add(rise(admission, t, from.getAsLong(), v));
    }
  }

  private boolean lineAny(LongPredicate inWindow) {
    for (int i = 0; i < line.size(); i++) {
      if (inWindow.test(line.at()[i]) && above(line.nanomolesPerLitre()[i])) {
        return true;
      }
    }
    return false;
  }

  private boolean above(long v) {
    return reference.isEmpty() || half(v, reference) || v - reference.getAsLong() >= 12;
  }

  private OptionalLong referenceOf(ReplacementSpan replacement) {
    long t = replacement.from();
    OptionalLong before = lower(window(t, 168), baselineInReach(replacement.admission(), t));
    long washed = replacement.maskedUntil();
    return before.isPresent() ? before : lowest(at -> at > washed && at <= washed + 168);
  }

  private void open(long t, int admission, Set<Evidence> evidence) {
    open = true;
    onset = t;
    onsetAdmission = admission;
    onsetEvidence = evidence;
  }

  private void close(long t) {
    spans.add(brief(onset, onsetAdmission, onsetEvidence, reference, t));
    open = false;
    closedAt = t;
  }

  /** Closes what has lapsed before t: a while after the last result above or replacement. */
  private void lapse(long t) {
    if (!open) {
      return;
    }
    long last = onset;
    for (int i = 0; i < line.size(); i++) {
      long at = line.at()[i];
      if (at >= onset && at < t && above(line.nanomolesPerLitre()[i])) {
        last = Math.max(last, at);
      }
    }
    for (ReplacementSpan r : acute) {
      if (r.from() >= onset && r.from() < t) {
        last = Math.max(last, r.to());
      }
    }
    if (t >= last + 300) {
      close(last + 300);
    }
  }
}
