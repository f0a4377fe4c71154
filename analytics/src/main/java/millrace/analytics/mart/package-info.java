/**
 * The published tables: one record per row type, the names of the tables and of the mart's files.
 * Imports neither Spark nor Vaadin nor JDBC, so that the writer (Spark) and the reader (DuckDB)
 * share it.
 */
package millrace.analytics.mart;
