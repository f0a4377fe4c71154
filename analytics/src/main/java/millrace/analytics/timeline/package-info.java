/**
 * One patient's ordered events, the only input of the rules: admissions and membership, the
 * creatinine line, kidney replacements, where the patient was (methods 2, 6). Imports neither Spark
 * nor Vaadin nor JDBC.
 */
package millrace.analytics.timeline;
