/**
 * What happens to a patient: pressures, doses, injuries by a planted hazard, and the results that
 * show them.
 */
package millrace.sampledata.course;
