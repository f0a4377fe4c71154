package millrace.etl.record;

/** Route of an administration. The words are those of the extract contract. */
public enum Route implements Word {
  /** iv. */
  IV("iv"),
  /** im. */
  IM("im"),
  /** sc. */
  SC("sc"),
  /** po. */
  PO("po"),
  /** pr. */
  PR("pr"),
  /** inhaled. */
  INHALED("inhaled"),
  /** topical. */
  TOPICAL("topical"),
  /** ophthalmic. */
  OPHTHALMIC("ophthalmic"),
  /** otic. */
  OTIC("otic"),
  /** nasal. */
  NASAL("nasal"),
  /** intravitreal. */
  INTRAVITREAL("intravitreal"),
  /** intrathecal. */
  INTRATHECAL("intrathecal"),
  /** irrigation. */
  IRRIGATION("irrigation"),
  /** lock. */
  LOCK("lock"),
  /** other. */
  OTHER("other"),
  /** unknown. */
  UNKNOWN("unknown");

  private final String word;

  Route(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
