package millrace.etl.check;

/** Oddities that are kept and counted (extract contract; methods 2). */
public enum FindingKind {
  /** A local time that the clock showed twice; the earlier instant is taken. */
  CLOCK_OVERLAP("clock-overlap"),
  /** A local time that the clock never showed; moved forward by the gap. */
  CLOCK_GAP("clock-gap"),
  /** A date without a time of day where the contract allows it. */
  BARE_DATE("bare-date"),
  /** A value written with {@code <} or {@code >}, read as the number. */
  BOUNDED_VALUE("bounded-value"),
  /** A row with more or fewer fields than its header. */
  RAGGED_ROW("ragged-row"),
  /** An admission id that is not the admission to which the row belongs by time. */
  OTHER_ADMISSION("other-admission"),
  /** Admissions of one patient that overlap. */
  OVERLAPPING_ADMISSIONS("overlapping-admissions"),
  /** A patient older than 120 years at admission. */
  AGE_ABOVE_120("age-above-120"),
  /** A field of a pressure out of its bounds, emptied. */
  EMPTIED_PRESSURE("emptied-pressure"),
  /** Pressures of one patient, instant and method with different values. */
  RIVAL_PRESSURES("rival-pressures"),
  /** Creatinine values of one patient at one instant. */
  RIVAL_RESULTS("rival-results"),
  /** A result of an analyte that the program does not use. */
  UNUSED_ANALYTE("unused-analyte"),
  /** A row of orders, not of doses given. */
  ORDERED_ONLY("ordered-only"),
  /** A local code without an entry in the code map. */
  UNMAPPED_CODE("unmapped-code"),
  /** A column of a file that the contract does not have. */
  UNKNOWN_COLUMN("unknown-column"),
  /** A resource of the descriptor that the contract does not have. */
  UNKNOWN_TABLE("unknown-table"),
  /** A local code that the code map explains twice; the first entry stands. */
  REPEATED_CODE("repeated-code"),
  /** An optional table without a row. */
  EMPTY_TABLE("empty-table");

  private final String word;

  FindingKind(String word) {
    this.word = word;
  }

  /** The kind's name in the findings. */
  public String word() {
    return word;
  }
}
