package millrace.etl.check;

/**
 * The rules and the canonical form of one table's rows.
 *
 * @param <T> canonical row
 */
interface RowKind<T> {
  /** The first rule broken after unknown-word, or null. */
  Broken broken(ParsedRow row, Person person);

  /** The canonical row, or null when the row is kept but no computation uses it. */
  T keep(ParsedRow row, Person person);

  /**
   * Told of each row that broke a rule; its fields are split, but not all of them may have been
   * read.
   */
  default void sawBroken(ParsedRow row) {}
}
