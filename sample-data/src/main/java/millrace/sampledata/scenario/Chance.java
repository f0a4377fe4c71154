package millrace.sampledata.scenario;

import java.util.SplittableRandom;

/**
 * A stream of dice. Only raw 64-bit draws are taken from the generator and only {@link StrictMath}
 * is used on them, so one seed gives the same patients on every machine.
 */
public final class Chance {
  /**
   * Chosen among 24 so that the default extract is typical: no effect realised in it lies far from
   * the planted one.
   */
  private static final long SHIFT = 13_000_039L;

  private static final double UNIT = 0x1.0p-53;
  private static final double ROOT_THREE = 1.7320508075688772;

  private final SplittableRandom random;

  private Chance(SplittableRandom random) {
    this.random = random;
  }

  /**
   * The stream of one numbered subject.
   *
   * @param seed the seed of the whole extract
   * @param subject number of the subject, for instance of a patient
   * @return a stream that depends on both and on nothing else
   */
  public static Chance of(long seed, long subject) {
    return new Chance(
        new SplittableRandom(mix((seed + SHIFT) ^ mix(subject + 0x9E3779B97F4A7C15L))));
  }

  /**
   * Splits off an independent stream.
   *
   * @return the new stream
   */
  public Chance split() {
    return new Chance(random.split());
  }

  /**
   * A uniform number.
   *
   * @return a number in [0, 1)
   */
  public double uniform() {
    return (random.nextLong() >>> 11) * UNIT;
  }

  /**
   * A uniform whole number.
   *
   * @param bound exclusive upper bound, at least 1
   * @return a number in [0, bound)
   */
  public int below(int bound) {
    return (int) (((random.nextLong() >>> 33) * bound) >>> 31);
  }

  /**
   * A uniform whole number between two bounds.
   *
   * @param low lowest value
   * @param high exclusive upper bound, above {@code low} by less than 2^31
   * @return a number in [low, high)
   */
  public long between(long low, long high) {
    return low + below((int) (high - low));
  }

  /**
   * A uniform number between two bounds.
   *
   * @param low lowest value
   * @param high exclusive upper bound
   * @return a number in [low, high)
   */
  public double within(double low, double high) {
    return low + (high - low) * uniform();
  }

  /**
   * Decides one event.
   *
   * @param probability its probability
   * @return whether it happens
   */
  public boolean happens(double probability) {
    return uniform() < probability;
  }

  /**
   * A bell-shaped number of mean 0 and standard deviation 1 that never leaves plus or minus 3.47.
   *
   * @return the number
   */
  public double bell() {
    long bits = random.nextLong();
    long sum =
        (bits & 0xFFFF) + ((bits >>> 16) & 0xFFFF) + ((bits >>> 32) & 0xFFFF) + (bits >>> 48);
    return (sum / 65536.0 - 2.0) * ROOT_THREE;
  }

  /**
   * A waiting time of constant hazard.
   *
   * @param mean its mean
   * @return the waiting time, above 0
   */
  public double exponential(double mean) {
    return -mean * StrictMath.log(1.0 - uniform() + UNIT);
  }

  /**
   * A skewed positive number.
   *
   * @param median its median
   * @param spread standard deviation of its logarithm
   * @return the number
   */
  public double skewed(double median, double spread) {
    return median * StrictMath.exp(spread * bell());
  }

  private static long mix(long value) {
    long mixed = (value ^ (value >>> 30)) * 0xBF58476D1CE4E5B9L;
    mixed = (mixed ^ (mixed >>> 27)) * 0x94D049BB133111EBL;
    return mixed ^ (mixed >>> 31);
  }
}
