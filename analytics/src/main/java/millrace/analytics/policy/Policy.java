package millrace.analytics.policy;

import java.io.Serializable;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Every setting of a run. {@code policy.yaml} beside this package's classes names and comments
 * them.
 *
 * @param line Settings of the patient's line. Methods 2.
 * @param baseline Settings of the baseline. Methods 3.
 * @param criteria Settings of the criteria. Methods 1, 4.
 * @param episode Settings of episodes. Methods 5.
 * @param cohort Settings of who counts. Methods 6.
 * @param exposure Settings of drug exposure. Methods 7.
 * @param pressure Settings of low blood pressure. Methods 8.
 * @param settings every setting as written, by its name in a policy file
 */
public record Policy(
    LinePolicy line,
    BaselinePolicy baseline,
    CriteriaPolicy criteria,
    EpisodePolicy episode,
    CohortPolicy cohort,
    ExposurePolicy exposure,
    PressurePolicy pressure,
    Map<String, String> settings)
    implements Serializable {
  static Policy of(Settings s) {
    Map<String, String> written = new LinkedHashMap<>();
    s.values().forEach((key, value) -> written.put(key, String.valueOf(value)));
    return new Policy(
        LinePolicy.of(s),
        BaselinePolicy.of(s),
        CriteriaPolicy.of(s),
        EpisodePolicy.of(s),
        CohortPolicy.of(s),
        ExposurePolicy.of(s),
        PressurePolicy.of(s),
        written);
  }
}
