/**
 * How published tables are written as CSV: columns, formats, order (methods 12). Imports neither
 * Spark nor Vaadin nor JDBC.
 */
package millrace.analytics.export;
