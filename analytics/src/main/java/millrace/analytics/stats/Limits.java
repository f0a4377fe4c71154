package millrace.analytics.stats;

/**
 * Lower and upper confidence limit of one non-negative quantity, in that quantity's unit.
 *
 * @param lower lower limit, finite, at least 0
 * @param upper upper limit, at least {@code lower}; positive infinity when nothing bounds it
 */
public record Limits(double lower, double upper) {
  /** The limits of a quantity about which nothing is known: 0 to infinity. */
  public static final Limits UNBOUNDED = new Limits(0, Double.POSITIVE_INFINITY);

  /**
   * Checks the order of the limits.
   *
   * @throws IllegalArgumentException if {@code 0 <= lower <= upper} does not hold, the lower limit
   *     is infinite, or one of them is NaN
   */
  public Limits {
    if (!(lower >= 0 && lower < Double.POSITIVE_INFINITY && lower <= upper)) {
      throw new IllegalArgumentException(
          "limits must be 0 <= lower <= upper with a finite lower one, and are "
              + lower
              + " and "
              + upper);
    }
  }

  /**
   * The same limits per unit of exposure.
   *
   * @param exposure finite and above 0
   * @throws IllegalArgumentException if the exposure is not
   */
  public Limits dividedBy(double exposure) {
    if (exposure > 0 && exposure < Double.POSITIVE_INFINITY) {
      return new Limits(lower / exposure, upper / exposure);
    }
    throw new IllegalArgumentException("exposure must be finite and above 0, and is " + exposure);
  }
}
