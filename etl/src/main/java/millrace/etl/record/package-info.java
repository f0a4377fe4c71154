/**
 * Canonical rows of an extract after checking and normalisation, their words, and the exact
 * quantities they carry. Times are epoch seconds UTC; {@link millrace.etl.record.Seconds#ABSENT}
 * marks a time that the extract does not give. Imports neither Spark nor Vaadin nor JDBC.
 */
package millrace.etl.record;
