package millrace.analytics.stats;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.numbers.rootfinder.BrentSolver;
import org.apache.commons.statistics.distribution.BetaDistribution;

/**
 * Given how many events there were in all, the number with the exposure is binomial. Its tails are
 * beta integrals, summed without cancellation, and its limits are found on the logit of the
 * proportion, where they keep their digits near 0 and near 1.
 *
 * @param exposed observed events with the exposure
 * @param unexposed observed events without it
 */
record ConditionalBinomial(long exposed, long unexposed) {
  private static final BrentSolver SOLVER = new BrentSolver(1e-15, 1e-15, 0);

  /**
   * Probability of more exposed events than observed, plus a share of the observed number itself.
   *
   * @param proportion chance that one event is an exposed one
   * @param complement one minus that, passed apart because subtraction would lose it near 0
   * @param share 1 for an exact tail, one half for a mid-P tail
   */
  double upperTail(double proportion, double complement, double share) {
    double asMany = exposed == 0 ? 1 : beta(exposed, unexposed + 1.0, proportion, complement);
    double more = unexposed == 0 ? 0 : beta(exposed + 1.0, unexposed, proportion, complement);
    return share * asMany + (1 - share) * more;
  }

  /** The other tail: fewer exposed events, plus a share of the observed number. */
  double lowerTail(double proportion, double complement, double share) {
    return swapped().upperTail(complement, proportion, share);
  }

  /**
   * The odds of the proportion whose upper tail is the one asked for.
   *
   * @return 0 without an exposed event
   */
  double lowerOdds(double tail, double share) {
    return exposed == 0 ? 0 : Math.exp(lowerLogit(tail, share));
  }

  /**
   * The odds of the proportion whose lower tail is the one asked for.
   *
   * @return positive infinity without an unexposed event
   */
  double upperOdds(double tail, double share) {
    return 1 / swapped().lowerOdds(tail, share);
  }

  private ConditionalBinomial swapped() {
    return new ConditionalBinomial(unexposed, exposed);
  }

  private double lowerLogit(double tail, double share) {
    double target = Math.log(tail);
    DoubleUnaryOperator excess =
        logit -> {
          double found = upperTail(1 / (1 + Math.exp(-logit)), 1 / (1 + Math.exp(logit)), share);
          return Math.log(Math.max(found, Double.MIN_VALUE)) - target;
        };
    double centre = Math.log((exposed + 0.5) / (unexposed + 0.5));
    double step = Math.sqrt(1 / (exposed + 0.5) + 1 / (unexposed + 0.5));
    double low = outward(excess, centre, -step);
    double high = outward(excess, centre, step);
    return SOLVER.findRoot(excess, low, high);
  }

  /** First point, in doubling steps from the centre, at which the excess has the step's sign. */
  private static double outward(DoubleUnaryOperator excess, double centre, double firstStep) {
    double step = firstStep;
    double point = centre + step;
    while (Math.signum(step) * excess.applyAsDouble(point) < 0) {
      step *= 2;
      point += step;
    }
    return point;
  }

  private static double beta(double alpha, double beta, double proportion, double complement) {
    return proportion <= complement
        ? BetaDistribution.of(alpha, beta).cumulativeProbability(proportion)
        : BetaDistribution.of(beta, alpha).survivalProbability(complement);
  }
}
