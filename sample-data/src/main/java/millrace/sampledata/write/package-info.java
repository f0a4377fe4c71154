/** Tables as a hospital would send them: rows as bytes, parts as files, and the descriptor. */
package millrace.sampledata.write;
