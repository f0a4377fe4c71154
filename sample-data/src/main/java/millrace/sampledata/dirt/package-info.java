/**
 * The faults that real extracts have, planted as extra rows so that the truth of the clean rows
 * stays.
 */
package millrace.sampledata.dirt;
