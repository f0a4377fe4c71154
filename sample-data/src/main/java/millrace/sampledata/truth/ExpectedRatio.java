package millrace.sampledata.truth;

import millrace.sampledata.course.Cell;
import millrace.sampledata.course.RiskTally;

/**
 * The rate ratios of a subject that a perfect analysis of this extract would find on average:
 * ratios of expected injuries per time at risk, crude and combined over strata by Mantel and
 * Haenszel's weights.
 */
final class ExpectedRatio {
  private final RiskTally tally;
  private final int subject;

  ExpectedRatio(RiskTally tally, int subject) {
    this.tally = tally;
    this.subject = subject;
  }

  /** Days at risk, exposed or other. */
  double days(boolean exposed) {
    double sum = 0;
    for (int stratum = 0; stratum < RiskTally.STRATA; stratum++) {
      sum += tally.subject(subject, stratum, exposed).days();
    }
    return sum;
  }

  /** Expected injuries, exposed or other. */
  double expected(boolean exposed) {
    double sum = 0;
    for (int stratum = 0; stratum < RiskTally.STRATA; stratum++) {
      sum += tally.subject(subject, stratum, exposed).expected();
    }
    return sum;
  }

  /** Injuries that happened, exposed or other. */
  long injuries(boolean exposed) {
    long sum = 0;
    for (int stratum = 0; stratum < RiskTally.STRATA; stratum++) {
      sum += tally.subject(subject, stratum, exposed).injuries();
    }
    return sum;
  }

  /** Ratio without regard to strata; not a number without exposed time. */
  double crude() {
    return expected(true) / days(true) / (expected(false) / days(false));
  }

  /** Ratio within strata of unit kind and recent low pressure. */
  double stratified() {
    double above = 0;
    double below = 0;
    for (int stratum = 0; stratum < RiskTally.STRATA; stratum++) {
      Cell exposed = tally.subject(subject, stratum, true);
      Cell other = tally.subject(subject, stratum, false);
      double days = exposed.days() + other.days();
      if (days > 0) {
        above += exposed.expected() * other.days() / days;
        below += other.expected() * exposed.days() / days;
      }
    }
    return above / below;
  }
}
