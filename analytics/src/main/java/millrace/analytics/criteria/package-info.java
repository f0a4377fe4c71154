/**
 * Evidence of an acute kidney injury at each result (methods 4). Imports neither Spark nor Vaadin
 * nor JDBC.
 */
package millrace.analytics.criteria;
