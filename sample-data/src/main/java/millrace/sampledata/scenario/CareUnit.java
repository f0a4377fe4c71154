package millrace.sampledata.scenario;

/**
 * The units of the invented hospital, with the hazard planted in each before drugs and pressure
 * multiply it.
 */
public enum CareUnit {
  /** General intensive care. */
  ICU("ICU", "Intensive Care", UnitKind.CRITICAL_CARE, 15.0),
  /** Cardiac and surgical intensive care. */
  CSU("CSU", "Cardiac and Surgical Critical Care", UnitKind.CRITICAL_CARE, 12.0),
  /** High dependency. */
  HDU("HDU", "High Dependency", UnitKind.STEP_DOWN, 9.0),
  /** Ward of general medicine. */
  MED_1("M1", "Heron Ward (general medicine)", UnitKind.MEDICAL, 6.0),
  /** Ward of heart and lung medicine; its hazard rises, see {@link Planted}. */
  MED_2("M2", "Curlew Ward (heart and lung)", UnitKind.MEDICAL, 6.5),
  /** Ward for older people. */
  MED_3("M3", "Dunlin Ward (older people)", UnitKind.MEDICAL, 7.0),
  /** General surgery. */
  SURG_1("S1", "Tern Ward (general surgery)", UnitKind.SURGICAL, 5.5),
  /** Bones and joints. */
  SURG_2("S2", "Plover Ward (bones and joints)", UnitKind.SURGICAL, 4.5),
  /** Cancer ward. */
  ONC("ONC", "Avocet Ward (cancer)", UnitKind.ONCOLOGY, 7.5),
  /** Maternity. */
  OBS("OBS", "Maternity", UnitKind.OBSTETRIC, 1.5),
  /** Children. */
  PAED("PAED", "Children's Ward", UnitKind.PAEDIATRIC, 4.0),
  /** Emergency department. */
  ED("ED", "Emergency Department", UnitKind.EMERGENCY, 6.0),
  /** Theatres and recovery; stays here lie inside stays on a ward. */
  THEATRE("TH", "Theatres and Recovery", UnitKind.OTHER, 5.0),
  /** Rehabilitation. */
  REHAB("REH", "Rehabilitation, East Wing", UnitKind.OTHER, 3.5);

  private final String id;
  private final String title;
  private final UnitKind kind;
  private final double hazardPerThousandDays;

  CareUnit(String id, String title, UnitKind kind, double hazardPerThousandDays) {
    this.id = id;
    this.title = title;
    this.kind = kind;
    this.hazardPerThousandDays = hazardPerThousandDays;
  }

  /**
   * Identifier in the extract.
   *
   * @return for instance {@code M2}
   */
  public String id() {
    return id;
  }

  /**
   * Name in the extract.
   *
   * @return the name
   */
  public String title() {
    return title;
  }

  /**
   * Kind of unit.
   *
   * @return the kind
   */
  public UnitKind kind() {
    return kind;
  }

  /**
   * Planted hazard of a hospital-onset injury for a patient without any harmful drug or recent low
   * pressure.
   *
   * @return injuries per 1,000 patient-days at risk
   */
  public double hazardPerThousandDays() {
    return hazardPerThousandDays;
  }
}
