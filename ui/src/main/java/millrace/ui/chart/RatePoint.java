package millrace.ui.chart;

import java.util.OptionalDouble;

/**
 * A value with limits.
 *
 * @param name what it is of
 * @param value value
 * @param lower lower limit
 * @param upper upper limit
 * @param second another value of the same, shown hollow
 * @param marked drawn larger
 */
public record RatePoint(
    String name,
    OptionalDouble value,
    OptionalDouble lower,
    OptionalDouble upper,
    OptionalDouble second,
    boolean marked) {}
