package millrace.analytics.mart;

/**
 * A row of the extract that broke a rule. Sensitive: it holds the raw text.
 *
 * @param table table of the contract
 * @param file path of the file inside the extract
 * @param line line on which the row starts; the header is line 1
 * @param rule rule broken
 * @param column column that broke it
 * @param raw text of the row
 */
public record QuarantineRow(
    String table, String file, long line, String rule, String column, String raw) {}
