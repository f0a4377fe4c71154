package millrace.sampledata.scenario;

/** The formulary: code, route, doses, and the window in which a dose exposes. */
public enum Drug {
  GENTAMICIN(
      "J01GB03",
      "Gentamicin",
      "iv",
      DrugClass.AMINOGLYCOSIDE,
      new Regimen(24, 30, "320", "mg"),
      "P-1001"),
  AMIKACIN(
      "J01GB06", "Amikacin", "iv", DrugClass.AMINOGLYCOSIDE, new Regimen(24, 30, "1000", "mg")),
  TOBRAMYCIN(
      "J01GB01", "Tobramycin", "iv", DrugClass.AMINOGLYCOSIDE, new Regimen(24, 30, "400", "mg")),
  VANCOMYCIN(
      "J01XA01",
      "Vancomycin",
      "iv",
      DrugClass.VANCOMYCIN,
      new Regimen(12, 90, "1000", "mg"),
      "P-1002"),
  PIPERACILLIN_TAZOBACTAM(
      "J01CR05",
      "Piperacillin, tazobactam",
      "iv",
      DrugClass.PIPERACILLIN_TAZOBACTAM,
      new Regimen(8, 30, "4.5", "g"),
      "P-1003"),
  IBUPROFEN("M01AE01", "Ibuprofen", "po", DrugClass.NSAID, new Regimen(8, 0, "400", "mg")),
  DICLOFENAC("M01AB05", "Diclofenac", "pr", DrugClass.NSAID, new Regimen(12, 0, "50", "mg")),
  KETOROLAC("M01AB15", "Ketorolac", "iv", DrugClass.NSAID, new Regimen(8, 0, "15", "mg")),
  RAMIPRIL("C09AA05", "Ramipril", "po", DrugClass.RAS_BLOCKER, new Regimen(24, 0, "5", "mg")),
  LOSARTAN("C09CA01", "Losartan", "po", DrugClass.RAS_BLOCKER, new Regimen(24, 0, "50", "mg")),
  FUROSEMIDE(
      "C03CA01",
      "Furosemide",
      "iv",
      DrugClass.LOOP_DIURETIC,
      new Regimen(12, 0, "40", "mg"),
      "P-1004"),
  INDAPAMIDE("C03BA11", "Indapamide", "po", DrugClass.THIAZIDE, new Regimen(24, 0, "2.5", "mg")),
  PANTOPRAZOLE(
      "A02BC02",
      "Pantoprazole",
      "po",
      DrugClass.PROTON_PUMP_INHIBITOR,
      new Regimen(24, 0, "40", "mg")),
  IOHEXOL(
      "V08AB02",
      "Iohexol 300 mg I/mL, 100 mL bottle",
      "iv",
      DrugClass.CONTRAST,
      new Regimen(24, 5, "100", "mL")),
  CO_TRIMOXAZOLE(
      "J01EE01",
      "Sulfamethoxazole, trimethoprim",
      "po",
      DrugClass.CO_TRIMOXAZOLE,
      new Regimen(12, 0, "960", "mg")),
  AMPHOTERICIN(
      "J02AA01",
      "Amphotericin B, liposomal",
      "iv",
      DrugClass.AMPHOTERICIN,
      new Regimen(24, 60, "250", "mg")),
  CISPLATIN("L01XA01", "Cisplatin", "iv", DrugClass.PLATINUM, new Regimen(24, 120, "120", "mg")),
  ACICLOVIR("J05AB01", "Aciclovir", "iv", DrugClass.ACICLOVIR, new Regimen(8, 60, "700", "mg")),
  TACROLIMUS(
      "L04AD02",
      "Tacrolimus",
      "po",
      DrugClass.CALCINEURIN_INHIBITOR,
      new Regimen(12, 0, "2", "mg")),
  /** A vasopressor: a running infusion with an end. */
  NORADRENALINE(
      "C01CA03",
      "Noradrenaline",
      "iv",
      DrugClass.UNWATCHED,
      new Regimen(24, 360, "4", "mg"),
      "P-1005"),
  PARACETAMOL("N02BE01", "Paracetamol", "po", DrugClass.UNWATCHED, new Regimen(8, 0, "1", "g")),
  ENOXAPARIN("B01AB05", "Enoxaparin", "sc", DrugClass.UNWATCHED, new Regimen(24, 0, "40", "mg")),
  CEFUROXIME("J01DC02", "Cefuroxime", "iv", DrugClass.UNWATCHED, new Regimen(8, 20, "1.5", "g")),
  SALBUTAMOL(
      "R03AC02", "Salbutamol", "inhaled", DrugClass.UNWATCHED, new Regimen(8, 0, "2.5", "mg")),
  /** A watched code by a route that does not count. */
  TOBRAMYCIN_INHALED(
      "J01GB01", "Tobramycin", "inhaled", DrugClass.UNWATCHED, new Regimen(12, 0, "300", "mg")),
  ACICLOVIR_ORAL("J05AB01", "Aciclovir", "po", DrugClass.UNWATCHED, new Regimen(8, 0, "800", "mg")),
  VANCOMYCIN_ORAL(
      "A07AA09", "Vancomycin", "po", DrugClass.UNWATCHED, new Regimen(8, 0, "125", "mg")),
  GENTAMICIN_EYE(
      "S01AA11",
      "Gentamicin 0.3 %",
      "ophthalmic",
      DrugClass.UNWATCHED,
      new Regimen(8, 0, "1", "[drp]")),
  KETOROLAC_EYE(
      "S01BC05",
      "Ketorolac 0.5 %",
      "ophthalmic",
      DrugClass.UNWATCHED,
      new Regimen(8, 0, "1", "[drp]")),
  /** A local code that no map explains. */
  FLUSH(
      "LOC-9001",
      "Saline flush",
      "iv",
      DrugClass.UNWATCHED,
      new Regimen(12, 0, "10", "mL"),
      "LOC-9001");

  private static final long HOUR_SECONDS = 3600;

  private final String atc;
  private final String title;
  private final String route;
  private final DrugClass drugClass;
  private final Regimen regimen;
  private final String localCode;

  Drug(String atc, String title, String route, DrugClass drugClass, Regimen regimen) {
    this(atc, title, route, drugClass, regimen, "");
  }

  Drug(
      String atc,
      String title,
      String route,
      DrugClass drugClass,
      Regimen regimen,
      String localCode) {
    this.atc = atc;
    this.title = title;
    this.route = route;
    this.drugClass = drugClass;
    this.regimen = regimen;
    this.localCode = localCode;
  }

  /**
   * ATC code, or for a drug outside the code map its local code.
   *
   * @return the code
   */
  public String atc() {
    return atc;
  }

  /**
   * Name as the pharmacy prints it; may hold a comma.
   *
   * @return the name
   */
  public String title() {
    return title;
  }

  /**
   * Route, in the word of the extract.
   *
   * @return the route
   */
  public String route() {
    return route;
  }

  /**
   * Class with its planted ratio.
   *
   * @return the class
   */
  public DrugClass drugClass() {
    return drugClass;
  }

  /**
   * Time between two doses of a course.
   *
   * @return seconds
   */
  public long everySeconds() {
    return regimen.everyHours() * HOUR_SECONDS;
  }

  /**
   * Length of an infusion.
   *
   * @return seconds, 0 for a dose without an end
   */
  public long infusionSeconds() {
    return regimen.infusionMinutes() * 60L;
  }

  /**
   * Dose as text.
   *
   * @return the dose
   */
  public String dose() {
    return regimen.dose();
  }

  /**
   * Unit of the dose.
   *
   * @return the unit
   */
  public String doseUnit() {
    return regimen.doseUnit();
  }

  /**
   * Code used by the infusion pumps of critical care.
   *
   * @return the code, empty when they use the ATC code
   */
  public String localCode() {
    return localCode;
  }

  /**
   * Whether the code map explains the local code.
   *
   * @return true for a local code with an ATC code of its own
   */
  public boolean mapped() {
    return !localCode.isEmpty() && !localCode.equals(atc);
  }

  /**
   * How a drug is given.
   *
   * @param everyHours hours from dose to dose
   * @param infusionMinutes length of an infusion, 0 for a dose without an end
   * @param dose dose as text
   * @param doseUnit unit of the dose
   */
  private record Regimen(int everyHours, int infusionMinutes, String dose, String doseUnit) {}
}
