/**
 * Intervals, ratios and corrections for rates: counts and person-time in, numbers out. Pure
 * functions on values; imports the Java library and Apache Commons Statistics and Numbers only.
 *
 * <p>Every quantity that can be undefined says so in its type ({@link java.util.OptionalDouble},
 * {@link java.util.Optional}); no result is ever NaN. Person-time may be in any unit, the same one
 * throughout a call.
 */
package millrace.analytics.stats;
