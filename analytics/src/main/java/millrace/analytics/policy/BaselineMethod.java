package millrace.analytics.policy;

import java.util.Arrays;
import java.util.List;

/** How the baseline of an admission is found (methods 3). */
public enum BaselineMethod {
  /** Median of the outpatient results of the year before. */
  OUTPATIENT_MEDIAN("outpatient-median"),
  /** Never a baseline. */
  ROLLING_ONLY("rolling-only"),
  /** First result belonging to the admission. */
  FIRST_VALUE("first-value"),
  /** Lowest result of the admission's first week. */
  LOWEST_FIRST_WEEK("lowest-first-week"),
  /**
   * Outpatient median, else the creatinine at which CKD-EPI 2021 gives 75 mL/min/1.73 m2; adults.
   */
  BACK_CALCULATED_75("back-calculated-75"),
  /** Latest outpatient result of the year before. */
  LATEST_OUTPATIENT("latest-outpatient");

  private final String word;

  BaselineMethod(String word) {
    this.word = word;
  }

  /** Its name in a policy file. */
  public String word() {
    return word;
  }

  static List<String> allWords() {
    return Arrays.stream(values()).map(BaselineMethod::word).toList();
  }

  static BaselineMethod of(String word) {
    return Arrays.stream(values()).filter(m -> m.word.equals(word)).findFirst().orElseThrow();
  }
}
