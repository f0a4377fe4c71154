package millrace.analytics.mart;

/**
 * Something odd that was kept, counted.
 *
 * @param kind what was found
 * @param table table of the contract
 * @param detail column, code or word concerned; may be empty
 * @param rows how often
 */
public record FindingRow(String kind, String table, String detail, long rows) {}
