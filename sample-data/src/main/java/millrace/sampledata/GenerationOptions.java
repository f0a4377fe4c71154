package millrace.sampledata;

import java.nio.file.Path;
import millrace.sampledata.write.Packing;

/**
 * What to make, and where.
 *
 * @param out folder that gets {@code extract/} and {@code truth/}
 * @param admissions number of admissions, 200 to 5,000,000
 * @param seed the seed: same seed and size, same bytes
 * @param threads workers; they change the speed and nothing else
 * @param packing which files are compressed
 */
public record GenerationOptions(
    Path out, long admissions, long seed, int threads, Packing packing) {
  /** Fewest admissions: fewer do not show every rule. */
  public static final long FEWEST_ADMISSIONS = 200;

  /** Most admissions. */
  public static final long MOST_ADMISSIONS = 5_000_000;

  /** Checks the ranges. */
  public GenerationOptions {
    if (admissions < FEWEST_ADMISSIONS || admissions > MOST_ADMISSIONS) {
      throw new IllegalArgumentException(
          "--admissions is "
              + admissions
              + "; give a number from "
              + FEWEST_ADMISSIONS
              + " to "
              + MOST_ADMISSIONS);
    }
    if (threads < 1 || threads > 64) {
      throw new IllegalArgumentException(
          "--threads is " + threads + "; give a number from 1 to 64");
    }
  }
}
