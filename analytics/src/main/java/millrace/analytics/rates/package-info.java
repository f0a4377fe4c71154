/**
 * Unit and drug rates from cells of time at risk (methods 6 to 8). Imports neither Spark nor Vaadin
 * nor JDBC.
 */
package millrace.analytics.rates;
