/**
 * The Spark edge of a run: codecs of the published rows, the pass over all patients, the sums, the
 * writing of the mart.
 */
package millrace.analytics.spark;
