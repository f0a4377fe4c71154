/**
 * Episodes of acute kidney injury: onset, reference, closing, stage, course, outcome (methods 5).
 * Imports neither Spark nor Vaadin nor JDBC.
 */
package millrace.analytics.episode;
