package millrace.analytics.mart;

import java.time.Instant;

/**
 * An agent exposing at the onset of an episode. A link is no cause. Methods 7.
 *
 * @param patientId identifier in the extract
 * @param onsetAt onset of the episode
 * @param agent agent of the watchlist
 * @param drugClass its class
 * @param mechanism its mechanism
 * @param firstDoseAt first start of the doses in reach
 * @param lastDoseAt last start of the doses in reach
 * @param doseDays distinct local days of start
 * @param doses number of doses
 */
public record LinkRow(
    String patientId,
    Instant onsetAt,
    String agent,
    String drugClass,
    String mechanism,
    Instant firstDoseAt,
    Instant lastDoseAt,
    int doseDays,
    int doses) {}
