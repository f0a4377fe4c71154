/**
 * The row rules of the extract contract as functions of one patient's raw rows: what is kept, what
 * is merged, what goes to the quarantine, and what was found odd. Imports neither Spark nor Vaadin
 * nor JDBC.
 */
package millrace.etl.check;
