/** Command line and plan of a run. */
package millrace.analytics;
