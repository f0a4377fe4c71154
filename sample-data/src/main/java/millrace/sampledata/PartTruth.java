package millrace.sampledata;

import millrace.sampledata.course.RiskTally;

/**
 * What a part leaves when its files are written.
 *
 * @param tally time at risk and injuries
 * @param injuryLines lines of the truth's table of injuries
 * @param rows rows written
 */
record PartTruth(RiskTally tally, String injuryLines, long rows) {}
