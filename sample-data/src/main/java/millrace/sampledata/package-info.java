/** The invented hospital: command line, size and seed, and the work divided into parts. */
package millrace.sampledata;
