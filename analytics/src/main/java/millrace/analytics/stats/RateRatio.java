package millrace.analytics.stats;

import java.util.OptionalDouble;

/**
 * Ratio of the exposed to the unexposed rate, with limits and a test that condition on the number
 * of events in all.
 *
 * <p>What comes out at the edges, for any legal table:
 *
 * <ul>
 *   <li>no exposed event: ratio and lower limits 0;
 *   <li>no unexposed event, but exposed ones: ratio and upper limits positive infinity;
 *   <li>no event at all, or no person-time on one side: nothing to compare, so no ratio, limits 0
 *       to infinity, p 1.
 * </ul>
 *
 * <p>Example: 41 events in 28,010 against 15 in 19,017 person-years give 1.856, exact 1.006 to
 * 3.609, mid-P 1.041 to 3.449, mid-P value 0.0355 (Rothman and Greenland, Modern Epidemiology, 2nd
 * ed. 1998, p. 238).
 *
 * @param ratio exposed rate over unexposed rate; empty when there is nothing to compare, positive
 *     infinity without an unexposed event
 * @param exact exact limits (Clopper-Pearson limits of the proportion of exposed events)
 * @param midP mid-P limits: the observed number counts one half in either tail
 * @param pMid two-sided mid-P value of ratio 1: twice the smaller tail less half the probability of
 *     the observed number, at most 1
 * @see "Methods 7; Rothman and Greenland 1998, ch. 14; Berry and Armitage, Statistician
 *     1995;44:417"
 */
public record RateRatio(OptionalDouble ratio, Limits exact, Limits midP, double pMid) {
  private static final double WHOLE = 1;
  private static final double HALF = 0.5;
  private static final RateRatio NOTHING_TO_COMPARE =
      new RateRatio(OptionalDouble.empty(), Limits.UNBOUNDED, Limits.UNBOUNDED, 1);

  /**
   * The ratio with 95 % limits.
   *
   * @param exposedEvents events while exposed
   * @param exposedTime person-time exposed
   * @param unexposedEvents events in all other time
   * @param unexposedTime all other person-time, in the same unit
   * @throws IllegalArgumentException if {@link PersonTimeTable} refuses a count or a time
   */
  public static RateRatio of(
      long exposedEvents, double exposedTime, long unexposedEvents, double unexposedTime) {
    return of(
        new PersonTimeTable(exposedEvents, exposedTime, unexposedEvents, unexposedTime),
        Confidence.NINETY_FIVE_PERCENT);
  }

  /**
   * The ratio with limits of a chosen confidence.
   *
   * @param table the counts and times
   * @param confidence two-sided confidence, at least 0.5 and below 1
   * @throws IllegalArgumentException if the confidence is out of range
   */
  public static RateRatio of(PersonTimeTable table, double confidence) {
    double tail = Confidence.tail(confidence);
    if (!table.compares()) {
      return NOTHING_TO_COMPARE;
    }
    double exposedRate = table.exposedEvents() / table.exposedTime();
    double unexposedRate = table.unexposedEvents() / table.unexposedTime();
    return new RateRatio(
        OptionalDouble.of(exposedRate / unexposedRate),
        limits(table, tail, WHOLE),
        limits(table, tail, HALF),
        midPValue(table));
  }

  private static Limits limits(PersonTimeTable table, double tail, double share) {
    ConditionalBinomial events = events(table);
    double timeOdds = table.exposedTime() / table.unexposedTime();
    return new Limits(
        events.lowerOdds(tail, share) / timeOdds, events.upperOdds(tail, share) / timeOdds);
  }

  private static double midPValue(PersonTimeTable table) {
    double time = table.exposedTime() + table.unexposedTime();
    double exposedShare = table.exposedTime() / time;
    double unexposedShare = table.unexposedTime() / time;
    ConditionalBinomial events = events(table);
    double smaller =
        Math.min(
            events.lowerTail(exposedShare, unexposedShare, HALF),
            events.upperTail(exposedShare, unexposedShare, HALF));
    return Math.min(1, 2 * smaller);
  }

  private static ConditionalBinomial events(PersonTimeTable table) {
    return new ConditionalBinomial(table.exposedEvents(), table.unexposedEvents());
  }
}
