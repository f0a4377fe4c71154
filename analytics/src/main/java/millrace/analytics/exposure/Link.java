package millrace.analytics.exposure;

/**
 * An agent that exposes at an onset (methods 7). A link is no cause.
 *
 * @param agent the agent
 * @param firstDoseAt first start of the doses in reach
 * @param lastDoseAt last start of the doses in reach
 * @param doseDays distinct local days of start
 * @param doses number of doses in reach
 */
public record Link(String agent, long firstDoseAt, long lastDoseAt, int doseDays, int doses) {}
