/** Every setting of a run: read, checked, printed. Imports neither Spark nor Vaadin nor JDBC. */
package millrace.analytics.policy;
