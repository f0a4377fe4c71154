/**
 * From bytes to values: records of a CSV file, fields of a record, times, decimals and words, each
 * with the rule that a bad text breaks. Imports neither Spark nor Vaadin nor JDBC.
 */
package millrace.etl.parse;
