package millrace.sampledata.scenario;

/** Drug classes with the rate ratio planted for time exposed to them. */
public enum DrugClass {
  /** Gentamicin, amikacin, tobramycin by vein. */
  AMINOGLYCOSIDE("aminoglycoside", 2.5),
  /** Vancomycin by vein. */
  VANCOMYCIN("vancomycin IV", 1.7),
  /** No effect alone; multiplies the effect of vancomycin, see {@link Planted#PAIR_RATIO}. */
  PIPERACILLIN_TAZOBACTAM("piperacillin-tazobactam", 1.0),
  /** Painkillers that narrow the afferent vessel. */
  NSAID("NSAID", 1.5),
  /** Inhibitors of the converting enzyme and blockers of its receptor. */
  RAS_BLOCKER("RAS blocker", 1.2),
  /** No effect, and given mostly after low pressure: confounded by design. */
  LOOP_DIURETIC("loop diuretic", 1.0),
  /** No effect. */
  THIAZIDE("thiazide", 1.0),
  /** No effect, and given without regard to pressure. */
  PROTON_PUMP_INHIBITOR("proton pump inhibitor", 1.0),
  /** No effect. */
  CONTRAST("iodinated contrast", 1.0),
  /** Co-trimoxazole. */
  CO_TRIMOXAZOLE("co-trimoxazole", 1.4),
  /** Amphotericin B. */
  AMPHOTERICIN("amphotericin B", 3.0),
  /** Cisplatin. */
  PLATINUM("cisplatin", 2.0),
  /** Aciclovir by vein; by mouth it exposes nobody. */
  ACICLOVIR("aciclovir IV", 1.6),
  /** Given to patients with a transplant only, who are in no rate. */
  CALCINEURIN_INHIBITOR("calcineurin inhibitor", 1.0),
  /** Drugs that no watchlist names, or routes that do not count. */
  UNWATCHED("unwatched", 1.0);

  private final String word;
  private final double rateRatio;

  DrugClass(String word, double rateRatio) {
    this.word = word;
    this.rateRatio = rateRatio;
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
}
