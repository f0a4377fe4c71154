/**
 * The speed of a run beside a DuckDB script that does the same work as closely as SQL allows, over
 * the same files. Not a test: started by its own command.
 */
package millrace.analytics.benchmark;
