package millrace.analytics.policy;

import java.util.List;

/**
 * Settings of who counts. Methods 6.
 *
 * @param minAgeYears youngest counted
 * @param maintenanceBeforeSeconds a maintenance replacement starting before admission plus this
 * @param leastResults results that make an admission assessable
 * @param assessableBeforeSeconds how long before admission they count
 * @param maintenanceDialysisIcd10 codes, * as a prefix
 * @param maintenanceDialysisIcd9 codes, * as a prefix
 * @param transplantIcd10 codes, * as a prefix
 * @param transplantIcd9 codes, * as a prefix
 * @param dayBeforeSeconds distance of the second attribution
 */
public record CohortPolicy(
    int minAgeYears,
    long maintenanceBeforeSeconds,
    int leastResults,
    long assessableBeforeSeconds,
    List<String> maintenanceDialysisIcd10,
    List<String> maintenanceDialysisIcd9,
    List<String> transplantIcd10,
    List<String> transplantIcd9,
    long dayBeforeSeconds)
    implements java.io.Serializable {
  static CohortPolicy of(Settings s) {
    return new CohortPolicy(
        s.whole("min_age"),
        s.seconds("maintenance_before"),
        s.whole("least_results"),
        s.seconds("assessable_before"),
        s.texts("maintenance_dialysis_icd10"),
        s.texts("maintenance_dialysis_icd9"),
        s.texts("transplant_icd10"),
        s.texts("transplant_icd9"),
        s.seconds("day_before"));
  }
}
