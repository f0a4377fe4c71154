package millrace.analytics.timeline;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A set of instants as disjoint half-open intervals in order. Immutable. */
public final class IntervalSet {
  /** The empty set. */
  public static final IntervalSet EMPTY = new IntervalSet(new long[0], new long[0]);

  private final long[] from;
  private final long[] to;

  private IntervalSet(long[] from, long[] to) {
    this.from = from;
    this.to = to;
  }

  /** A half-open interval {@code [from, to)} in epoch seconds; empty when from is not before to. */
  public record Interval(long from, long to) {}

  /** The union of intervals in any order. */
  public static IntervalSet union(List<Interval> intervals) {
    List<Interval> sorted = new ArrayList<>(intervals);
    sorted.removeIf(i -> i.from() >= i.to());
    if (sorted.isEmpty()) {
      return EMPTY;
    }
    sorted.sort((a, b) -> Long.compare(a.from(), b.from()));
    long[] from = new long[sorted.size()];
    long[] to = new long[sorted.size()];
    int last = -1;
    for (Interval interval : sorted) {
      if (last >= 0 && interval.from() <= to[last]) {
        to[last] = Math.max(to[last], interval.to());
      } else {
        last++;
        from[last] = interval.from();
        to[last] = interval.to();
      }
    }
    return new IntervalSet(Arrays.copyOf(from, last + 1), Arrays.copyOf(to, last + 1));
  }

  /** The union of sets. */
  public static IntervalSet unionOf(List<IntervalSet> sets) {
    if (sets.size() == 1) {
      return sets.get(0);
    }
    List<Interval> all = new ArrayList<>();
    for (IntervalSet set : sets) {
      for (int i = 0; i < set.size(); i++) {
        all.add(new Interval(set.from[i], set.to[i]));
      }
    }
    return union(all);
  }

  /** The instants in both sets. */
  public IntervalSet intersect(IntervalSet other) {
    List<Interval> both = new ArrayList<>();
    int i = 0;
    int j = 0;
    while (i < size() && j < other.size()) {
      both.add(new Interval(Math.max(from[i], other.from[j]), Math.min(to[i], other.to[j])));
      if (to[i] <= other.to[j]) {
        i++;
      } else {
        j++;
      }
    }
    return union(both);
  }

  /** Number of intervals. */
  public int size() {
    return from.length;
  }

  /** Whether there is no instant. */
  public boolean isEmpty() {
    return from.length == 0;
  }

  /** Start of an interval. */
  public long from(int index) {
    return from[index];
  }

  /** End of an interval, not in the set. */
  public long to(int index) {
    return to[index];
  }

  /** Whether the instant is in the set. */
  public boolean contains(long instant) {
    int at = Arrays.binarySearch(from, instant);
    int index = at >= 0 ? at : -at - 2;
    return index >= 0 && instant < to[index];
  }

  /** Seconds of {@code [start, end)} that are in the set. */
  public long overlapSeconds(long start, long end) {
    long seconds = 0;
    for (int i = 0; i < from.length && from[i] < end; i++) {
      if (to[i] > start) {
        seconds += Math.min(to[i], end) - Math.max(from[i], start);
      }
    }
    return seconds;
  }
}
