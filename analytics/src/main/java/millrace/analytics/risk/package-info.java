/**
 * Time at risk, what ended it, and in which unit and day it was (methods 6). Imports neither Spark
 * nor Vaadin nor JDBC.
 */
package millrace.analytics.risk;
