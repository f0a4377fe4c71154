package millrace.analytics.stats;

/**
 * What may be counted: none to a thousand million events, beyond which tails no longer converge.
 */
final class EventCount {
  static final long GREATEST = 1_000_000_000L;

  private EventCount() {}

  /**
   * Refuses a count out of range.
   *
   * @param name what is counted, for the message
   * @throws IllegalArgumentException if the count is negative or above {@value #GREATEST}
   */
  static void require(String name, long count) {
    if (count < 0 || count > GREATEST) {
      throw new IllegalArgumentException(
          name + " must be from 0 to " + GREATEST + ", and are " + count);
    }
  }
}
