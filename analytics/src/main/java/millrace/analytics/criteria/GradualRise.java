package millrace.analytics.criteria;

/**
 * A rise too slow for the seven-day window; listed apart, never an episode (methods 4).
 *
 * @param admission number of the admission
 * @param at the first such result of the admission
 * @param referenceNanomolesPerLitre its baseline, else its lowest earlier result
 * @param nanomolesPerLitre value of the result
 */
public record GradualRise(
    int admission, long at, long referenceNanomolesPerLitre, long nanomolesPerLitre) {}
