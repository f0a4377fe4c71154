/**
 * Low blood pressure: readings, how long they stand, spells, measures before an onset (methods 8).
 * Imports neither Spark nor Vaadin nor JDBC.
 */
package millrace.analytics.pressure;
