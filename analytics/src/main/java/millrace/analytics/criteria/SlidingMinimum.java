package millrace.analytics.criteria;

/**
 * The lowest value of a window that slides forward over a patient's results, by a monotonic queue:
 * each result enters and leaves once. Not for several threads.
 */
public final class SlidingMinimum {
  /** The minimum of a window without a result. */
  public static final long NONE = Long.MAX_VALUE;

  private final long[] at;
  private final long[] values;
  private int head;
  private int tail;

  /** A queue with room for that many results. */
  public SlidingMinimum(int capacity) {
    at = new long[capacity];
    values = new long[capacity];
  }

  /** The lowest value at or after {@code from}, or {@link #NONE}; {@code from} never goes back. */
  public long lowestFrom(long from) {
    while (head < tail && at[head] < from) {
      head++;
    }
    return head < tail ? values[head] : NONE;
  }

  /** Adds the next result, later than all before. */
  public void add(long instant, long value) {
    while (tail > head && values[tail - 1] >= value) {
      tail--;
    }
    at[tail] = instant;
    values[tail++] = value;
  }
}
