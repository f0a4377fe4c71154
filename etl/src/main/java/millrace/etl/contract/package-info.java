/**
 * The extract contract as data: tables, columns, descriptor, cover, the files of an extract and
 * their layout. Imports neither Spark nor Vaadin nor JDBC.
 */
package millrace.etl.contract;
