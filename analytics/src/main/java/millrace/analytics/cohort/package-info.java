/**
 * Who counts: the first class that fits an admission (methods 6). Imports neither Spark nor Vaadin
 * nor JDBC.
 */
package millrace.analytics.cohort;
