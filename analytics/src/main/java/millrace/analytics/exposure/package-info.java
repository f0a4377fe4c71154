/**
 * Watched drugs, exposed time, burden, combinations and links (methods 7). Imports neither Spark
 * nor Vaadin nor JDBC.
 */
package millrace.analytics.exposure;
