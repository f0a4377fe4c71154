package millrace.etl.check;

/**
 * The row rules of the extract contract, in the order in which the first one broken is reported.
 */
public enum Rule {
  /** A required field is empty. */
  MISSING("missing"),
  /** A time, date or number does not parse. */
  UNREADABLE("unreadable"),
  /** A value outside the column's list. */
  UNKNOWN_WORD("unknown-word"),
  /** The referred row is not in the extract. */
  ORPHAN("orphan"),
  /** A later row with a key already seen and other fields. */
  REPEATED_KEY("repeated-key"),
  /** End before start. */
  REVERSED("reversed"),
  /** Before birth or more than a day after death. */
  OUTSIDE_LIFE("outside-life"),
  /** At or after the end of cover. */
  OUTSIDE_COVER("outside-cover"),
  /** A unit that cannot be converted for the analyte. */
  UNIT_OF_MEASURE("unit-of-measure"),
  /** A value out of its bounds. */
  IMPLAUSIBLE("implausible"),
  /** A preliminary or cancelled result. */
  NOT_FINAL("not-final"),
  /** A dose that was not given. */
  NOT_GIVEN("not-given");

  private final String word;

  Rule(String word) {
    this.word = word;
  }

  /** The rule's name in the quarantine. */
  public String word() {
    return word;
  }
}
