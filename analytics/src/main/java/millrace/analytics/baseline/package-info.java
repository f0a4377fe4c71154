/**
 * The baseline creatinine of an admission (methods 3). Imports neither Spark nor Vaadin nor JDBC.
 */
package millrace.analytics.baseline;
