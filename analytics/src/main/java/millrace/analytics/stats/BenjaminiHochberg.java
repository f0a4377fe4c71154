package millrace.analytics.stats;

import java.util.Comparator;
import java.util.stream.IntStream;

/**
 * Correction for looking at many comparisons at once, by the false discovery rate.
 *
 * @see "Methods 7; Benjamini and Hochberg, J R Stat Soc B 1995;57:289"
 */
public final class BenjaminiHochberg {
  private BenjaminiHochberg() {}

  /**
   * The q value of every p value of one family: the least false discovery rate at which it would be
   * reported. With m values, the i-th smallest has the least of {@code p m / rank} over ranks from
   * i up, at most 1; equal p have equal q.
   *
   * <p>Example: 0.01, 0.02, 0.9 give 0.03, 0.03, 0.9.
   *
   * @param pValues p values in any order, each from 0 to 1; left as it is
   * @return q values in the order of the p values
   * @throws IllegalArgumentException if a value is below 0, above 1 or NaN
   */
  public static double[] qValues(double[] pValues) {
    int count = pValues.length;
    double[] qValues = new double[count];
    double least = 1;
    int rank = count;
    for (int index : fromGreatest(pValues)) {
      requireProbability(pValues[index]);
      least = Math.min(least, (double) count / rank * pValues[index]);
      qValues[index] = least;
      rank--;
    }
    return qValues;
  }

  private static int[] fromGreatest(double[] pValues) {
    return IntStream.range(0, pValues.length)
        .boxed()
        .sorted(Comparator.comparingDouble((Integer index) -> pValues[index]).reversed())
        .mapToInt(Integer::intValue)
        .toArray();
  }

  private static void requireProbability(double value) {
    if (!(value >= 0 && value <= 1)) {
      throw new IllegalArgumentException("a p value must be from 0 to 1, and is " + value);
    }
  }
}
