/**
 * Everything computed for one patient: the rules in their order, and the published rows they give.
 * Imports neither Spark nor Vaadin nor JDBC.
 */
package millrace.analytics.patient;
