/** Who comes to the hospital, when, and through which units. */
package millrace.sampledata.person;
