package millrace.etl.contract;

/** How the text of a column is read. */
public enum ColumnKind {
  /** Any text, compared exactly. */
  TEXT,
  /** A date and time. */
  TIME,
  /** A date and time; a bare date is read as 12:00. */
  TIME_OR_NOON,
  /** A date and time; a bare date is read as 23:59:59. */
  TIME_OR_END_OF_DAY,
  /** A date, a month (its 15th) or a year (1 July). */
  BIRTH_DATE,
  /** A decimal number. */
  NUMBER,
  /** A decimal number, with or without {@code <} or {@code >} before it. */
  MEASURED_NUMBER,
  /** One of the column's words. */
  WORD
}
