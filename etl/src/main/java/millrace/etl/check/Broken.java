package millrace.etl.check;

/**
 * A rule that a row broke, and where.
 *
 * @param rule the first rule broken
 * @param column the column that broke it
 */
public record Broken(Rule rule, String column) implements java.io.Serializable {}
