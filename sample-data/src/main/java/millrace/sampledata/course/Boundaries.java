package millrace.sampledata.course;

import java.util.Arrays;

/** The instants inside a range at which a hazard may change, sorted. */
final class Boundaries {
  private final long from;
  private final long to;
  private long[] instants = new long[32];
  private int count;

  Boundaries(long from, long to) {
    this.from = from;
    this.to = to;
    put(from);
    put(to);
  }

  /** Adds an instant; one outside the range is ignored. */
  void add(long at) {
    if (at > from && at < to) {
      put(at);
    }
  }

  /** The instants, both ends of the range among them, in order. */
  long[] sorted() {
    long[] sorted = Arrays.copyOf(instants, count);
    Arrays.sort(sorted);
    return sorted;
  }

  private void put(long at) {
    if (count == instants.length) {
      instants = Arrays.copyOf(instants, count * 2);
    }
    instants[count++] = at;
  }
}
