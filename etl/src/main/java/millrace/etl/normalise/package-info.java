/** Units, codes and ids brought to one form. Imports neither Spark nor Vaadin nor JDBC. */
package millrace.etl.normalise;
