/**
 * The Spark edge of reading an extract: one look through every file, one shuffle that brings all
 * raw rows of a patient together, and the check of each patient as it comes by.
 */
package millrace.etl.spark;
