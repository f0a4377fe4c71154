package millrace.etl.normalise;

import java.util.Set;

/**
 * LOINC codes of creatinine in serum, plasma or blood (extract contract). Content from LOINC
 * (loinc.org), Regenstrief Institute.
 */
public final class CreatinineCodes {
  private static final Set<String> LOINC =
      Set.of("2160-0", "38483-4", "14682-9", "77140-2", "21232-4", "59826-8");

  private CreatinineCodes() {}

  /** Whether the LOINC code is creatinine in serum, plasma or blood. */
  public static boolean contains(String loinc) {
    return LOINC.contains(loinc);
  }
}
