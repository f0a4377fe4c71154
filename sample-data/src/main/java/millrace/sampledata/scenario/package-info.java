/** What is fixed before any patient exists: time, units, drugs, planted effects and the dice. */
package millrace.sampledata.scenario;
