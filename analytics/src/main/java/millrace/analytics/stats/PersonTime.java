package millrace.analytics.stats;

/**
 * What may be an amount of person-time: none, or an amount that double arithmetic can divide by.
 */
final class PersonTime {
  static final double LEAST = 1e-100;
  static final double GREATEST = 1e100;

  private PersonTime() {}

  /**
   * Refuses an amount out of range.
   *
   * @param name whose time, for the message
   * @throws IllegalArgumentException if the amount is neither 0 nor from {@value #LEAST} to {@value
   *     #GREATEST}
   */
  static void require(String name, double amount) {
    if (amount == 0 || (amount >= LEAST && amount <= GREATEST)) {
      return;
    }
    throw new IllegalArgumentException(
        name + " must be 0 or from " + LEAST + " to " + GREATEST + ", and is " + amount);
  }
}
