package millrace.analytics.policy;

import java.util.List;

/**
 * Settings of drug exposure. Methods 7.
 *
 * @param watchlistFile file of the watchlist; empty for the shipped one
 * @param combinationsFile file of the combinations; empty for the shipped ones
 * @param countOrdered whether orders expose like doses given
 * @param fewestEpisodes fewer give no ratio
 * @param fewestExposedDays fewer give no ratio
 * @param stratifyByMonth strata also by month
 */
public record ExposurePolicy(
    String watchlistFile,
    String combinationsFile,
    boolean countOrdered,
    int fewestEpisodes,
    int fewestExposedDays,
    boolean stratifyByMonth)
    implements java.io.Serializable {
  static ExposurePolicy of(Settings s) {
    return new ExposurePolicy(
        s.text("watchlist"),
        s.text("combinations"),
        s.oneOf("ordered_doses", List.of("ignore", "count")).equals("count"),
        s.whole("fewest_episodes"),
        s.whole("fewest_exposed_days"),
        s.flag("stratify_by_month"));
  }
}
