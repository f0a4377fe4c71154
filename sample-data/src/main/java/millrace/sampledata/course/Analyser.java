package millrace.sampledata.course;

import java.nio.charset.StandardCharsets;
import millrace.sampledata.scenario.CareUnit;

/** Where creatinine is measured: each place has its own code, unit and decimals. */
public enum Analyser {
  MAIN_LABORATORY("14682-9", "", "umol/L", false),
  MAIN_LABORATORY_MICRO_SIGN("14682-9", "", "\u00B5mol/L", false),
  WEST_LABORATORY_LOCAL("BIO-CREA", "local", "umol/L", false),
  OUTPATIENT_LABORATORY("2160-0", "loinc", "mg/dL", true),
  BEDSIDE("38483-4", "loinc", "mg/dL", true);

  private final byte[] code;
  private final byte[] codeSystem;
  private final byte[] unit;
  private final boolean mgDl;

  Analyser(String code, String codeSystem, String unit, boolean mgDl) {
    this.code = code.getBytes(StandardCharsets.UTF_8);
    this.codeSystem = codeSystem.getBytes(StandardCharsets.UTF_8);
    this.unit = unit.getBytes(StandardCharsets.UTF_8);
    this.mgDl = mgDl;
  }

  /**
   * The analyser that serves a unit.
   *
   * @param unit the unit
   * @return its analyser
   */
  static Analyser of(CareUnit unit) {
    return switch (unit) {
      case ICU, CSU, ED, THEATRE -> BEDSIDE;
      case SURG_2 -> WEST_LABORATORY_LOCAL;
      case MED_3 -> MAIN_LABORATORY_MICRO_SIGN;
      case OBS -> OUTPATIENT_LABORATORY;
      default -> MAIN_LABORATORY;
    };
  }

  /**
   * Code of creatinine here.
   *
   * @return the code as UTF-8
   */
  public byte[] code() {
    return code;
  }

  /**
   * Code system, empty where the default holds.
   *
   * @return the word as UTF-8
   */
  public byte[] codeSystem() {
    return codeSystem;
  }

  /**
   * Unit of measure.
   *
   * @return the unit as UTF-8
   */
  public byte[] unit() {
    return unit;
  }

  /**
   * Whether it reports hundredths of mg/dL, else whole micromoles per litre.
   *
   * @return true for mg/dL
   */
  public boolean mgDl() {
    return mgDl;
  }
}
