/** What was planted and what of it was realised, written beside the extract. */
package millrace.sampledata.truth;
