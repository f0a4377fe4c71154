package millrace.analytics.exposure;

import java.io.Serializable;
import java.util.Set;
import millrace.etl.record.Route;

/**
 * A row of the watchlist (methods 7).
 *
 * @param agent name of the agent; rows of one agent unite
 * @param atc ATC code or prefix
 * @param drugClass class of the agent
 * @param mechanism how it can injure
 * @param routes routes that count
 * @param lagSeconds exposure starts this long after a dose
 * @param lookBackSeconds exposure ends this long after a dose
 * @param burden whether the agent counts towards the burden
 */
public record WatchedDrug(
    String agent,
    String atc,
    String drugClass,
    String mechanism,
    Set<Route> routes,
    long lagSeconds,
    long lookBackSeconds,
    boolean burden)
    implements Serializable {}
