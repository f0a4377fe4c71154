package millrace.sampledata.scenario;

/**
 * Drug classes with the rate ratio planted for time exposed to them, and the window in which a dose
 * exposes.
 */
public enum DrugClass {
  /** Gentamicin, amikacin, tobramycin by vein. */
  AMINOGLYCOSIDE("aminoglycoside", 2.5, 24, 14),
  /** Vancomycin by vein. */
  VANCOMYCIN("vancomycin IV", 1.7, 24, 7),
  /** No effect alone; multiplies the effect of vancomycin, see {@link Planted#PAIR_RATIO}. */
  PIPERACILLIN_TAZOBACTAM("piperacillin-tazobactam", 1.0, 24, 7),
  /** Painkillers that narrow the afferent vessel. */
  NSAID("NSAID", 1.5, 24, 7),
  /** Inhibitors of the converting enzyme and blockers of its receptor. */
  RAS_BLOCKER("RAS blocker", 1.2, 24, 7),
  /** No effect, and given mostly after low pressure: confounded by design. */
  LOOP_DIURETIC("loop diuretic", 1.0, 24, 7),
  /** No effect. */
  THIAZIDE("thiazide", 1.0, 24, 7),
  /** No effect, and given without regard to pressure. */
  PROTON_PUMP_INHIBITOR("proton pump inhibitor", 1.0, 24, 90),
  /** No effect. */
  CONTRAST("iodinated contrast", 1.0, 0, 3),
  /** Co-trimoxazole. */
  CO_TRIMOXAZOLE("co-trimoxazole", 1.4, 24, 14),
  /** Amphotericin B. */
  AMPHOTERICIN("amphotericin B", 3.0, 24, 14),
  /** Cisplatin. */
  PLATINUM("cisplatin", 2.0, 24, 14),
  /** Aciclovir by vein; by mouth it exposes nobody. */
  ACICLOVIR("aciclovir IV", 1.6, 0, 3),
  /** Given to patients with a transplant only, who are in no rate. */
  CALCINEURIN_INHIBITOR("calcineurin inhibitor", 1.0, 24, 14),
  /** Drugs that no watchlist names, or routes that do not count. */
  UNWATCHED("unwatched", 1.0, 0, 0);

  private final String word;
  private final double rateRatio;
  private final int lagHours;
  private final int lookBackDays;

  DrugClass(String word, double rateRatio, int lagHours, int lookBackDays) {
    this.word = word;
    this.rateRatio = rateRatio;
    this.lagHours = lagHours;
    this.lookBackDays = lookBackDays;
  }

  /**
   * Name used in the truth files.
   *
   * @return the name
   */
  public String word() {
    return word;
  }

  /**
   * Planted ratio of the hazard in exposed time to that in other time, all else equal.
   *
   * @return the ratio
   */
  public double rateRatio() {
    return rateRatio;
  }

  /**
   * Time from the start of a dose to the start of its exposure.
   *
   * @return hours
   */
  public int lagHours() {
    return lagHours;
  }

  /**
   * Time from the end of a dose to the end of its exposure.
   *
   * @return days
   */
  public int lookBackDays() {
    return lookBackDays;
  }
}
